//! Multiplicities of dominant weights: Freudenthal's recursion, plain and folded.

use crate::Error;
use crate::count::Count;
use crate::dominant_weights::DominantWeights;
use crate::frame::{Frame, FrameRoot, HELD_RANK};
use crate::lanes::Lanes;
use crate::orbit_walk::dominant;

/// The dominant weights of an irrep with their multiplicities, the highest first.
#[derive(Clone, Debug)]
pub(crate) struct DominantMultiplicities<L, C> {
    pub(crate) weights: DominantWeights<L>,
    pub(crate) counts: Vec<C>,
}

impl<L: Lanes, C: Count> DominantMultiplicities<L, C> {
    pub(crate) fn iter(&self) -> impl Iterator<Item = (&L, &C)> {
        self.weights.weights().iter().zip(&self.counts)
    }

    /// The multiplicity of a dominant weight, if it has one.
    pub(crate) fn get(&self, dominant: &L) -> Option<&C> {
        self.weights
            .place(dominant)
            .map(|place| &self.counts[place])
    }
}

/// How the sum over roots is taken.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub(crate) enum RootSum {
    /// Over every positive root ([Freudenthal 1954]).
    Plain,
    /// Over one root of each orbit of the stabiliser of the weight ([Moody-Patera 1982]).
    Folded,
}

/// The dominant weights of the irrep with highest weight `highest`, with multiplicities; `None`
/// where one does not fit in `C`.
///
/// # Errors
/// [`Error::BeyondLimit`] where there are more than `limit` dominant weights.
pub(crate) fn multiplicities<L: Lanes, C: Count>(
    frame: &Frame<L>,
    highest: &L,
    limit: usize,
) -> Result<Option<DominantMultiplicities<L, C>>, Error> {
    let weights = DominantWeights::below(frame, highest.clone(), limit)?;
    let sum = if frame.rank() <= HELD_RANK {
        RootSum::Folded
    } else {
        RootSum::Plain
    };
    Ok(recursion(frame, weights, sum))
}

/// Freudenthal's recursion on dominant weights only:
/// `(|lambda + rho|^2 - |mu + rho|^2) m(mu)` is twice the sum over positive roots a and k > 0 of
/// `m(mu + k a) (mu + k a, a)`; [Humphreys 1972], 22.3.
pub(crate) fn recursion<L: Lanes, C: Count>(
    frame: &Frame<L>,
    weights: DominantWeights<L>,
    sum: RootSum,
) -> Option<DominantMultiplicities<L, C>> {
    let mut known = DominantMultiplicities {
        weights,
        counts: vec![C::one()],
    };
    if known.weights.weights().len() == 1 {
        return Some(known);
    }
    let highest = known.weights.weights().first()?;
    let top = frame.scaled_norm(&highest.plus(&frame.rho));
    for place in 1..known.weights.weights().len() {
        let weight = known.weights.weights()[place].clone();
        let twice_sum = match sum {
            RootSum::Plain => plain_sum(frame, &known, &weight)?,
            RootSum::Folded => folded_sum(frame, &known, &weight)?,
        }
        .checked_mul(&C::of(2 * frame.metric_scale()))?;
        let gap = top - frame.scaled_norm(&weight.plus(&frame.rho));
        let (count, rest) = twice_sum.div_rem(&C::from_i128(gap)?);
        debug_assert!(rest.is_zero(), "multiplicities are whole");
        known.counts.push(count);
    }
    Some(known)
}

fn plain_sum<L: Lanes, C: Count>(
    frame: &Frame<L>,
    known: &DominantMultiplicities<L, C>,
    weight: &L,
) -> Option<C> {
    let labels = weight.labels(frame.rank());
    let mut roots = frame.positive_roots().iter();
    roots.try_fold(C::zero(), |sum, root| {
        sum.checked_add(&string_sum(frame, known, weight, &labels, root)?)
    })
}

/// Roots in one orbit of the stabiliser of mu have equal sums, and each orbit has one root with
/// no negative label at the nodes where mu has label 0. An orbit of roots orthogonal to mu holds
/// the negatives too, half of it.
fn folded_sum<L: Lanes, C: Count>(
    frame: &Frame<L>,
    known: &DominantMultiplicities<L, C>,
    weight: &L,
) -> Option<C> {
    let zeros = frame.zeros(weight);
    let labels = weight.labels(frame.rank());
    let stabiliser = frame.subgroup_order(zeros);
    let mut sum = C::zero();
    for root in frame.positive_roots() {
        if !weight.plus(&root.clipped).is_dominant() {
            continue;
        }
        let along = string_sum(frame, known, weight, &labels, root)?;
        if along.is_zero() {
            continue;
        }
        let orbit = stabiliser / frame.subgroup_order(zeros & root.zeros);
        let orthogonal = root.support & !zeros == 0;
        let positive = if orthogonal { orbit / 2 } else { orbit };
        sum = sum.plus_product(&C::from_u64(positive)?, &along)?;
    }
    Some(sum)
}

/// The sum over k > 0 of `m(mu + k a) (mu + k a, a)`.
fn string_sum<L: Lanes, C: Count>(
    frame: &Frame<L>,
    known: &DominantMultiplicities<L, C>,
    weight: &L,
    labels: &[i64],
    root: &FrameRoot<L>,
) -> Option<C> {
    let pairing = root.pairing.iter().zip(labels);
    let mut inner: i64 = pairing.map(|(c, label)| c * label).sum();
    let mut along = weight.clone();
    let mut sum = C::zero();
    loop {
        along = along.plus(&root.labels);
        inner += root.norm;
        let Some(place) = known.weights.place(&dominant(frame, along.clone())) else {
            return Some(sum);
        };
        sum = sum.plus_product(&known.counts[place], &C::of(inner))?;
    }
}
