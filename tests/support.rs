//! Small things that several checks need.

use std::io::Write;

use num_bigint::BigUint;
use outside_checks::slow::SlowAlgebra;
use roots::{Irrep, SimpleAlgebra};

/// The algebra of that name.
pub(crate) fn algebra(name: &str) -> SimpleAlgebra {
    name.parse().unwrap()
}

/// The slow calculation's own copy of an algebra.
pub(crate) fn slow(algebra: SimpleAlgebra) -> SlowAlgebra {
    SlowAlgebra::named(&algebra.cartan_type().to_string())
}

/// Labels as the slow calculation takes them.
pub(crate) fn signed(labels: &[u32]) -> Vec<i64> {
    labels.iter().copied().map(i64::from).collect()
}

/// A whole number as the library gives it.
pub(crate) fn big(value: i128) -> BigUint {
    BigUint::try_from(value).unwrap()
}

/// The irrep with these labels, as the slow calculation has them.
pub(crate) fn irrep(algebra: SimpleAlgebra, labels: &[i64]) -> Irrep {
    let labels: Vec<u32> = labels.iter().map(|&l| l.try_into().unwrap()).collect();
    algebra.irrep(&labels).unwrap()
}

/// The seed of random choices: the variable `GAUGEWRIGHT_SEED`, or else another one each time. It
/// is printed, so that a failure shows how to have the same choices again.
pub(crate) fn seed() -> u64 {
    let seed = match std::env::var("GAUGEWRIGHT_SEED") {
        Ok(written) => written.parse().expect("GAUGEWRIGHT_SEED is a whole number"),
        Err(_) => fastrand::u64(..),
    };
    // Not by `println!`, which the test runner would swallow.
    let line = format!("seed: GAUGEWRIGHT_SEED={seed} makes these choices again\n");
    std::io::stderr()
        .write_all(line.as_bytes())
        .expect("standard error is open");
    seed
}
