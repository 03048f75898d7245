//! Dominant weight multiplicities of E8 in print.
//!
//! Source: [McKay-Patera 1981], [Bremner-Moody-Patera 1985], tables of E8; from memory, and derived
//! here a second way, from sums and products of roots.

use num_bigint::BigUint;
use roots::{Irrep, SimpleAlgebra};

fn irrep(name: &str) -> Irrep {
    let e8: SimpleAlgebra = "E8".parse().unwrap();
    e8.read_irrep(name).unwrap()
}

/// Orbit sizes with multiplicities, the highest weight first.
fn orbits(name: &str) -> Vec<(u32, u32)> {
    let dominant = irrep(name).dominant_weights().unwrap().into_iter();
    let orbits = dominant.map(|(weight, n)| (weight.orbit_size(), n));
    let small = |n: BigUint| u32::try_from(n).unwrap();
    orbits.map(|(size, n)| (small(size), small(n))).collect()
}

#[test]
fn bremner_moody_patera_e8() {
    assert_eq!(orbits("248"), [(240, 1), (1, 8)]);
    assert_eq!(orbits("3875"), [(2160, 1), (240, 7), (1, 35)]);
    assert_eq!(orbits("30380"), [(6720, 1), (2160, 7), (240, 35), (1, 140)]);
}

/// The same from sums of two roots. A root is orthogonal to 126 others and at 60 degrees to 56; a
/// weight of squared length 4 is the sum of two orthogonal roots in 7 ways, and so on. Alt^2 of the
/// adjoint is 248 + 30380, Sym^2 is 1 + 3875 + 27000.
#[test]
fn multiplicities_from_pairs_of_roots() {
    let pairs = 240 * 126 / 2;
    let ways = pairs / 2160;
    // At a root: 56/2 pairs of roots with that sum and 8 with a generator that commutes.
    let at_root = 56 / 2 + 8;
    // At zero: 120 pairs of opposite roots and the pairs of the 8 commuting generators.
    let (alternating, symmetric) = (120 + 8 * 7 / 2, 120 + 8 * 9 / 2);
    let thirty = orbits("30380");
    assert_eq!(thirty[0], (6720, 240 * 56 / 2 / 6720));
    assert_eq!(thirty[1], (2160, ways));
    assert_eq!(thirty[2], (240, at_root - 1));
    assert_eq!(thirty[3], (1, alternating - 8));
    let (third, largest) = (orbits("3875"), orbits("27000"));
    assert_eq!(third[2].1 + largest[4].1 + 1, symmetric);
    assert_eq!(third[1].1 + largest[3].1, at_root);
    assert_eq!(third[0].1 + largest[2].1, ways);
}

/// All weights, streamed: as many as the orbits hold, each of them once, adding up to the
/// dimension.
#[test]
fn streamed_weights_of_e8() {
    for (name, different) in [
        ("248", 241),
        ("3875", 2401),
        ("30380", 9121),
        ("147250", 26401),
    ] {
        let (mut count, mut dimension) = (0, BigUint::default());
        let mut seen = std::collections::HashSet::new();
        for (weight, n) in irrep(name).weights().unwrap() {
            count += 1;
            dimension += n;
            assert!(seen.insert(weight), "{name}: a weight came twice");
        }
        assert_eq!(count, different, "{name}");
        assert_eq!(dimension, irrep(name).dimension(), "{name}");
    }
}
