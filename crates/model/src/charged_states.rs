//! Electric charges of the states of a multiplet.

use std::collections::BTreeMap;

use num_bigint::BigUint;
use num_rational::BigRational;
use num_traits::{One, Zero};
use roots::{Irrep, Limits};

use crate::{ElectricCharge, Model, Multiplet, Transformation};

/// States per electric charge, lowest charge first.
pub type ChargedStates = BTreeMap<BigRational, BigUint>;

/// Weights that are looked at for the charges of one irrep.
const MOST_WEIGHTS: u64 = 1_000_000;

impl Model {
    /// The electric charges of a multiplet's states and how many there are of each, one copy
    /// counted. `None` where the model has no electric charge, a charge that enters is unknown,
    /// or an irrep has more than a million weights.
    ///
    /// # Cost
    /// One step per weight of each irrep that the electric charge looks at.
    #[must_use]
    pub fn electric_charges(&self, multiplet: &Multiplet) -> Option<ChargedStates> {
        let charge = self.electric_charge()?;
        let mut states = ChargedStates::from([(BigRational::zero(), BigUint::one())]);
        for (place, part) in multiplet.transformations().enumerate() {
            let shares = shares(charge, place, part)?;
            let mut sums = ChargedStates::new();
            for (own, times) in &states {
                for (share, more) in &shares {
                    *sums.entry(own + share).or_default() += times * more;
                }
            }
            states = sums;
        }
        Some(states)
    }
}

/// What one symmetry adds to the electric charge of each state.
fn shares(charge: &ElectricCharge, place: usize, part: &Transformation) -> Option<ChargedStates> {
    let coefficients = charge.coefficients(place);
    match part {
        Transformation::Irrep(irrep) if coefficients.is_empty() => {
            Some([(BigRational::zero(), irrep.dimension())].into())
        }
        Transformation::Irrep(irrep) => shares_of_weights(charge, place, irrep),
        Transformation::Charge(value) => {
            let share = coefficients
                .first()
                .map_or_else(BigRational::zero, |times| times * value);
            Some([(share, BigUint::one())].into())
        }
        Transformation::UnknownCharge if !coefficients.is_empty() => None,
        Transformation::UnknownCharge | Transformation::Discrete(_) => {
            Some([(BigRational::zero(), BigUint::one())].into())
        }
    }
}

fn shares_of_weights(
    charge: &ElectricCharge,
    place: usize,
    irrep: &Irrep,
) -> Option<ChargedStates> {
    if irrep.dimension() > BigUint::from(MOST_WEIGHTS) {
        return None;
    }
    let mut shares = ChargedStates::new();
    for (dominant, multiplicity) in irrep.dominant_weights_within(&Limits::default()).ok()? {
        for weight in dominant.orbit() {
            *shares
                .entry(charge.of_weight(place, weight.labels()))
                .or_default() += &multiplicity;
        }
    }
    Some(shares)
}
