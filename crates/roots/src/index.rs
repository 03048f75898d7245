//! Quadratic Casimir, Dynkin index and cubic index.

use num_bigint::{BigInt, BigUint};
use num_rational::BigRational;
use num_traits::Zero;

use crate::orthogonal_basis::{coordinates, weyl_vector};
use crate::{CartanType, Family, SimpleAlgebra, WeightMetric};

/// The quadratic Casimir `(lambda, lambda + 2 rho) / 2`, longest root squared 2.
pub(crate) fn casimir(cartan_type: CartanType, labels: &[u32]) -> BigRational {
    let signed = labels.iter().map(|&label| i64::from(label));
    match coordinates(cartan_type, signed).zip(weyl_vector(cartan_type)) {
        Some((x, rho)) => classical_casimir(cartan_type, &x, &rho),
        None => exceptional_casimir(cartan_type, labels),
    }
}

fn classical_casimir(cartan_type: CartanType, x: &[i64], rho: &[i64]) -> BigRational {
    let with_twice_rho = x
        .iter()
        .zip(rho)
        .map(|(&x, &r)| BigInt::from(x) * (x + 2 * r));
    let sum: BigInt = with_twice_rho.sum();
    match cartan_type.family() {
        Family::A => {
            // Young rows are not traceless: take off the trace of lambda and of lambda + 2 rho.
            let n = BigInt::from(x.len());
            let trace: i64 = x.iter().sum();
            let other: i64 = trace + 2 * rho.iter().sum::<i64>();
            BigRational::new(sum * &n - BigInt::from(trace) * other, n * 2)
        }
        // Coordinates are doubled, and Sp(2N)'s long roots 2 e_i have length 2 only after a half.
        Family::C => BigRational::new(sum, 16.into()),
        _ => BigRational::new(sum, 8.into()),
    }
}

fn exceptional_casimir(cartan_type: CartanType, labels: &[u32]) -> BigRational {
    let metric = WeightMetric::exceptional(cartan_type);
    let lambda: Vec<i64> = labels.iter().map(|&label| label.into()).collect();
    let with_twice_rho: Vec<i64> = lambda.iter().map(|label| label + 2).collect();
    metric.inner_product(&lambda, &with_twice_rho) / BigInt::from(2)
}

/// The Dynkin index l = 2 C2 dim(R) / dim(G), a whole number.
pub(crate) fn dynkin_index(
    algebra: SimpleAlgebra,
    casimir: &BigRational,
    dimension: &BigUint,
) -> BigUint {
    let twice = casimir * BigInt::from(2) * BigInt::from(dimension.clone());
    let index = twice / BigInt::from(algebra.dimension());
    debug_assert!(index.is_integer(), "the Dynkin index is whole");
    index.to_integer().magnitude().clone()
}

/// The cubic index: 1 for the SU(N) fundamental, N at least 3; through SU(4) for SO(6); 0 else.
///
/// The cubic Casimir of SU(N) is, up to a factor, the sum of the cubes of the traceless
/// coordinates of lambda + rho: an invariant polynomial of degree three, odd under conjugation.
pub(crate) fn cubic_index(cartan_type: CartanType, labels: &[u32], dimension: &BigUint) -> BigInt {
    match (cartan_type.family(), labels) {
        (Family::A, labels) if labels.len() >= 2 => special_unitary(labels, dimension),
        (Family::D, &[vector, unbarred, barred]) => {
            special_unitary(&[unbarred, vector, barred], dimension)
        }
        _ => BigInt::zero(),
    }
}

fn special_unitary(labels: &[u32], dimension: &BigUint) -> BigInt {
    let n = labels.len() + 1;
    let fundamental = sum_of_cubes((0..n - 1).map(|i| u32::from(i == 0))) * BigInt::from(n);
    let whole = sum_of_cubes(labels.iter().copied()) * BigInt::from(dimension.clone());
    debug_assert!(
        (&whole % &fundamental).is_zero(),
        "the cubic index is whole"
    );
    whole / fundamental
}

/// Sum of `(N x_i)^3` over the traceless coordinates x of lambda + rho.
fn sum_of_cubes(
    labels: impl DoubleEndedIterator<Item = u32> + Clone + ExactSizeIterator,
) -> BigInt {
    let rank = labels.len();
    let su = SimpleAlgebra::su(rank + 1).expect("the rank comes from an algebra that exists");
    let rows = coordinates(su.cartan_type(), labels.map(|label| i64::from(label) + 1))
        .expect("SU(N) has an orthogonal basis");
    let n = i64::try_from(rows.len()).expect("ranks are small");
    let trace: i64 = rows.iter().sum();
    rows.iter()
        .map(|row| BigInt::from(n * row - trace).pow(3))
        .sum()
}
