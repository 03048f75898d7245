//! Tensor products: which way is taken, and the calls that ask for one.

use std::collections::HashMap;

use crate::count::{Count, in_width};
use crate::decomposition::{highest_weight, irrep_of};
use crate::frame::{Frame, label_bound};
use crate::klimyk::{self, Counted, Factor};
use crate::lanes::{Lanes, on_lanes};
use crate::littlewood_richardson::{Budget, Stopped};
use crate::multiplicities::multiplicities;
use crate::{Decomposition, Error, Family, Irrep, Limits, SimpleAlgebra, littlewood_richardson};

impl SimpleAlgebra {
    /// The tensor product of any number of irreps; of none, the singlet.
    ///
    /// # Errors
    /// [`Error::MixedAlgebras`]; [`Error::BeyondLimit`] where it is too
    /// large for the [`Limits`].
    /// # Cost
    /// For two factors, one reflection per different weight of the smaller one, or for SU(N) one
    /// Young tableau per irrep in the product, whichever is estimated to be less; more factors are
    /// multiplied in one after the other, the largest first.
    /// # Source
    /// [Klimyk 1968]; [Littlewood-Richardson 1934]; checked against the tables of [Slansky 1981]
    /// and [Yamatsu 2015].
    ///
    /// ```
    /// let e8: roots::SimpleAlgebra = "E8".parse()?;
    /// let adjoint = e8.adjoint();
    /// let product = e8.product(&[adjoint.clone(), adjoint])?;
    /// let mut terms: Vec<_> = product.irreps().cloned().collect();
    /// roots::NameBook::sort(&mut terms);
    /// let names: Vec<String> = terms.iter().map(|irrep| irrep.name()).collect();
    /// assert_eq!(names, ["1", "248", "3875", "27000", "30380"]);
    /// # Ok::<(), roots::Error>(())
    /// ```
    pub fn product(self, factors: &[Irrep]) -> Result<Decomposition, Error> {
        self.product_within(factors, &Limits::default())
    }

    /// As [`product`](Self::product), within limits of one's own.
    ///
    /// # Errors
    /// As [`product`](Self::product).
    pub fn product_within(
        self,
        factors: &[Irrep],
        limits: &Limits,
    ) -> Result<Decomposition, Error> {
        check_factors(self, factors)?;
        let bound = product_bound(self, factors)?;
        on_lanes!(self.cartan_type(), bound, |held| {
            product_in(self, &held, factors, limits)
        })
    }
}

impl Irrep {
    /// The tensor product with another irrep of the same algebra.
    ///
    /// # Errors
    /// As [`SimpleAlgebra::product`].
    ///
    /// ```
    /// let su3: roots::SimpleAlgebra = "SU(3)".parse()?;
    /// let (quark, antiquark) = (su3.read_irrep("3")?, su3.read_irrep("3bar")?);
    /// let names: Vec<String> = quark.product(&antiquark)?.irreps().map(|irrep| irrep.name()).collect();
    /// assert_eq!(names, ["1", "8"]);
    /// # Ok::<(), roots::Error>(())
    /// ```
    pub fn product(&self, other: &Self) -> Result<Decomposition, Error> {
        self.product_within(other, &Limits::default())
    }

    /// As [`product`](Self::product), within limits of one's own.
    ///
    /// # Errors
    /// As [`SimpleAlgebra::product`].
    pub fn product_within(&self, other: &Self, limits: &Limits) -> Result<Decomposition, Error> {
        let algebra = self.algebra();
        check_factors(algebra, std::slice::from_ref(other))?;
        let bound = bound_of(algebra, [self, other].into_iter())?;
        on_lanes!(algebra.cartan_type(), bound, |held| {
            product_of_two(algebra, &held, self, other, limits)
        })
    }
}

/// Every factor is of `algebra`.
pub(crate) fn check_factors(algebra: SimpleAlgebra, factors: &[Irrep]) -> Result<(), Error> {
    match factors.iter().find(|irrep| irrep.algebra() != algebra) {
        None => Ok(()),
        Some(stranger) => Err(Error::MixedAlgebras {
            algebra: algebra.to_string(),
            irrep: format!("{stranger:?}"),
        }),
    }
}

fn product_bound(algebra: SimpleAlgebra, factors: &[Irrep]) -> Result<u64, Error> {
    bound_of(algebra, factors.iter())
}

/// The bound on labels, itself within `u32`, since irreps have no larger labels.
pub(crate) fn bound_of<'a>(
    algebra: SimpleAlgebra,
    factors: impl Iterator<Item = &'a Irrep>,
) -> Result<u64, Error> {
    let bound = label_bound(algebra.cartan_type(), factors.map(Irrep::labels));
    within_u32(bound, "this product")?;
    Ok(bound)
}

/// Irreps have labels within `u32`, and so must what is made of them.
pub(crate) fn within_u32(bound: u64, what: &str) -> Result<(), Error> {
    if bound <= u32::MAX.into() {
        return Ok(());
    }
    Err(Error::BeyondLimit {
        what: what.to_owned(),
        size: format!("labels up to {bound}"),
        limit: u32::MAX.into(),
        raised_by: None,
        instead: "take irreps with smaller labels".to_owned(),
    })
}

fn product_in<L: Lanes>(
    algebra: SimpleAlgebra,
    frame: &Frame<L>,
    factors: &[Irrep],
    limits: &Limits,
) -> Result<Decomposition, Error> {
    match factors {
        [left, right] => product_of_two(algebra, frame, left, right, limits),
        _ => Ok(in_width!(Counts => {
            let sum = many::<L, Counts>(frame, factors, limits)?;
            sum.and_then(|sum| Decomposition::from_counts(algebra, sum))
        })),
    }
}

/// The product of any number of factors: the largest first, and so the fewest terms as long as
/// can be.
fn many<L: Lanes, C: Count>(
    frame: &Frame<L>,
    factors: &[Irrep],
    limits: &Limits,
) -> Result<Option<Counted<L, C>>, Error> {
    let mut by_size: Vec<&Irrep> = factors.iter().collect();
    by_size.sort_by_cached_key(|irrep| {
        std::cmp::Reverse((irrep.dimension(), irrep.labels().to_vec()))
    });
    let Some((largest, rest)) = by_size.split_first() else {
        return Ok(Some(vec![(singlet(frame), C::one())]));
    };
    let mut sum: Counted<L, C> = vec![(highest_weight(largest), C::one())];
    let mut walked: HashMap<&Irrep, Option<Factor<L, C>>> = HashMap::new();
    for &irrep in rest {
        if !walked.contains_key(irrep) {
            let factor = factor(frame, irrep, limits)?;
            walked.insert(irrep, factor);
        }
        let Some(Some(factor)) = walked.get(irrep) else {
            return Ok(None);
        };
        match klimyk::times(frame, &sum, factor, 1, limits)? {
            Some(terms) => sum = klimyk::unshifted(frame, &terms),
            None => return Ok(None),
        }
    }
    Ok(Some(sum))
}

/// The highest weight of the singlet.
pub(crate) fn singlet<L: Lanes>(frame: &Frame<L>) -> L {
    L::pack((0..frame.rank()).map(|_| 0))
}

/// The dominant weights of an irrep and how many weights there are; `None` where the numbers do
/// not fit in `C`.
pub(crate) fn factor<L: Lanes, C: Count>(
    frame: &Frame<L>,
    irrep: &Irrep,
    limits: &Limits,
) -> Result<Option<Factor<L, C>>, Error> {
    let highest = highest_weight(irrep);
    let found = multiplicities(frame, &highest, limits.dominant_weights())?;
    let Some(multiplicities) = found else {
        return Ok(None);
    };
    let mut weights = 0u64;
    let mut dimension = C::zero();
    for (dominant, count) in multiplicities.iter() {
        let Some(size) = orbit_size(irrep.algebra(), frame, dominant) else {
            return Err(limits.too_many_weights("more than 10^19"));
        };
        weights = weights.saturating_add(size);
        let Some(sum) = C::from_u64(size).and_then(|size| dimension.plus_product(&size, count))
        else {
            return Ok(None);
        };
        dimension = sum;
    }
    Ok(Some(Factor {
        multiplicities,
        weights,
        dimension,
    }))
}

/// Number of weights in the orbit of a dominant weight, if it is below 2^64.
fn orbit_size<L: Lanes>(algebra: SimpleAlgebra, frame: &Frame<L>, dominant: &L) -> Option<u64> {
    if frame.rank() <= crate::frame::HELD_RANK {
        return Some(frame.orbit_size(dominant));
    }
    let irrep = irrep_of(algebra, dominant);
    let size = crate::dimension::orbit_size(algebra.cartan_type(), irrep.labels());
    u64::try_from(size).ok()
}

fn product_of_two<L: Lanes>(
    algebra: SimpleAlgebra,
    frame: &Frame<L>,
    left: &Irrep,
    right: &Irrep,
    limits: &Limits,
) -> Result<Decomposition, Error> {
    // The height of the highest weight over the lowest: a cheap measure of the number of weights.
    let level = |irrep: &Irrep| frame.level(&highest_weight::<L>(irrep));
    let (large, small) = if level(left) < level(right) {
        (right, left)
    } else {
        (left, right)
    };
    if algebra.cartan_type().family() != Family::A {
        return by_reflection(algebra, frame, large, small, limits);
    }
    let budget = tableau_budget(frame, small);
    if let Some(product) = by_tableaux::<L>(large, small, budget, limits)? {
        return Ok(product);
    }
    // Where there are too many weights, there may still be few tableaux.
    let reflected = by_reflection(algebra, frame, large, small, limits);
    match reflected {
        Err(Error::BeyondLimit { .. }) => {
            let tableaux = by_tableaux::<L>(large, small, limits.weights(), limits)?;
            tableaux.map_or(reflected, Ok)
        }
        done => done,
    }
}

fn by_reflection<L: Lanes>(
    algebra: SimpleAlgebra,
    frame: &Frame<L>,
    large: &Irrep,
    small: &Irrep,
    limits: &Limits,
) -> Result<Decomposition, Error> {
    Ok(in_width!(Counts => {
        match factor::<L, Counts>(frame, small, limits)? {
            None => None,
            Some(factor) => {
                let sum = [(highest_weight::<L>(large), Counts::of(1))];
                let terms = klimyk::times(frame, &sum, &factor, 1, limits)?;
                terms.and_then(|terms| {
                    Decomposition::from_counts(algebra, klimyk::unshifted(frame, &terms))
                })
            }
        }
    }))
}

/// The product of two irreps of SU(N) by Young tableaux; `None` where it takes more steps.
fn by_tableaux<L: Lanes>(
    large: &Irrep,
    small: &Irrep,
    steps: u64,
    limits: &Limits,
) -> Result<Option<Decomposition>, Error> {
    let rows = littlewood_richardson::rows;
    let budget = Budget {
        steps,
        terms: limits.terms(),
    };
    match littlewood_richardson::product::<L>(&rows(large.labels()), &rows(small.labels()), budget)
    {
        Err(Stopped::Budget) => Ok(None),
        Err(Stopped::Terms) => {
            // As many terms as weights, and those as many as the dimension, at most.
            let weights = large.dimension().min(small.dimension());
            Err(limits.too_many_terms(weights))
        }
        Ok(terms) => {
            let terms = terms.collect(|weight, &n| Some((weight.clone(), i128::from(n))));
            Ok(Decomposition::from_counts(large.algebra(), terms))
        }
    }
}

/// Steps that tableaux may take before reflection is tried. There are at least as many weights as
/// in the highest orbit, and a step costs about as much as a weight; irreps with few tableaux,
/// such as symmetric tensors, need about as many steps as they have boxes and rows. What is spent
/// in vain is a small part of what reflection takes.
fn tableau_budget<L: Lanes>(frame: &Frame<L>, small: &Irrep) -> u64 {
    let highest = highest_weight(small);
    if frame.rank() == 1 {
        // Each term has one tableau.
        return u64::MAX;
    }
    let orbit = orbit_size(small.algebra(), frame, &highest).unwrap_or(u64::MAX);
    let boxes = frame.level(&highest).unsigned_abs();
    (orbit / 8).max(boxes.saturating_mul(frame.rank() as u64 / 4))
}
