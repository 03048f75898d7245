//! Real, pseudoreal and complex a second way: from the library's own root system.

use roots::{Reality, SimpleAlgebra};

use crate::support::{irrep, seed, signed, slow};

/// The sum of all positive coroots paired with the highest weight is the number of steps from the
/// highest weight to the lowest; an even number makes a self-conjugate irrep real.
#[test]
fn steps_from_highest_to_lowest() {
    let mut random = fastrand::Rng::with_seed(seed());
    for algebra in SimpleAlgebra::up_to_rank(8) {
        let system = algebra.root_system();
        let mut sum = vec![0u64; algebra.rank()];
        for root in system.positive_roots() {
            for (total, &c) in sum.iter_mut().zip(root.coroot()) {
                *total += u64::from(c);
            }
        }
        for _ in 0..200 {
            let labels: Vec<u32> = (0..algebra.rank()).map(|_| random.u32(0..6)).collect();
            let irrep = algebra.irrep(&labels).unwrap();
            // The average with the conjugate is self-conjugate, so every algebra has its turn.
            let other = irrep.conjugate();
            let both: Vec<u32> = labels
                .iter()
                .zip(other.labels())
                .map(|(a, b)| a + b)
                .collect();
            for irrep in [irrep, algebra.irrep(&both).unwrap()] {
                let steps: u64 = sum
                    .iter()
                    .zip(irrep.labels())
                    .map(|(&c, &l)| c * u64::from(l))
                    .sum();
                let expected = match (irrep.conjugate() == irrep, steps % 2) {
                    (false, _) => Reality::Complex,
                    (true, 0) => Reality::Real,
                    (true, _) => Reality::Pseudoreal,
                };
                assert_eq!(irrep.reality(), expected, "{irrep:?}");
            }
        }
    }
}

/// The conjugate is minus the lowest weight.
#[test]
fn conjugates_by_reflection() {
    let mut random = fastrand::Rng::with_seed(seed());
    for algebra in SimpleAlgebra::up_to_rank(8) {
        let slow = slow(algebra);
        for _ in 0..50 {
            let labels: Vec<u32> = (0..algebra.rank()).map(|_| random.u32(0..9)).collect();
            let expected = irrep(algebra, &slow.conjugate(&signed(&labels)));
            assert_eq!(
                algebra.irrep(&labels).unwrap().conjugate(),
                expected,
                "{algebra}"
            );
        }
    }
}
