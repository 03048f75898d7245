//! Dimensions that are known at any rank.

use num_bigint::BigUint;
use roots::{Family, SimpleAlgebra};

use crate::support::algebra;

fn unit(algebra: SimpleAlgebra, node: usize, label: u32) -> roots::Irrep {
    let labels: Vec<u32> = (1..=algebra.rank())
        .map(|i| if i == node { label } else { 0 })
        .collect();
    algebra.irrep(&labels).unwrap()
}

/// From one binomial to the next: C(n, k) = C(n, k - 1) (n - k + 1) / k.
fn binomials(n: usize) -> Vec<BigUint> {
    let mut row = vec![BigUint::from(1u32)];
    for k in 1..=n {
        let next = &row[k - 1] * (n - k + 1) / k;
        row.push(next);
    }
    row
}

/// Antisymmetric tensors of SU(N) are binomials, and so are symmetric ones.
#[test]
fn special_unitary() {
    for n in [2, 3, 7, 50, 128, 257usize] {
        let su = SimpleAlgebra::su(n).unwrap();
        let row = binomials(n);
        let step = if n > 100 { 16 } else { 1 };
        for k in (1..n).step_by(step) {
            assert_eq!(
                unit(su, k, 1).dimension(),
                row[k],
                "{su}, {k} antisymmetric"
            );
        }
        for k in [1, 2, 5, 20u32] {
            let times = usize::try_from(k).unwrap();
            let expected = &binomials(n + times - 1)[times];
            assert_eq!(unit(su, 1, k).dimension(), *expected, "{su}, {k} symmetric");
        }
    }
}

/// Antisymmetric tensors of SO(N) below the spinors' nodes are binomials; spinors are powers of 2;
/// the traceless symmetric tensor has N (N + 1) / 2 - 1.
#[test]
fn orthogonal() {
    for size in [7, 8, 9, 10, 25, 64, 101, 512, 513usize] {
        let so = algebra(&format!("SO({size})"));
        let n = so.rank();
        let row = binomials(size);
        let spinors = if size % 2 == 1 { 1 } else { 2 };
        let step = if size > 100 { 37 } else { 1 };
        for k in (1..=n - spinors).step_by(step) {
            assert_eq!(
                unit(so, k, 1).dimension(),
                row[k],
                "{so}, {k} antisymmetric"
            );
        }
        let power = BigUint::from(1u32) << (n + 1 - spinors);
        for node in n - spinors + 1..=n {
            assert_eq!(
                unit(so, node, 1).dimension(),
                power,
                "{so}, spinor at {node}"
            );
        }
        let traceless = BigUint::from(size * (size + 1) / 2 - 1);
        assert_eq!(unit(so, 1, 2).dimension(), traceless, "{so}");
        assert_eq!(unit(so, 2, 1), so.adjoint(), "{so}");
    }
}

/// Fundamentals of Sp(2N) are differences of binomials; symmetric tensors keep their traces.
#[test]
fn symplectic() {
    for size in [4, 6, 8, 30, 100, 512usize] {
        let sp = algebra(&format!("Sp({size})"));
        let row = binomials(size);
        let step = if size > 100 { 17 } else { 1 };
        for k in (2..=sp.rank()).step_by(step) {
            assert_eq!(
                unit(sp, k, 1).dimension(),
                &row[k] - &row[k - 2],
                "{sp}, {k}"
            );
        }
        for k in [1, 2, 3u32] {
            let times = usize::try_from(k).unwrap();
            let expected = &binomials(size + times - 1)[times];
            assert_eq!(unit(sp, 1, k).dimension(), *expected, "{sp}, {k} symmetric");
        }
    }
}

/// The Weyl vector's irrep has dimension 2 to the number of positive roots.
#[test]
fn weyl_vector() {
    let large = ["A100", "B60", "C60", "D60"].map(algebra);
    for algebra in SimpleAlgebra::up_to_rank(12).chain(large) {
        let rho = algebra.irrep(&vec![1; algebra.rank()]).unwrap();
        let power = BigUint::from(1u32) << algebra.positive_root_count();
        assert_eq!(rho.dimension(), power, "{algebra}");
        let steps: u32 = 3;
        let tripled = algebra.irrep(&vec![steps - 1; algebra.rank()]).unwrap();
        let power = BigUint::from(steps).pow(algebra.positive_root_count().try_into().unwrap());
        assert_eq!(tripled.dimension(), power, "{algebra}");
    }
}

/// Indices at the largest ranks: (N - 2k)-like closed forms of two-index tensors.
#[test]
fn indices_at_rank_256() {
    for name in ["A256", "B256", "C256", "D256"] {
        let algebra = algebra(name);
        let n = algebra.rank();
        let (expected, size) = match algebra.cartan_type().family() {
            // Antisymmetric: N - 2. Symmetric: N + 2.
            Family::A => (n - 1, n + 3),
            // Antisymmetric: 2 (N - 2). Traceless symmetric: 2 (N + 2).
            Family::B => (2 * (2 * n - 1), 2 * (2 * n + 3)),
            Family::D => (2 * (2 * n - 2), 2 * (2 * n + 2)),
            // Traceless antisymmetric: 2N - 2. Symmetric: 2N + 2.
            _ => (2 * n - 2, 2 * n + 2),
        };
        assert_eq!(
            unit(algebra, 2, 1).dynkin_index(),
            expected.into(),
            "{name}"
        );
        assert_eq!(unit(algebra, 1, 2).dynkin_index(), size.into(), "{name}");
    }
}
