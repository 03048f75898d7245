//! Index, Casimir, dimension, conjugation and class, over random irreps and every adjoint.

use num_bigint::{BigInt, BigUint};
use num_rational::BigRational;
use num_traits::Zero;
use proptest::prelude::*;
use roots::{Congruency, Irrep, Reality, SimpleAlgebra};

use super::choices::any_irrep;
use crate::support::algebra;

proptest! {
    /// T(R) dim(G) = C2(R) dim(R), and l = 2 T.
    #[test]
    fn index_from_casimir(irrep in any_irrep()) {
        let generators = BigRational::from(BigInt::from(irrep.algebra().dimension()));
        let dimension = BigRational::from(BigInt::from(irrep.dimension()));
        prop_assert_eq!(irrep.trace_index() * generators, irrep.casimir() * dimension);
        let index = BigRational::from(BigInt::from(irrep.dynkin_index()));
        prop_assert_eq!(irrep.trace_index() * BigInt::from(2), index);
    }

    /// C2 = (lambda, lambda + 2 rho) / 2 by the metric of weights.
    #[test]
    fn casimir_from_metric(irrep in any_irrep()) {
        let metric = roots::WeightMetric::of(irrep.algebra());
        let lambda: Vec<i64> = irrep.labels().iter().map(|&l| l.into()).collect();
        let shifted: Vec<i64> = lambda.iter().map(|l| l + 2).collect();
        prop_assert_eq!(metric.inner_product(&lambda, &shifted), irrep.casimir() * BigInt::from(2));
    }

    #[test]
    fn conjugation(irrep in any_irrep()) {
        let other = irrep.conjugate();
        prop_assert_eq!(other.conjugate(), irrep.clone());
        prop_assert_eq!(other.dimension(), irrep.dimension());
        prop_assert_eq!(other.dynkin_index(), irrep.dynkin_index());
        prop_assert_eq!(other.casimir(), irrep.casimir());
        prop_assert_eq!(other.cubic_index(), -irrep.cubic_index());
        prop_assert_eq!(other.reality(), irrep.reality());
        prop_assert_eq!(irrep.reality() == Reality::Complex, other != irrep);
        prop_assert_eq!(other.congruency(), negative(irrep.algebra(), irrep.congruency()));
    }

    /// Every label raised raises dimension, index and Casimir.
    #[test]
    fn grows_with_labels(irrep in any_irrep(), place in any::<prop::sample::Index>()) {
        let mut labels = irrep.labels().to_vec();
        labels[place.index(irrep.labels().len())] += 1;
        let raised = irrep.algebra().irrep(&labels).unwrap();
        prop_assert!(raised.dimension() > irrep.dimension());
        prop_assert!(raised.dynkin_index() > irrep.dynkin_index());
        prop_assert!(raised.casimir() > irrep.casimir());
    }

    /// Two irreps are of one class exactly where their highest weights differ by roots.
    #[test]
    fn class_is_the_weight_modulo_roots((left, right) in any_irrep().prop_flat_map(|left| {
        let algebra = left.algebra();
        (Just(left), super::choices::irrep_of(algebra, 0..5u32))
    })) {
        let inverse = left.algebra().cartan_matrix().inverse();
        let order = i64::from(inverse.denominator());
        let difference: Vec<i64> = left
            .labels()
            .iter()
            .zip(right.labels())
            .map(|(&l, &r)| i64::from(l) - i64::from(r))
            .collect();
        let by_roots = (0..difference.len()).all(|j| {
            let terms = difference.iter().zip(inverse.rows());
            terms.map(|(d, row)| d * i64::from(row[j])).sum::<i64>() % order == 0
        });
        prop_assert_eq!(left.congruency() == right.congruency(), by_roots);
    }
}

fn negative(algebra: SimpleAlgebra, class: Congruency) -> Congruency {
    let order = algebra.center().order();
    match class {
        Congruency::Cyclic(class) => Congruency::Cyclic((order - class) % order),
        Congruency::Pair(first, second) => Congruency::Pair(first, (4 - second) % 4),
    }
}

fn check_adjoint(algebra: SimpleAlgebra) {
    let adjoint = algebra.adjoint();
    let roots = algebra.root_system();
    let dual_coxeter = roots.dual_coxeter_number();
    assert_eq!(
        adjoint.dimension(),
        BigUint::from(algebra.dimension()),
        "{algebra}"
    );
    assert_eq!(
        adjoint.dynkin_index(),
        BigUint::from(2 * dual_coxeter),
        "{algebra}"
    );
    assert_eq!(
        adjoint.casimir(),
        BigInt::from(dual_coxeter).into(),
        "{algebra}"
    );
    assert_eq!(adjoint.reality(), Reality::Real, "{algebra}");
    assert!(adjoint.cubic_index().is_zero(), "{algebra}");
    assert_eq!(adjoint.conjugate(), adjoint, "{algebra}");
    assert_eq!(
        adjoint.congruency(),
        algebra.singlet().congruency(),
        "{algebra}"
    );

    let matrix = algebra.cartan_matrix();
    let highest = roots.highest_root().coefficients();
    for (j, &label) in adjoint.labels().iter().enumerate() {
        let column = (0..algebra.rank()).map(|i| i64::from(highest[i]) * i64::from(matrix[(i, j)]));
        assert_eq!(column.sum::<i64>(), i64::from(label), "{algebra}, node {j}");
    }
    let same_size = roots::NameBook::new(algebra)
        .of_dimension(&adjoint.dimension())
        .to_vec();
    let again = same_size
        .iter()
        .filter(|irrep| irrep.labels() == adjoint.labels());
    assert_eq!(again.count(), 1, "{algebra}");
}

#[test]
fn adjoints() {
    for algebra in SimpleAlgebra::up_to_rank(12) {
        check_adjoint(algebra);
    }
    for name in ["A50", "B50", "C50", "D50", "D51", "A256"] {
        check_adjoint(algebra(name));
    }
}

#[test]
fn singlets() {
    for algebra in SimpleAlgebra::up_to_rank(12).chain([algebra("B256")]) {
        let singlet = algebra.singlet();
        assert!(singlet.is_singlet());
        let facts = (
            singlet.dimension(),
            singlet.dynkin_index(),
            singlet.casimir(),
        );
        assert_eq!(
            facts,
            (1u32.into(), 0u32.into(), BigRational::zero()),
            "{algebra}"
        );
        assert_eq!(singlet.reality(), Reality::Real, "{algebra}");
        assert_eq!(singlet.name(), "1", "{algebra}");
    }
}

/// Indices that the conventions fix: 1 for SU(N) and Sp(2N) fundamentals, 2 for SO(N) vectors.
#[test]
fn defining_irreps() {
    for algebra in SimpleAlgebra::up_to_rank(12) {
        let first = |irrep: Irrep| (irrep.dimension(), irrep.dynkin_index(), irrep.casimir());
        let labels: Vec<u32> = (0..algebra.rank()).map(|i| u32::from(i == 0)).collect();
        let (dimension, index, casimir) = first(algebra.irrep(&labels).unwrap());
        let n = algebra.rank();
        let expected = match algebra.cartan_type().family() {
            roots::Family::A => (n + 1, 1),
            roots::Family::B => (2 * n + 1, 2),
            roots::Family::C => (2 * n, 1),
            roots::Family::D => (2 * n, 2),
            _ => continue,
        };
        assert_eq!(
            (dimension, index),
            (expected.0.into(), u32::into(expected.1)),
            "{algebra}"
        );
        if algebra.cartan_type().family() == roots::Family::A {
            let size = BigInt::from(n + 1);
            assert_eq!(
                casimir,
                BigRational::new(&size * &size - 1, size * 2),
                "{algebra}"
            );
        }
    }
}
