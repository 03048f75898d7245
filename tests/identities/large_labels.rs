//! Labels up to the largest that can be written.

use num_bigint::{BigInt, BigUint};
use num_rational::BigRational;
use num_traits::One;
use proptest::prelude::*;
use roots::{Irrep, Reality};

use super::choices::{any_algebra, irrep_of};
use crate::support::{signed, slow};

/// Weyl's formula over the slow calculation's own coroots, in big numbers from the start.
fn dimension(irrep: &Irrep) -> BigUint {
    let slow = slow(irrep.algebra());
    let labels = signed(irrep.labels());
    let (mut above, mut below) = (BigInt::one(), BigInt::one());
    for root in &slow.positive_roots {
        let coroot = slow.coroot(root);
        let height: i64 = coroot.iter().sum();
        let pairing: BigInt = coroot
            .iter()
            .zip(&labels)
            .map(|(&c, &l)| BigInt::from(c) * l)
            .sum();
        above *= pairing + height;
        below *= height;
    }
    let quotient = BigRational::new(above, below);
    assert!(quotient.is_integer());
    quotient.to_integer().try_into().unwrap()
}

/// A cubic index from Young rows, in big numbers: the same sum of cubes over the traceless rows,
/// which are read off another way, as partial sums from the front.
fn cubic_index(irrep: &Irrep) -> BigRational {
    let cubes = |labels: Vec<i64>| -> BigRational {
        let size = BigInt::from(labels.len() + 1);
        // Coordinate k of a weight is its trace-free start less the labels before it.
        let weighted: BigInt = (1i64..)
            .zip(labels.iter().rev())
            .map(|(k, &l)| BigInt::from(l) * k)
            .sum();
        let mut coordinate = BigRational::new(weighted, size);
        let mut sum = coordinate.pow(3);
        for label in labels {
            coordinate -= BigRational::from(BigInt::from(label));
            sum += coordinate.pow(3);
        }
        sum
    };
    let shifted: Vec<i64> = irrep.labels().iter().map(|&l| i64::from(l) + 1).collect();
    let fundamental: Vec<i64> = (0..shifted.len())
        .map(|i| if i == 0 { 2 } else { 1 })
        .collect();
    let size = BigInt::from(shifted.len() + 1);
    cubes(shifted) * BigInt::from(irrep.dimension()) / (cubes(fundamental) * size)
}

fn large_label() -> impl Strategy<Value = u32> {
    prop_oneof![2 => u32::MAX - 3..=u32::MAX, 1 => any::<u32>(), 1 => Just(0u32)]
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(150))]

    #[test]
    fn nothing_overflows(irrep in any_algebra(8).prop_flat_map(|algebra| irrep_of(algebra, large_label()))) {
        prop_assert_eq!(irrep.dimension(), dimension(&irrep));
        let generators = BigInt::from(irrep.algebra().dimension());
        let traced = irrep.casimir() * BigInt::from(irrep.dimension()) * BigInt::from(2);
        prop_assert_eq!(BigRational::from(BigInt::from(irrep.dynkin_index()) * generators), traced);
        let steps = slow(irrep.algebra()).steps(&signed(irrep.labels()));
        let expected = if irrep.conjugate() != irrep {
            Reality::Complex
        } else if steps % 2 == 0 {
            Reality::Real
        } else {
            Reality::Pseudoreal
        };
        prop_assert_eq!(irrep.reality(), expected);
        let name = irrep.name();
        prop_assert_eq!(irrep.algebra().read_irrep(&name).unwrap(), irrep);
    }

    #[test]
    fn cubic_indices(irrep in (3..=9usize).prop_flat_map(|n| {
        irrep_of(roots::SimpleAlgebra::su(n).unwrap(), prop_oneof![large_label(), 0..9u32])
    })) {
        prop_assert_eq!(BigRational::from(irrep.cubic_index()), cubic_index(&irrep));
    }
}

#[test]
fn largest_labels_at_large_ranks() {
    for name in ["A256", "B80", "C80", "D80"] {
        let algebra = crate::support::algebra(name);
        let irrep = algebra.irrep(&vec![u32::MAX; algebra.rank()]).unwrap();
        // All labels alike: (u32::MAX + 1) to the number of positive roots.
        let power = BigUint::one() << (32 * algebra.positive_root_count());
        assert_eq!(irrep.dimension(), power, "{name}");
        let generators = BigInt::from(algebra.dimension());
        let traced = irrep.casimir() * BigInt::from(irrep.dimension()) * BigInt::from(2);
        assert_eq!(
            BigRational::from(BigInt::from(irrep.dynkin_index()) * generators),
            traced
        );
        assert_eq!(irrep.conjugate(), irrep);
        assert_eq!(irrep.cubic_index(), BigInt::ZERO);
    }
}
