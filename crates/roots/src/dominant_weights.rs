//! The dominant weights below a highest weight.

use num_bigint::BigInt;

use crate::frame::Frame;
use crate::lane_table::LaneTable;
use crate::lanes::Lanes;
use crate::{Error, LimitKind, SimpleAlgebra};

/// The dominant weights of an irrep, the highest first, none before one that it is below.
///
/// Any two dominant weights, one below the other, are joined by dominant weights that differ by
/// positive roots, so subtracting these from what is found finds all.
///
/// # Source
/// [Moody-Patera 1982]; [Stembridge 1998].
#[derive(Clone, Debug)]
pub(crate) struct DominantWeights<L> {
    weights: Vec<L>,
    places: LaneTable<L, u32>,
}

impl<L: Lanes> DominantWeights<L> {
    /// # Errors
    /// [`Error::BeyondLimit`] where there are more than `limit`.
    pub(crate) fn below(frame: &Frame<L>, highest: L, limit: usize) -> Result<Self, Error> {
        let mut found = LaneTable::<L, u32>::for_entries(32);
        found.at(&highest);
        if frame.is_minuscule(&highest) {
            return Ok(Self {
                weights: vec![highest],
                places: found,
            });
        }
        let mut weights = vec![(frame.level(&highest), highest)];
        let mut next = 0;
        while let Some((_, weight)) = weights.get(next).cloned() {
            next += 1;
            for root in frame.positive_roots() {
                let lower = weight.minus(&root.labels);
                if !lower.is_dominant() {
                    continue;
                }
                let before = found.len();
                found.at(&lower);
                if found.len() == before {
                    continue;
                }
                if before == limit {
                    return Err(too_many(frame, &weights[0].1, limit));
                }
                weights.push((frame.level(&lower), lower));
            }
        }
        weights.sort_by_key(|(level, _)| std::cmp::Reverse(*level));
        let weights: Vec<L> = weights.into_iter().map(|(_, weight)| weight).collect();
        for (place, weight) in (0u32..).zip(&weights) {
            *found.at(weight) = place;
        }
        Ok(Self {
            weights,
            places: found,
        })
    }

    pub(crate) fn weights(&self) -> &[L] {
        &self.weights
    }

    #[inline]
    pub(crate) fn place(&self, dominant: &L) -> Option<usize> {
        self.places.get(dominant).map(|&place| place as usize)
    }
}

/// Each simple root can be taken off a weight at most as often as it is in it, which bounds the
/// number of weights from above, often by far.
fn too_many<L: Lanes>(frame: &Frame<L>, highest: &L, limit: usize) -> Error {
    let cartan_type = frame.cartan_type();
    let inverse = SimpleAlgebra::new(cartan_type).cartan_matrix().inverse();
    let labels = highest.labels(frame.rank());
    let choices = (0..frame.rank()).map(|node| {
        let terms = labels.iter().enumerate();
        let times: BigInt = terms
            .map(|(i, &label)| BigInt::from(label) * inverse[(i, node)])
            .sum();
        times / inverse.denominator() + 1u32
    });
    let digits = choices.product::<BigInt>().to_string().len();
    Error::BeyondLimit {
        what: "the list of dominant weights".to_owned(),
        size: format!("up to 10^{digits} entries"),
        limit: limit as u64,
        raised_by: Some(LimitKind::DominantWeights),
        instead: "take smaller irreps, or raise the limit on dominant weights".to_owned(),
    }
}
