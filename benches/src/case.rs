//! The fixed work: products and weight systems that the design names.

use num_bigint::BigUint;
use roots::{Irrep, SimpleAlgebra};

/// A product of two irreps.
#[derive(Clone, Debug)]
pub struct ProductCase {
    /// As it is printed.
    pub name: String,
    /// The factors.
    pub factors: [Irrep; 2],
}

/// An irrep whose dominant weights are asked for.
#[derive(Clone, Debug)]
pub struct WeightCase {
    /// As it is printed.
    pub name: String,
    /// The irrep.
    pub irrep: Irrep,
}

/// An irrep by its name or labels; the cases are known to be well written.
///
/// # Panics
/// Where there is no such algebra or irrep.
#[must_use]
pub fn irrep(algebra: &str, written: &str) -> Irrep {
    let algebra: SimpleAlgebra = algebra.parse().expect("an algebra");
    algebra.read_irrep(written).expect("an irrep")
}

/// The products timed against GAP.
#[must_use]
pub fn products() -> Vec<ProductCase> {
    let cases = [
        ("E6", "27", "1728"),
        ("SO(10)", "126", "210"),
        ("SO(10)", "(10101)", "(01011)"),
        ("E8", "248", "3875"),
        ("E8", "147250", "3875"),
        ("SU(8)", "(1110111)", "(1010101)"),
    ];
    let case = |(algebra, left, right): (&str, &str, &str)| ProductCase {
        name: format!("{algebra} {left} x {right}"),
        factors: [irrep(algebra, left), irrep(algebra, right)],
    };
    cases.into_iter().map(case).collect()
}

/// The weight systems timed against GAP.
#[must_use]
pub fn weight_systems() -> Vec<WeightCase> {
    let cases = [
        ("E8", "(10000111)"),
        ("E8", "(10100010)"),
        // The two above, their labels read in the numbering of Bourbaki.
        ("E8", "(10001110)"),
        ("E8", "(11000100)"),
        ("E7", "(2010102)"),
        ("E7", "(1101011)"),
        ("SO(16)", "(11010101)"),
        ("SO(16)", "(20101002)"),
    ];
    let case = |(algebra, labels): (&str, &str)| WeightCase {
        name: format!("{algebra} {labels}"),
        irrep: irrep(algebra, labels),
    };
    cases.into_iter().map(case).collect()
}

/// Number of different weights of an irrep: what walking through it touches.
///
/// # Panics
/// Where the irrep is too large to be listed, as none of the cases is.
#[must_use]
pub fn weights(irrep: &Irrep) -> u64 {
    let dominant = irrep.dominant_weights().expect("few dominant weights");
    let total: BigUint = dominant.iter().map(|(weight, _)| weight.orbit_size()).sum();
    total
        .try_into()
        .expect("a number of weights that can be walked through")
}
