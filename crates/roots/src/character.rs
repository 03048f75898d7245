//! Characters: sums of weights that the Weyl group leaves alone.

use std::collections::{BTreeMap, BinaryHeap};

use num_bigint::BigInt;
use num_traits::Zero;

use crate::count::{Count, in_width};
use crate::decomposition::irrep_of;
use crate::dimension::orbit_size;
use crate::frame::{Frame, label_bound};
use crate::lane_table::LaneTable;
use crate::lanes::{Lanes, on_lanes};
use crate::multiplicities::multiplicities;
use crate::orbit_walk::{OrbitWalk, dominant};
use crate::tensor_product::{bound_of, within_u32};
use crate::weight_division::per_weight;
use crate::{Decomposition, Error, Irrep, Limits, SimpleAlgebra, Weight};

/// A character, possibly a virtual one: the multiplicity of each dominant weight, which is that of
/// its whole Weyl orbit, and may be negative.
///
/// ```
/// use roots::{Character, SimpleAlgebra};
/// let su3: SimpleAlgebra = "SU(3)".parse()?;
/// let triplet = Character::of(&su3.irrep(&[1, 0])?)?;
/// // Sym^2 - Alt^2 is the second Adams operation.
/// let sextet = Character::of(&su3.irrep(&[2, 0])?)?;
/// let antitriplet = Character::of(&su3.irrep(&[0, 1])?)?;
/// assert_eq!(triplet.adams(2)?, sextet.minus(&antitriplet)?);
/// # Ok::<(), roots::Error>(())
/// ```
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Character {
    algebra: SimpleAlgebra,
    /// Dominant weights; none with multiplicity zero.
    weights: BTreeMap<Irrep, BigInt>,
}

impl Character {
    /// The character of the empty sum.
    #[must_use]
    pub const fn zero(algebra: SimpleAlgebra) -> Self {
        Self {
            algebra,
            weights: BTreeMap::new(),
        }
    }

    /// The character of an irrep.
    ///
    /// # Errors
    /// As [`Irrep::dominant_weights`].
    pub fn of(irrep: &Irrep) -> Result<Self, Error> {
        Self::of_within(irrep, &Limits::default())
    }

    /// As [`of`](Self::of), within limits of one's own.
    ///
    /// # Errors
    /// As [`Irrep::dominant_weights`].
    pub fn of_within(irrep: &Irrep, limits: &Limits) -> Result<Self, Error> {
        // Dominant weights are held as irreps, and so within u32.
        bound_of(irrep.algebra(), std::iter::once(irrep))?;
        let dominant = irrep.dominant_weights_within(limits)?;
        let weights = dominant.into_iter().map(|(weight, times)| {
            let weight = weight.irrep().expect("labels are within the bound");
            (weight, times.into())
        });
        Ok(Self {
            algebra: irrep.algebra(),
            weights: weights.collect(),
        })
    }

    /// The character of a sum of irreps.
    ///
    /// # Errors
    /// As [`Irrep::dominant_weights`].
    pub fn of_sum(sum: &Decomposition) -> Result<Self, Error> {
        let mut whole = Self::zero(sum.algebra());
        for (irrep, times) in sum.iter() {
            whole.add_times(&Self::of(irrep)?, &times.into());
        }
        Ok(whole)
    }

    fn add_times(&mut self, other: &Self, factor: &BigInt) {
        for (weight, times) in &other.weights {
            *self.weights.entry(weight.clone()).or_default() += times * factor;
        }
        self.weights.retain(|_, times| !times.is_zero());
    }

    /// The algebra.
    #[must_use]
    pub const fn algebra(&self) -> SimpleAlgebra {
        self.algebra
    }

    /// The dominant weights with their multiplicities, by their labels.
    pub fn dominant_weights(&self) -> impl ExactSizeIterator<Item = (Weight, &BigInt)> {
        let weights = self.weights.iter();
        weights.map(|(irrep, times)| (irrep.highest_weight(), times))
    }

    /// How often a weight is there; zero for a weight of another algebra.
    #[must_use]
    pub fn multiplicity(&self, weight: &Weight) -> BigInt {
        let dominant = weight.dominant().irrep();
        let found = dominant.and_then(|dominant| self.weights.get(&dominant));
        found.cloned().unwrap_or_default()
    }

    /// Number of weights, each as often as it is there.
    #[must_use]
    pub fn dimension(&self) -> BigInt {
        let orbits = self.weights.iter().map(|(weight, times)| {
            BigInt::from(orbit_size(self.algebra.cartan_type(), weight.labels())) * times
        });
        orbits.sum()
    }

    /// The sum of two characters.
    ///
    /// # Errors
    /// [`Error::MixedAlgebras`].
    pub fn plus(&self, other: &Self) -> Result<Self, Error> {
        self.plus_times(other, &1.into())
    }

    /// The difference of two characters.
    ///
    /// # Errors
    /// [`Error::MixedAlgebras`].
    pub fn minus(&self, other: &Self) -> Result<Self, Error> {
        self.plus_times(other, &(-1).into())
    }

    /// The character with every multiplicity times `factor`.
    #[must_use]
    pub fn scaled(&self, factor: &BigInt) -> Self {
        let mut scaled = Self::zero(self.algebra);
        scaled.add_times(self, factor);
        scaled
    }

    fn plus_times(&self, other: &Self, factor: &BigInt) -> Result<Self, Error> {
        self.check(other)?;
        let mut sum = self.clone();
        sum.add_times(other, factor);
        Ok(sum)
    }

    fn check(&self, other: &Self) -> Result<(), Error> {
        if self.algebra == other.algebra {
            return Ok(());
        }
        Err(Error::MixedAlgebras {
            algebra: self.algebra.to_string(),
            irrep: format!("a character of {}", other.algebra),
        })
    }

    /// The conjugate character.
    #[must_use]
    pub fn conjugate(&self) -> Self {
        let weights = self.weights.iter();
        let conjugate = weights.map(|(weight, times)| (weight.conjugate(), times.clone()));
        Self {
            algebra: self.algebra,
            weights: conjugate.collect(),
        }
    }

    /// The Adams operation: every weight times `degree`.
    ///
    /// # Errors
    /// [`Error::BeyondLimit`] where a label would leave `u32`.
    /// # Source
    /// [Adams 1962]; the power sums of [Macdonald 1995], I.2.
    pub fn adams(&self, degree: u32) -> Result<Self, Error> {
        if degree == 0 {
            let mut constant = Self::zero(self.algebra);
            constant
                .weights
                .insert(self.algebra.singlet(), self.dimension());
            constant.weights.retain(|_, times| !times.is_zero());
            return Ok(constant);
        }
        let bound = self.bound().saturating_mul(degree.into());
        within_u32(bound, "this Adams operation")?;
        let weights = self.weights.iter().map(|(weight, times)| {
            let labels = weight.labels();
            let weight = Irrep::from_fn(self.algebra, |node| labels[node] * degree);
            (weight, times.clone())
        });
        Ok(Self {
            algebra: self.algebra,
            weights: weights.collect(),
        })
    }

    /// The product of two characters.
    ///
    /// # Errors
    /// [`Error::MixedAlgebras`]; [`Error::BeyondLimit`] where it is too large for the [`Limits`].
    /// # Cost
    /// One reflection per dominant weight of one and weight of the other.
    pub fn product(&self, other: &Self) -> Result<Self, Error> {
        self.product_within(other, &Limits::default())
    }

    /// As [`product`](Self::product), within limits of one's own.
    ///
    /// # Errors
    /// As [`product`](Self::product).
    pub fn product_within(&self, other: &Self, limits: &Limits) -> Result<Self, Error> {
        self.check(other)?;
        let (left, right) = if self.weights.len() < other.weights.len() {
            (other, self)
        } else {
            (self, other)
        };
        let bound = left.bound().saturating_add(right.bound());
        within_u32(bound, "this product")?;
        on_lanes!(self.algebra.cartan_type(), bound, |held| {
            let weights = product_weights(&held, left, right, limits)?;
            Ok(Self {
                algebra: self.algebra,
                weights,
            })
        })
    }

    fn bound(&self) -> u64 {
        let cartan_type = self.algebra.cartan_type();
        let bounds = self.weights.keys();
        let bounds =
            bounds.map(|weight| label_bound(cartan_type, std::iter::once(weight.labels())));
        bounds.max().unwrap_or(0)
    }

    /// The irreps in it, each with its multiplicity, which is negative where it is taken off.
    ///
    /// # Errors
    /// As [`Irrep::dominant_weights`].
    /// # Cost
    /// The dominant weights of every irrep found.
    pub fn virtual_irreps(&self) -> Result<Vec<(Irrep, BigInt)>, Error> {
        self.virtual_irreps_within(&Limits::default())
    }

    fn virtual_irreps_within(&self, limits: &Limits) -> Result<Vec<(Irrep, BigInt)>, Error> {
        on_lanes!(self.algebra.cartan_type(), self.bound(), |held| {
            Ok(in_width!(Counts => peel::<_, Counts>(self.algebra, &held, self, limits)?))
        })
    }

    /// The irreps that it is the character of.
    ///
    /// # Errors
    /// [`Error::NotARepresentation`] where a multiplicity is negative; as
    /// [`Irrep::dominant_weights`].
    pub fn decompose(&self) -> Result<Decomposition, Error> {
        self.decompose_within(&Limits::default())
    }

    pub(crate) fn decompose_within(&self, limits: &Limits) -> Result<Decomposition, Error> {
        let irreps = self.virtual_irreps_within(limits)?;
        let counted = irreps
            .into_iter()
            .map(|(irrep, times)| match times.to_biguint() {
                Some(times) => Ok((irrep, times)),
                None => Err(Error::NotARepresentation {
                    irrep: irrep.bracketed(),
                    times: times.to_string(),
                }),
            });
        let terms = counted.collect::<Result<_, _>>()?;
        Ok(Decomposition::from_terms(self.algebra, terms))
    }
}

/// For each dominant weight a of `left` and each weight b of `right`: a + b is as often a sum of
/// weights of the two orbits as there are weights in the orbit of a.
fn product_weights<L: Lanes>(
    frame: &Frame<L>,
    left: &Character,
    right: &Character,
    limits: &Limits,
) -> Result<BTreeMap<Irrep, BigInt>, Error> {
    let cartan_type = left.algebra.cartan_type();
    let pack = |irrep: &Irrep| crate::decomposition::highest_weight::<L>(irrep);
    let starts = left.weights.iter().map(|(weight, times)| {
        let size = BigInt::from(orbit_size(cartan_type, weight.labels()));
        (pack(weight), size * times)
    });
    let starts: Vec<(L, BigInt)> = starts.collect();
    let mut sums: LaneTable<L, BigInt> = LaneTable::for_entries(64);
    let mut walk = OrbitWalk::new();
    let mut walked = 0u64;
    for (weight, times) in &right.weights {
        walk.restart(pack(weight));
        while walk.step(frame, |other| {
            for (start, size) in &starts {
                *sums.at(&dominant(frame, start.plus(other))) += size * times;
            }
            walked += starts.len() as u64;
        }) {
            if walked > limits.weights() {
                return Err(limits.too_many_weights(format!("more than {walked}")));
            }
            if sums.len() > limits.dominant_weights() {
                return Err(limits.too_many_terms(format!("more than {}", sums.len())));
            }
        }
    }
    let entries = sums.into_entries().filter(|(_, total)| !total.is_zero());
    Ok(entries
        .map(|(weight, total)| {
            let weight = irrep_of(left.algebra, &weight);
            let times = per_weight(cartan_type, weight.labels(), &total);
            (weight, times)
        })
        .collect())
}

/// Takes irreps off from the top; `None` where a number does not fit in `C`.
fn peel<L: Lanes, C: Count>(
    algebra: SimpleAlgebra,
    frame: &Frame<L>,
    character: &Character,
    limits: &Limits,
) -> Result<Option<Vec<(Irrep, BigInt)>>, Error> {
    let mut left = Remainder::<L, C>::new();
    for (weight, times) in &character.weights {
        let Some(times) = C::read(times) else {
            return Ok(None);
        };
        *left.times(frame, &crate::decomposition::highest_weight(weight)) = times;
    }
    let mut found = Vec::new();
    while let Some((highest, times)) = left.pop_highest() {
        if times.is_zero() {
            continue;
        }
        let taken = multiplicities::<L, C>(frame, &highest, limits.dominant_weights())?;
        let Some(taken) = taken else { return Ok(None) };
        let negative = -times.clone();
        for (weight, count) in taken.iter() {
            let remaining = left.times(frame, weight);
            match remaining.plus_product(count, &negative) {
                Some(difference) => *remaining = difference,
                None => return Ok(None),
            }
        }
        found.push((irrep_of(algebra, &highest), times.into()));
        if found.len() > limits.terms() {
            return Err(limits.too_many_terms(format!("more than {}", found.len())));
        }
    }
    Ok(Some(found))
}

/// What is left of a character, by dominant weight, the highest first.
struct Remainder<L, C> {
    times: LaneTable<L, C>,
    /// Levels of all weights met, with their places in `weights`.
    order: BinaryHeap<(i64, usize)>,
    weights: Vec<L>,
}

impl<L: Lanes, C: Count> Remainder<L, C> {
    fn new() -> Self {
        Self {
            times: LaneTable::for_entries(64),
            order: BinaryHeap::new(),
            weights: Vec::new(),
        }
    }

    fn times(&mut self, frame: &Frame<L>, weight: &L) -> &mut C {
        let before = self.times.len();
        self.times.at(weight);
        if self.times.len() > before {
            self.order.push((frame.level(weight), self.weights.len()));
            self.weights.push(weight.clone());
        }
        self.times.at(weight)
    }

    fn pop_highest(&mut self) -> Option<(L, C)> {
        let (_, place) = self.order.pop()?;
        let weight = self.weights[place].clone();
        let times = self.times.at(&weight).clone();
        Some((weight, times))
    }
}
