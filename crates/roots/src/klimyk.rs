//! Products by reflection: the highest weights of one factor plus every weight of the other.

use crate::count::Count;
use crate::frame::Frame;
use crate::lane_table::LaneTable;
use crate::lanes::Lanes;
use crate::multiplicities::DominantMultiplicities;
use crate::orbit_walk::{OrbitWalk, strictly_dominant};
use crate::{Error, Limits};

/// Irreps by their highest weights, each with a count that may be negative.
pub(crate) type Counted<L, C> = Vec<(L, C)>;

/// The product of a sum of irreps with the irrep whose dominant weights are `factor`, its weights
/// first multiplied by `scale` (1, or the degree of an Adams operation).
///
/// Each weight mu of the factor adds, for each irrep lambda of the sum, the irrep of
/// `lambda + mu`: reflected into the dominant chamber about -rho, with the sign of the
/// reflections, or nothing on a wall. `None` where the counts could leave `C`.
///
/// # Errors
/// [`Error::BeyondLimit`] where there are more terms or weights than `limits` allow.
/// # Cost
/// One reflection per weight of the factor and irrep of the sum; memory for the terms only.
/// # Source
/// [Brauer 1937]; [Klimyk 1968]; [Humphreys 1972], exercise 24.9.
pub(crate) fn times<L: Lanes, C: Count>(
    frame: &Frame<L>,
    sum: &[(L, C)],
    factor: &Factor<L, C>,
    scale: i64,
    limits: &Limits,
) -> Result<Option<LaneTable<L, C>>, Error> {
    let walked = factor.weights.saturating_mul(sum.len() as u64);
    if walked > limits.weights() {
        return Err(limits.too_many_weights(walked));
    }
    if !fits(sum, factor) {
        return Ok(None);
    }
    let shifted: Vec<(L, C)> = sum
        .iter()
        .map(|(weight, count)| (weight.plus(&frame.rho), count.clone()))
        .collect();
    let expected = usize::try_from(walked).map_or(MOST_EXPECTED, |n| n.min(MOST_EXPECTED));
    let mut terms = LaneTable::for_entries(expected);
    let mut walk = OrbitWalk::new();
    for (dominant, multiplicity) in factor.multiplicities.iter() {
        walk.restart(dominant.times(scale));
        while walk.step(frame, |weight| {
            for (highest, count) in &shifted {
                let Some((term, odd)) = strictly_dominant(frame, highest.plus(weight)) else {
                    continue;
                };
                let product = count.clone() * multiplicity.clone();
                *terms.at(&term) += if odd { -product } else { product };
            }
        }) {
            if terms.len() > limits.terms() {
                return Err(limits.too_many_terms(walked));
            }
        }
    }
    Ok(Some(terms))
}

/// Entries that a table has room for from the start, at most.
const MOST_EXPECTED: usize = 512;

/// The irrep that is walked through.
#[derive(Clone, Debug)]
pub(crate) struct Factor<L, C> {
    pub(crate) multiplicities: DominantMultiplicities<L, C>,
    /// Number of different weights.
    pub(crate) weights: u64,
    /// Number of weights, each as often as it is there.
    pub(crate) dimension: C,
}

/// Whether no partial sum can leave `C`: all together they add up to no more, sizes taken, than
/// the sum of the counts times the dimension.
fn fits<L, C: Count>(sum: &[(L, C)], factor: &Factor<L, C>) -> bool {
    let size = |count: &C| {
        if *count < C::zero() {
            C::zero().checked_sub(count)
        } else {
            Some(count.clone())
        }
    };
    let mut counts = sum.iter();
    let total = counts.try_fold(C::zero(), |total, (_, count)| {
        total.checked_add(&size(count)?)
    });
    total.is_some_and(|total| total.checked_mul(&factor.dimension).is_some())
}

/// The entries with rho taken off again.
pub(crate) fn unshifted<L: Lanes, C: Count>(
    frame: &Frame<L>,
    terms: &LaneTable<L, C>,
) -> Counted<L, C> {
    terms.collect(|shifted, count| {
        (!count.is_zero()).then(|| (shifted.minus(&frame.rho), count.clone()))
    })
}
