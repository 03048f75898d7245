//! Weights, and what Weyl reflections do to one.

use std::fmt;

use num_bigint::BigUint;
use smallvec::SmallVec;

use crate::frame::{Held, largest_label};
use crate::lanes::{Lanes, on_lanes};
use crate::orbit_walk::{OrbitWalk, dominant_with_parity};
use crate::{Error, Irrep, SimpleAlgebra, dimension};

/// Labels of weights are at most this in size.
const MOST: i64 = 1 << 40;

/// A weight of a simple algebra by its Dynkin labels, which may be negative.
///
/// Weights of one algebra are ordered by their labels, node 1 first.
///
/// ```
/// let su3: roots::SimpleAlgebra = "SU(3)".parse()?;
/// let weight = su3.weight(&[-1, 1])?;
/// assert_eq!(weight.dominant().labels(), [1, 0]);
/// assert_eq!(weight.orbit().count(), 3);
/// # Ok::<(), roots::Error>(())
/// ```
#[derive(Clone, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub struct Weight {
    algebra: SimpleAlgebra,
    /// One per node.
    labels: SmallVec<[i64; 8]>,
}

impl SimpleAlgebra {
    /// The weight with these Dynkin labels, node 1 first, Slansky's numbering.
    ///
    /// # Errors
    /// [`Error::LabelCount`] unless there is one label per node; [`Error::WeightLabel`] beyond
    /// 2^40 in size.
    pub fn weight(self, labels: &[i64]) -> Result<Weight, Error> {
        if labels.len() != self.rank() {
            return Err(Error::LabelCount {
                algebra: self.to_string(),
                expected: self.rank(),
                found: labels.len(),
            });
        }
        if let Some(&label) = labels
            .iter()
            .find(|label| label.unsigned_abs() > MOST.unsigned_abs())
        {
            return Err(Error::WeightLabel { label, most: MOST });
        }
        Ok(Weight {
            algebra: self,
            labels: SmallVec::from_slice(labels),
        })
    }
}

impl Weight {
    pub(crate) fn from_lanes<L: Lanes>(algebra: SimpleAlgebra, weight: &L) -> Self {
        Self {
            algebra,
            labels: weight.labels(algebra.rank()),
        }
    }

    pub(crate) fn to_lanes<L: Lanes>(&self) -> L {
        L::pack(self.labels.iter().copied())
    }

    /// A bound on the labels of its orbit.
    fn bound(&self) -> u64 {
        let sizes = self.labels.iter().map(|label| label.unsigned_abs());
        largest_label(self.algebra.cartan_type(), sizes)
    }

    /// The algebra it belongs to.
    #[must_use]
    pub const fn algebra(&self) -> SimpleAlgebra {
        self.algebra
    }

    /// The Dynkin labels, node 1 first, Slansky's numbering.
    #[must_use]
    pub fn labels(&self) -> &[i64] {
        &self.labels
    }

    /// Whether no label is negative.
    #[must_use]
    pub fn is_dominant(&self) -> bool {
        self.labels.iter().all(|&label| label >= 0)
    }

    /// The irrep with this highest weight, if it is dominant and its labels are below 2^32.
    #[must_use]
    pub fn irrep(&self) -> Option<Irrep> {
        let labels = self.labels.iter().map(|&label| u32::try_from(label).ok());
        let labels: Option<SmallVec<[u32; 8]>> = labels.collect();
        let labels = labels?;
        Some(Irrep::from_fn(self.algebra, |node| labels[node]))
    }

    /// The dominant weight of its Weyl orbit.
    ///
    /// # Cost
    /// At most one reflection per positive root.
    #[must_use]
    pub fn dominant(&self) -> Self {
        self.dominant_with_sign().0
    }

    /// The dominant weight of its Weyl orbit, and -1 if an odd number of reflections at simple
    /// roots lead there, 1 if an even one. For a weight on a wall of a chamber both do, and the
    /// sign is that of the shortest way.
    #[must_use]
    pub fn dominant_with_sign(&self) -> (Self, i8) {
        on_lanes!(self.algebra.cartan_type(), self.bound(), |held| {
            let frame = &*held;
            let (dominant, odd) = dominant_with_parity(frame, self.to_lanes());
            let sign = if odd { -1 } else { 1 };
            (Self::from_lanes(self.algebra, &dominant), sign)
        })
    }

    /// Number of weights in its Weyl orbit.
    #[must_use]
    pub fn orbit_size(&self) -> BigUint {
        let dominant = self.dominant();
        // The size depends on which labels are zero, not on their values.
        let zeros = dominant.labels.iter().map(|&label| u32::from(label != 0));
        let zeros: SmallVec<[u32; 8]> = zeros.collect();
        dimension::orbit_size(self.algebra.cartan_type(), &zeros)
    }

    /// Its Weyl orbit, each weight once, the dominant one first.
    ///
    /// # Cost
    /// A few additions per weight; memory for at most `rank` weights per positive root.
    /// # Source
    /// [Snow 1990].
    pub fn orbit(&self) -> impl Iterator<Item = Self> + Send + 'static {
        let algebra = self.algebra;
        on_lanes!(algebra.cartan_type(), self.bound(), |held| {
            let dominant = self.dominant().to_lanes();
            boxed(lane_orbit(held, dominant).map(move |weight| Self::from_lanes(algebra, &weight)))
        })
    }
}

/// An iterator that hides in which lanes it runs.
pub(crate) type Boxed<T> = Box<dyn Iterator<Item = T> + Send>;

pub(crate) fn boxed<T>(iterator: impl Iterator<Item = T> + Send + 'static) -> Boxed<T> {
    Box::new(iterator)
}

/// The orbit of a dominant weight.
pub(crate) fn lane_orbit<L: Lanes>(
    held: Held<L>,
    dominant: L,
) -> impl Iterator<Item = L> + Send + 'static {
    let mut walk = OrbitWalk::new();
    walk.restart(dominant);
    let mut second = None;
    std::iter::from_fn(move || {
        if let Some(weight) = second.take() {
            return Some(weight);
        }
        let mut first = None;
        walk.step(&held, |weight| {
            let place = if first.is_none() {
                &mut first
            } else {
                &mut second
            };
            *place = Some(weight.clone());
        });
        first
    })
}

impl fmt::Display for Weight {
    /// The labels in brackets, with commas.
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        let labels: Vec<String> = self.labels.iter().map(i64::to_string).collect();
        write!(f, "({})", labels.join(","))
    }
}

impl fmt::Debug for Weight {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        write!(f, "{}{self}", self.algebra)
    }
}

impl Irrep {
    /// The highest weight, whose labels are those of the irrep.
    #[must_use]
    pub fn highest_weight(&self) -> Weight {
        Weight {
            algebra: self.algebra(),
            labels: self.labels().iter().map(|&label| label.into()).collect(),
        }
    }
}
