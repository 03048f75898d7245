//! Weyl's dimension formula, exact at any size.

use std::ops::ControlFlow;

use num_bigint::BigUint;
use num_integer::Integer;
use num_traits::One;

use crate::orthogonal_basis::{coordinates, weyl_vector};
use crate::{CartanType, Family, RootSystem};

/// The dimension of the irrep with highest weight `labels`.
///
/// # Source
/// Weyl's formula: the product over positive coroots of `(lambda + rho, alpha) / (rho, alpha)`,
/// [Humphreys 1972], 24.3.
pub(crate) fn dimension(cartan_type: CartanType, labels: &[u32]) -> BigUint {
    let mut product = Quotient::default();
    let whole = for_each_factor(cartan_type, labels, |above, below| {
        product.times(above, below);
        ControlFlow::Continue(())
    });
    debug_assert!(whole.is_continue());
    product.value()
}

/// Number of weights in the Weyl orbit of a dominant weight.
///
/// # Source
/// The order of a Weyl group is the product over positive coroots of `(height + 1) / height`
/// ([Macdonald 1972]); that of the stabiliser is the part of it over coroots orthogonal to the
/// weight.
pub(crate) fn orbit_size(cartan_type: CartanType, labels: &[u32]) -> BigUint {
    let mut product = Quotient::default();
    let _ = for_each_factor(cartan_type, labels, |_, below| {
        product.times(below + 1, below);
        ControlFlow::Continue(())
    });
    product.value()
}

/// The dimension where it is at most `most`, which is found out as soon as it is passed: no
/// factor of Weyl's formula is below one.
pub(crate) fn dimension_at_most(
    cartan_type: CartanType,
    labels: &[u32],
    most: &BigUint,
) -> Option<BigUint> {
    let Ok(small) = u128::try_from(most) else {
        return Some(dimension(cartan_type, labels)).filter(|dimension| dimension <= most);
    };
    let mut product = Quotient::default();
    let whole = for_each_factor(cartan_type, labels, |above, below| {
        product.times(above, below);
        if product.is_past(small) {
            ControlFlow::Break(())
        } else {
            ControlFlow::Continue(())
        }
    });
    let whole = whole.is_continue().then(|| product.value());
    whole.filter(|dimension| dimension <= most)
}

/// Calls `take` with the pairings of lambda + rho and of rho with positive coroots until it breaks
/// off; the second is the height of the coroot. Pairs that are equal are left out.
fn for_each_factor(
    cartan_type: CartanType,
    labels: &[u32],
    mut take: impl FnMut(u64, u64) -> ControlFlow<()>,
) -> ControlFlow<()> {
    let shifted = labels.iter().map(|&label| i64::from(label) + 1);
    let mut take = |above: u64, below: u64| {
        if above == below {
            return ControlFlow::Continue(());
        }
        take(above, below)
    };
    let Some((x, rho)) = coordinates(cartan_type, shifted).zip(weyl_vector(cartan_type)) else {
        return exceptional_factors(cartan_type, labels, take);
    };
    let positive = |value: i64| u64::try_from(value).expect("lambda + rho is strictly dominant");
    let family = cartan_type.family();
    // All but SU(N) have doubled coordinates, all even or all odd.
    let unit = if family == Family::A { 1 } else { 2 };
    let own = if family == Family::C { 2 } else { 1 };
    for i in 0..x.len() {
        for j in i + 1..x.len() {
            let difference = |y: &[i64]| positive(y[i] - y[j]) / unit;
            take(difference(&x), difference(&rho))?;
            if family != Family::A {
                let sum = |y: &[i64]| positive(y[i] + y[j]) / unit;
                take(sum(&x), sum(&rho))?;
            }
        }
        if matches!(family, Family::B | Family::C) {
            take(positive(x[i]) / own, positive(rho[i]) / own)?;
        }
    }
    ControlFlow::Continue(())
}

fn exceptional_factors(
    cartan_type: CartanType,
    labels: &[u32],
    mut take: impl FnMut(u64, u64) -> ControlFlow<()>,
) -> ControlFlow<()> {
    for root in RootSystem::exceptional(cartan_type).positive_roots() {
        let height: u64 = root.coroot().iter().copied().map(u64::from).sum();
        let terms = root.coroot().iter().zip(labels);
        let pairing: u64 = terms
            .map(|(&c, &label)| u64::from(c) * u64::from(label))
            .sum();
        take(pairing + height, height)?;
    }
    ControlFlow::Continue(())
}

/// A product of fractions: small while it can be, large when it must.
struct Quotient {
    above: u128,
    below: u128,
    spilled_above: BigUint,
    spilled_below: BigUint,
}

impl Default for Quotient {
    fn default() -> Self {
        Self {
            above: 1,
            below: 1,
            spilled_above: BigUint::one(),
            spilled_below: BigUint::one(),
        }
    }
}

impl Quotient {
    fn times(&mut self, above: u64, below: u64) {
        if self.times_small(above, below) {
            return;
        }
        let common = self.above.gcd(&self.below);
        self.above /= common;
        self.below /= common;
        if !self.times_small(above, below) {
            self.spilled_above *= std::mem::replace(&mut self.above, above.into());
            self.spilled_below *= std::mem::replace(&mut self.below, below.into());
        }
    }

    fn times_small(&mut self, above: u64, below: u64) -> bool {
        let products = (
            self.above.checked_mul(above.into()),
            self.below.checked_mul(below.into()),
        );
        if let (Some(a), Some(b)) = products {
            (self.above, self.below) = (a, b);
            return true;
        }
        false
    }

    /// Whether what has been multiplied so far is above `most`. While it cannot be told in small
    /// numbers it is left open.
    fn is_past(&self, most: u128) -> bool {
        self.spilled_above.is_one()
            && most
                .checked_mul(self.below)
                .is_some_and(|bound| self.above > bound)
    }

    fn value(self) -> BigUint {
        if self.spilled_above.is_one() && self.spilled_below.is_one() {
            return (self.above / self.below).into();
        }
        (self.spilled_above * self.above) / (self.spilled_below * self.below)
    }
}
