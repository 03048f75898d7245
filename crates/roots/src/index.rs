//! Quadratic Casimir, Dynkin index and cubic index.

use num_bigint::{BigInt, BigUint};
use num_integer::Integer;
use num_rational::BigRational;
use num_traits::Zero;

use crate::dimension::dimension;
use crate::orthogonal_basis::{coordinates, weyl_vector};
use crate::{CartanType, Family, SimpleAlgebra, WeightMetric};

/// The quadratic Casimir `(lambda, lambda + 2 rho) / 2`, longest root squared 2.
pub(crate) fn casimir(cartan_type: CartanType, labels: &[u32]) -> BigRational {
    let (above, below) = casimir_parts(cartan_type, labels);
    BigRational::new(above.into(), below.into())
}

/// The Casimir as a fraction that may not be in its lowest terms. Coordinates stay below 2^42 and
/// there are at most 257 of them, so that 128 bits hold every sum of products.
fn casimir_parts(cartan_type: CartanType, labels: &[u32]) -> (u128, u128) {
    let signed = labels.iter().map(|&label| i64::from(label));
    let (above, below) = match coordinates(cartan_type, signed).zip(weyl_vector(cartan_type)) {
        Some((x, rho)) => classical_casimir(cartan_type, &x, &rho),
        None => exceptional_casimir(cartan_type, labels),
    };
    (above.unsigned_abs(), below.unsigned_abs())
}

fn classical_casimir(cartan_type: CartanType, x: &[i64], rho: &[i64]) -> (i128, i128) {
    let with_twice_rho = x
        .iter()
        .zip(rho)
        .map(|(&x, &r)| i128::from(x) * i128::from(x + 2 * r));
    let sum: i128 = with_twice_rho.sum();
    match cartan_type.family() {
        Family::A => {
            // Young rows are not traceless: take off the trace of lambda and of lambda + 2 rho.
            let n = i128::from(cartan_type.rank_u16()) + 1;
            let trace: i64 = x.iter().sum();
            let other: i64 = trace + 2 * rho.iter().sum::<i64>();
            (sum * n - i128::from(trace) * i128::from(other), n * 2)
        }
        // Coordinates are doubled, and Sp(2N)'s long roots 2 e_i have length 2 only after a half.
        Family::C => (sum, 16),
        _ => (sum, 8),
    }
}

fn exceptional_casimir(cartan_type: CartanType, labels: &[u32]) -> (i128, i128) {
    let metric = WeightMetric::exceptional(cartan_type);
    let mut sum = 0;
    for (row, &label) in metric.rows().zip(labels) {
        let terms = row.iter().zip(labels);
        let paired: i128 = terms
            .map(|(&g, &l)| i128::from(g) * (i128::from(l) + 2))
            .sum();
        sum += paired * i128::from(label);
    }
    (sum, i128::from(metric.denominator()) * 2)
}

/// The Dynkin index l = 2 C2 dim(R) / dim(G), a whole number.
pub(crate) fn dynkin_index(algebra: SimpleAlgebra, labels: &[u32], dimension: &BigUint) -> BigUint {
    let (above, below) = casimir_parts(algebra.cartan_type(), labels);
    let twice = dimension * above * 2u32;
    let (index, rest) = twice.div_rem(&(BigUint::from(algebra.dimension()) * below));
    debug_assert!(rest.is_zero(), "the Dynkin index is whole");
    index
}

/// The largest dimension that goes with the Casimir of `labels` and a Dynkin index of at most
/// `most`; none for the singlet, whose index is 0.
pub(crate) fn largest_dimension(
    algebra: SimpleAlgebra,
    labels: &[u32],
    most: &BigUint,
) -> Option<BigUint> {
    let (above, below) = casimir_parts(algebra.cartan_type(), labels);
    (above > 0).then(|| most * algebra.dimension() * below / (BigUint::from(above) * 2u32))
}

/// The cubic index: 1 for the SU(N) fundamental, N at least 3; through SU(4) for SO(6); 0 else.
///
/// The cubic Casimir of SU(N) is, up to a factor, the sum of the cubes of the traceless
/// coordinates of lambda + rho: an invariant polynomial of degree three, odd under conjugation.
pub(crate) fn cubic_index(cartan_type: CartanType, labels: &[u32]) -> BigInt {
    match (cartan_type.family(), labels) {
        (Family::A, labels) if labels.len() >= 2 => {
            special_unitary(labels, &dimension(cartan_type, labels))
        }
        (Family::D, &[vector, unbarred, barred]) => {
            special_unitary(&[unbarred, vector, barred], &dimension(cartan_type, labels))
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
