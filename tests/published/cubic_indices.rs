//! [Banks-Georgi 1976], [Okubo 1977]: cubic indices of SU(N). Formulas from memory; the slow
//! calculation is the second way.

use num_bigint::BigInt;
use outside_checks::slow::SlowAlgebra;
use roots::{Irrep, SimpleAlgebra};

use crate::support::{algebra, irrep, signed, slow};

fn with_label(n: usize, node: usize, label: u32) -> Irrep {
    let labels: Vec<u32> = (0..n - 1)
        .map(|i| if i == node { label } else { 0 })
        .collect();
    SimpleAlgebra::su(n).unwrap().irrep(&labels).unwrap()
}

fn factorial(n: usize) -> BigInt {
    (1..=n).map(BigInt::from).product()
}

/// A of the k-fold antisymmetric tensor is `(N - 2k) (N - 3)! / ((N - k - 1)! (k - 1)!)`.
#[test]
fn antisymmetric_tensors() {
    for n in 3..=40 {
        for k in 1..n {
            let signed_width = BigInt::from(n) - BigInt::from(2 * k);
            let formula =
                signed_width * factorial(n - 3) / (factorial(n - k - 1) * factorial(k - 1));
            assert_eq!(
                with_label(n, k - 1, 1).cubic_index(),
                formula,
                "SU({n}), {k}"
            );
        }
    }
}

/// A of the k-fold symmetric tensor is `(N + 2k) (N + k)! / ((N + 2)! (k - 1)!)`.
#[test]
fn symmetric_tensors() {
    for n in 3..=40 {
        for k in 1..=12u32 {
            let times = usize::try_from(k).unwrap();
            let formula = BigInt::from(n + 2 * times) * factorial(n + times)
                / (factorial(n + 2) * factorial(times - 1));
            assert_eq!(with_label(n, 0, k).cubic_index(), formula, "SU({n}), {k}");
        }
    }
}

/// The cases that everybody quotes.
#[test]
fn two_and_three_indices() {
    for n in 4..=257usize {
        let size = BigInt::from(n);
        let lambda = |k: usize| with_label(n, k - 1, 1).cubic_index();
        let symmetric = |k| with_label(n, 0, k).cubic_index();
        assert_eq!(lambda(1), 1.into());
        assert_eq!(lambda(2), &size - 4);
        assert_eq!(lambda(3), (&size - 3) * (&size - 6) / 2);
        assert_eq!(symmetric(2), &size + 4);
        assert_eq!(symmetric(3), (&size + 3) * (&size + 6) / 2);
    }
}

/// SU(3): `A(p, q) = dim (p - q) (p + 2q + 3) (2p + q + 3) / 60`.
#[test]
fn every_irrep_of_su3() {
    let su3 = algebra("SU(3)");
    for p in 0..40i64 {
        for q in 0..40i64 {
            let dimension = (p + 1) * (q + 1) * (p + q + 2) / 2;
            let formula = dimension * (p - q) * (p + 2 * q + 3) * (2 * p + q + 3) / 60;
            assert_eq!(
                irrep(su3, &[p, q]).cubic_index(),
                formula.into(),
                "({p},{q})"
            );
        }
    }
}

/// Values in print, by name: SU(3) 6 and 10; SU(5) as unified theories use them.
#[test]
fn by_name() {
    let cases = [
        ("SU(3)", "3bar", -1),
        ("SU(3)", "6", 7),
        ("SU(3)", "8", 0),
        ("SU(3)", "10", 27),
        ("SU(3)", "15", 14),
        ("SU(3)", "15'", 77),
        ("SU(4)", "6", 0),
        ("SU(4)", "10", 8),
        ("SU(5)", "5bar", -1),
        ("SU(5)", "10", 1),
        ("SU(5)", "15", 9),
        ("SU(5)", "24", 0),
        ("SU(5)", "35", -44),
        ("SU(5)", "40", -16),
        ("SU(5)", "45", -6),
        ("SU(5)", "50", -15),
        ("SU(6)", "15", 2),
        ("SU(6)", "20", 0),
        ("SU(6)", "21", 10),
        ("SO(6)", "4", 1),
        ("SO(6)", "10", 8),
        ("SO(10)", "16", 0),
        ("E6", "27", 0),
    ];
    for (name, written, value) in cases {
        let irrep = algebra(name).read_irrep(written).unwrap();
        assert_eq!(irrep.cubic_index(), value.into(), "{name} {written}");
        if irrep.algebra().cartan_type().to_string().starts_with('A') {
            let slow = slow(irrep.algebra());
            let character = slow.character(&signed(irrep.labels()));
            assert_eq!(slow.cubic_index(&character), value, "{name} {written}");
        }
    }
}

/// `A(R x S) = A(R) dim S + dim R A(S)`, as the products fall apart.
#[test]
fn additive_under_products() {
    let pairs: [(&str, &[i64], &[i64]); 10] = [
        ("A2", &[1, 0], &[1, 0]),
        ("A2", &[2, 1], &[0, 1]),
        ("A2", &[2, 0], &[1, 2]),
        ("A2", &[3, 1], &[1, 1]),
        ("A3", &[1, 1, 0], &[1, 0, 0]),
        ("A3", &[0, 2, 0], &[2, 0, 1]),
        ("A4", &[0, 1, 0, 0], &[0, 1, 0, 0]),
        ("A4", &[0, 1, 0, 0], &[0, 1, 0, 1]),
        ("A4", &[1, 0, 0, 1], &[2, 0, 0, 0]),
        ("A5", &[0, 1, 0, 0, 0], &[0, 0, 1, 0, 0]),
    ];
    for (name, left, right) in pairs {
        let (su, slow) = (algebra(name), SlowAlgebra::named(name));
        let (r, s) = (irrep(su, left), irrep(su, right));
        let terms = slow.product(left, right);
        let parts = terms
            .iter()
            .map(|(labels, times)| (irrep(su, labels), *times));
        let sum: BigInt = parts
            .clone()
            .map(|(part, times)| part.cubic_index() * times)
            .sum();
        let indices: BigInt = parts
            .map(|(part, times)| BigInt::from(part.dynkin_index()) * times)
            .sum();
        let dimension = |irrep: &Irrep| BigInt::from(irrep.dimension());
        let cubic = r.cubic_index() * dimension(&s) + dimension(&r) * s.cubic_index();
        assert_eq!(sum, cubic, "{name} {left:?} x {right:?}");
        let quadratic = BigInt::from(r.dynkin_index()) * dimension(&s)
            + dimension(&r) * BigInt::from(s.dynkin_index());
        assert_eq!(indices, quadratic, "{name} {left:?} x {right:?}");
    }
}
