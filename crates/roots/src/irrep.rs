//! Irreps of one simple algebra, given by their highest weight.

use std::fmt;

use num_bigint::{BigInt, BigUint};
use num_rational::BigRational;
use smallvec::SmallVec;

use crate::congruency::{Congruency, congruency};
use crate::reality::{Reality, conjugate_node, reality};
use crate::{Error, NameBook, Numbering, SimpleAlgebra, dimension, index};

/// A finite-dimensional irrep of a simple algebra: its highest weight, as Dynkin labels.
///
/// Two irreps are equal when their algebras and labels are, and are ordered by these; for the
/// order of a listing, by dimension and index, see [`NameBook::sort`](crate::NameBook::sort).
///
/// ```
/// let so10: roots::SimpleAlgebra = "SO(10)".parse()?;
/// let spinor = so10.irrep(&[0, 0, 0, 0, 1])?;
/// assert_eq!(spinor.name(), "16");
/// assert_eq!(spinor.conjugate().name(), "16bar");
/// assert_eq!(spinor.dynkin_index(), 4u32.into());
/// # Ok::<(), roots::Error>(())
/// ```
#[derive(Clone, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub struct Irrep {
    algebra: SimpleAlgebra,
    /// One per node.
    labels: SmallVec<[u32; 8]>,
}

impl Irrep {
    pub(crate) fn new(algebra: SimpleAlgebra, labels: &[u32]) -> Result<Self, Error> {
        if labels.len() != algebra.rank() {
            return Err(Error::LabelCount {
                algebra: algebra.to_string(),
                expected: algebra.rank(),
                found: labels.len(),
            });
        }
        Ok(Self {
            algebra,
            labels: SmallVec::from_slice(labels),
        })
    }

    /// The irrep whose label at each node, counted from 0, is `label(node)`.
    pub(crate) fn from_fn(algebra: SimpleAlgebra, label: impl FnMut(usize) -> u32) -> Self {
        Self {
            algebra,
            labels: (0..algebra.rank()).map(label).collect(),
        }
    }

    /// The irrep with these labels, one per node.
    pub(crate) fn from_labels(algebra: SimpleAlgebra, labels: SmallVec<[u32; 8]>) -> Self {
        debug_assert_eq!(labels.len(), algebra.rank(), "one label per node");
        Self { algebra, labels }
    }

    /// The algebra it belongs to.
    #[must_use]
    pub const fn algebra(&self) -> SimpleAlgebra {
        self.algebra
    }

    /// Dynkin labels of the highest weight, node 1 first, Slansky's numbering.
    #[must_use]
    pub fn labels(&self) -> &[u32] {
        &self.labels
    }

    /// Whether it is the one-dimensional irrep.
    #[must_use]
    pub fn is_singlet(&self) -> bool {
        self.labels.iter().all(|&label| label == 0)
    }

    /// The dimension, exact at any size.
    ///
    /// # Cost
    /// One small multiplication per positive root not orthogonal to the highest weight.
    /// # Source
    /// Weyl's dimension formula, [Humphreys 1972], 24.3.
    #[must_use]
    pub fn dimension(&self) -> BigUint {
        dimension::dimension(self.algebra.cartan_type(), &self.labels)
    }

    /// The conjugate irrep, which is itself unless it is complex.
    #[must_use]
    pub fn conjugate(&self) -> Self {
        let cartan_type = self.algebra.cartan_type();
        Self::from_fn(self.algebra, |node| {
            self.labels[conjugate_node(cartan_type, node)]
        })
    }

    /// Real, pseudoreal or complex.
    #[must_use]
    pub fn reality(&self) -> Reality {
        reality(self.algebra.cartan_type(), &self.labels)
    }

    /// The class under the centre of the group.
    #[must_use]
    pub fn congruency(&self) -> Congruency {
        congruency(self.algebra.cartan_type(), &self.labels)
    }

    /// The quadratic Casimir C2, with `T(R) dim(G) = C2(R) dim(R)`: `(N^2 - 1) / 2N` for the
    /// SU(N) fundamental.
    #[must_use]
    pub fn casimir(&self) -> BigRational {
        index::casimir(self.algebra.cartan_type(), &self.labels)
    }

    /// The Dynkin index l: 1 for the SU(N) fundamental, 2 for the SO(N) vector from N = 5 on.
    ///
    /// # Source
    /// [Dynkin 1957]; [Slansky 1981].
    #[must_use]
    pub fn dynkin_index(&self) -> BigUint {
        index::dynkin_index(self.algebra, &self.labels, &self.dimension())
    }

    /// The trace T = l / 2 of a generator squared, 1/2 for the SU(N) fundamental.
    #[must_use]
    pub fn trace_index(&self) -> BigRational {
        BigRational::new(self.dynkin_index().into(), 2.into())
    }

    /// The cubic index A: 1 for the SU(N) fundamental from N = 3 on and for the 4 of SO(6), odd
    /// under conjugation, 0 for every other algebra.
    ///
    /// # Source
    /// [Banks-Georgi 1976]; [Okubo 1977].
    #[must_use]
    pub fn cubic_index(&self) -> BigInt {
        index::cubic_index(self.algebra.cartan_type(), &self.labels)
    }

    /// Its name: the dimension with a bar, primes or the letters of SO(8) where they apply; the
    /// labels in brackets where the dimension is beyond [`SimpleAlgebra::named_up_to`].
    ///
    /// # Cost
    /// Looks for all irreps of that dimension.
    #[must_use]
    pub fn name(&self) -> String {
        NameBook::new(self.algebra).name(self).to_string()
    }

    /// The labels in brackets, without commas while every one is a single digit.
    #[must_use]
    pub fn bracketed(&self) -> String {
        bracketed(&self.labels)
    }

    /// As [`bracketed`](Self::bracketed), in another numbering of the nodes.
    #[must_use]
    pub fn bracketed_in(&self, numbering: Numbering) -> String {
        bracketed(&numbering.from_slansky(self.algebra.cartan_type(), &self.labels))
    }
}

/// Labels in brackets, without commas while every one is a single digit.
fn bracketed(labels: &[u32]) -> String {
    let separator = if labels.iter().all(|&label| label < 10) {
        ""
    } else {
        ","
    };
    let labels: Vec<String> = labels.iter().map(u32::to_string).collect();
    format!("({})", labels.join(separator))
}

impl fmt::Debug for Irrep {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        write!(f, "{}{}", self.algebra, self.bracketed())
    }
}
