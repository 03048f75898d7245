//! Tensor products as they are in print.
//!
//! Source: [Slansky 1981], tables of tensor products of SU(2) to SU(6), SO(10), E6, E7, E8, F4 and
//! G2; the same in [Yamatsu 2015], section on tensor products. Written down from memory; each line
//! is checked a second way, by dimension and index and by weight-by-weight division.

use std::collections::BTreeMap;

use num_bigint::BigUint;
use roots::{Limits, NameBook, SimpleAlgebra, product_by_weight_division};

/// Algebra, factors, terms; a term that is there twice is written twice.
const PRODUCTS: &[(&str, &str, &str, &str)] = &[
    ("SU(2)", "2", "2", "1 3"),
    ("SU(2)", "2", "3", "2 4"),
    ("SU(2)", "3", "3", "1 3 5"),
    ("SU(3)", "3", "3", "3bar 6"),
    ("SU(3)", "3", "3bar", "1 8"),
    ("SU(3)", "3", "6", "8 10"),
    ("SU(3)", "3", "8", "3 6bar 15"),
    ("SU(3)", "6", "6", "6bar 15 15'"),
    ("SU(3)", "6", "6bar", "1 8 27"),
    ("SU(3)", "8", "8", "1 8 8 10 10bar 27"),
    ("SU(3)", "8", "10", "8 10 27 35"),
    ("SU(4)", "4", "4", "6 10"),
    ("SU(4)", "4", "4bar", "1 15"),
    ("SU(4)", "4", "6", "4bar 20bar"),
    ("SU(4)", "6", "6", "1 15 20'"),
    ("SU(4)", "15", "15", "1 15 15 20' 45 45bar 84"),
    ("SU(5)", "5", "5", "10 15"),
    ("SU(5)", "5", "5bar", "1 24"),
    ("SU(5)", "5", "10", "10bar 40bar"),
    ("SU(5)", "5bar", "10", "5 45"),
    ("SU(5)", "5", "24", "5 45 70"),
    ("SU(5)", "10", "10", "5bar 45bar 50bar"),
    ("SU(5)", "10", "10bar", "1 24 75"),
    ("SU(5)", "10", "24", "10 15 40 175"),
    ("SU(5)", "24", "24", "1 24 24 75 126 126bar 200"),
    ("SU(6)", "6", "6", "15 21"),
    ("SU(6)", "6", "6bar", "1 35"),
    ("SU(6)", "6", "15", "20 70"),
    ("SU(6)", "15", "15bar", "1 35 189"),
    ("SU(6)", "20", "20", "1 35 175 189"),
    ("SU(6)", "35", "35", "1 35 35 189 280 280bar 405"),
    ("SO(10)", "10", "10", "1 45 54"),
    ("SO(10)", "10", "16", "16bar 144bar"),
    ("SO(10)", "16", "16", "10 120 126"),
    ("SO(10)", "16", "16bar", "1 45 210"),
    ("SO(10)", "10", "45", "10 120 320"),
    ("SO(10)", "16", "45", "16 144 560"),
    ("SO(10)", "45", "45", "1 45 54 210 770 945"),
    ("SO(10)", "54", "54", "1 45 54 660 770 1386"),
    ("SO(10)", "10", "120", "45 210 945"),
    ("SO(10)", "16", "120", "16bar 144bar 560bar 1200bar"),
    ("SO(10)", "10", "210", "120 126 126bar 1728"),
    ("SO(10)", "126", "126bar", "1 45 210 770 5940 8910"),
    ("E6", "27", "27", "27bar 351bar 351'bar"),
    ("E6", "27", "27bar", "1 78 650"),
    ("E6", "27", "78", "27 351 1728"),
    ("E6", "78", "78", "1 78 650 2430 2925"),
    ("E7", "56", "56", "1 133 1463 1539"),
    ("E7", "56", "133", "56 912 6480"),
    ("E7", "133", "133", "1 133 1539 7371 8645"),
    ("E8", "248", "248", "1 248 3875 27000 30380"),
    ("E8", "248", "3875", "248 3875 30380 147250 779247"),
    ("F4", "26", "26", "1 26 52 273 324"),
    ("F4", "26", "52", "26 273 1053"),
    ("F4", "52", "52", "1 52 324 1053' 1274"),
    ("G2", "7", "7", "1 7 14 27"),
    ("G2", "7", "14", "7 27 64"),
    ("G2", "14", "14", "1 14 27 77 77'"),
];

#[test]
fn slansky_products() {
    for &(algebra, left, right, terms) in PRODUCTS {
        let case = format!("{algebra} {left} x {right}");
        let algebra: SimpleAlgebra = algebra.parse().unwrap();
        let (left, right) = (
            algebra.read_irrep(left).unwrap(),
            algebra.read_irrep(right).unwrap(),
        );
        let product = left.product(&right).unwrap();
        let mut book = NameBook::new(algebra);
        let ours: BTreeMap<String, BigUint> = product
            .iter()
            .map(|(irrep, n)| (book.name(irrep).to_string(), n))
            .collect();
        let mut printed: BTreeMap<String, BigUint> = BTreeMap::new();
        for term in terms.split(' ') {
            *printed.entry(term.to_owned()).or_default() += 1u32;
        }
        assert_eq!(ours, printed, "{case}");
        assert_eq!(product.dimension(), left.dimension() * right.dimension());
        let divided = product_by_weight_division(&left, &right, &Limits::default()).unwrap();
        assert_eq!(product, divided, "{case}");
    }
}

/// Powers in print: which part of a square is symmetric, [Slansky 1981]; the two quartic tensors
/// of E6, the quintic ones of SO(10) and the cubic ones of the adjoints are counted a second way
/// by dimension (binomial coefficients). From memory.
#[test]
fn slansky_squares_and_small_powers() {
    let cases = [
        ("SU(5)", "10", "2", "5bar 50bar"),
        ("SU(5)", "10", "1,1", "45bar"),
        ("SU(3)", "8", "2", "1 8 27"),
        ("SU(3)", "8", "1,1", "8 10 10bar"),
        ("SO(10)", "16", "2", "10 126"),
        ("SO(10)", "16", "1,1", "120"),
        ("SO(10)", "16", "1,1,1", "560bar"),
        ("E6", "27", "2", "27bar 351'bar"),
        ("E6", "27", "1,1", "351bar"),
        ("E6", "27", "3", "1 650 3003"),
        ("E7", "56", "2", "133 1463"),
        ("E7", "56", "1,1", "1 1539"),
        ("E8", "248", "2", "1 3875 27000"),
        ("E8", "248", "1,1", "248 30380"),
        ("SU(3)", "3", "2,1", "8"),
    ];
    for (algebra, irrep, partition, terms) in cases {
        let algebra: SimpleAlgebra = algebra.parse().unwrap();
        let power = algebra.read_irrep(irrep).unwrap();
        let power = power.power(&partition.parse().unwrap()).unwrap();
        let mut book = NameBook::new(algebra);
        let mut ours: Vec<String> = power.irreps().map(|r| book.name(r).to_string()).collect();
        let mut printed: Vec<&str> = terms.split(' ').collect();
        ours.sort();
        printed.sort_unstable();
        assert_eq!(ours, printed, "{algebra} {irrep} to {partition}");
    }
}

/// The quartic invariant of E7's 56 and the cubic one of E6's 27 (Cartan 1894; common practice),
/// and no cubic one of SO(10)'s 16.
#[test]
fn invariants_of_powers() {
    let count = |algebra: &str, irrep: &str, degree: u32| {
        let algebra: SimpleAlgebra = algebra.parse().unwrap();
        let power = algebra
            .read_irrep(irrep)
            .unwrap()
            .symmetric_power(degree)
            .unwrap();
        power.multiplicity(&algebra.singlet())
    };
    for (algebra, irrep, degree, invariants) in [
        ("E7", "56", 2, 0u32),
        ("E7", "56", 4, 1),
        ("E6", "27", 3, 1),
        ("E6", "27", 4, 0),
        ("E6", "27", 6, 1),
        ("SO(10)", "16", 3, 0),
        ("SO(10)", "16", 4, 0),
        ("SU(3)", "8", 6, 2),
        ("G2", "7", 6, 1),
    ] {
        assert_eq!(
            count(algebra, irrep, degree),
            invariants.into(),
            "{algebra} {irrep}"
        );
    }
}
