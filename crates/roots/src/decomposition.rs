//! A sum of irreps, each with its multiplicity.

use std::fmt;

use num_bigint::{BigInt, BigUint};
use num_traits::Zero;

use crate::count::Count;
use crate::lanes::Lanes;
use crate::{Irrep, SimpleAlgebra};

/// A representation as a sum of irreps of one simple algebra with multiplicities, in the order of
/// [`Irrep`]: by labels, node 1 first, ascending.
///
/// ```
/// let su5: roots::SimpleAlgebra = "SU(5)".parse()?;
/// let ten = su5.read_irrep("10")?;
/// let product = ten.product(&ten)?;
/// assert_eq!(product.dimension(), 100u32.into());
/// let names: Vec<String> = product.iter().map(|(irrep, _)| irrep.name()).collect();
/// assert_eq!(names, ["5bar", "50bar", "45bar"]);
/// # Ok::<(), roots::Error>(())
/// ```
#[derive(Clone, PartialEq, Eq, Hash)]
pub struct Decomposition {
    algebra: SimpleAlgebra,
    /// Irreps ascending, no multiplicity zero.
    terms: Vec<(Irrep, Multiplicity)>,
}

/// How often an irrep is there: a machine integer where it fits, so that small ones need no
/// memory of their own. The large form holds only what the small one cannot.
#[derive(Clone, Debug, PartialEq, Eq, Hash)]
enum Multiplicity {
    Small(u64),
    Large(Box<BigUint>),
}

impl Multiplicity {
    fn new(value: BigUint) -> Self {
        match u64::try_from(&value) {
            Ok(small) => Self::Small(small),
            Err(_) => Self::Large(Box::new(value)),
        }
    }

    fn value(&self) -> BigUint {
        match self {
            Self::Small(small) => BigUint::from(*small),
            Self::Large(large) => (**large).clone(),
        }
    }
}

impl Decomposition {
    /// The sum of these irreps of `algebra`; equal ones are put together.
    pub(crate) fn from_terms(algebra: SimpleAlgebra, terms: Vec<(Irrep, BigUint)>) -> Self {
        let mut sorted = terms;
        sorted.sort_by(|(left, _), (right, _)| left.cmp(right));
        let mut merged: Vec<(Irrep, BigUint)> = Vec::with_capacity(sorted.len());
        for (irrep, times) in sorted {
            match merged.last_mut() {
                Some((last, sum)) if *last == irrep => *sum += times,
                _ => merged.push((irrep, times)),
            }
        }
        let terms = merged.into_iter().filter(|(_, times)| !times.is_zero());
        Self {
            algebra,
            terms: terms
                .map(|(irrep, n)| (irrep, Multiplicity::new(n)))
                .collect(),
        }
    }

    /// From highest weights with counts, in any order; `None` where a count is negative.
    pub(crate) fn from_counts<L: Lanes, C: Count>(
        algebra: SimpleAlgebra,
        mut counts: Vec<(L, C)>,
    ) -> Option<Self> {
        counts.retain(|(_, count)| !count.is_zero());
        counts.sort_unstable_by(|(left, _), (right, _)| left.compare(right));
        let term = |(weight, count): (L, C)| {
            let multiplicity = match count.to_u64() {
                Some(small) => Multiplicity::Small(small),
                None => Multiplicity::new(Into::<BigInt>::into(count).try_into().ok()?),
            };
            Some((irrep_of(algebra, &weight), multiplicity))
        };
        let terms = counts.into_iter().map(term).collect::<Option<_>>()?;
        Some(Self { algebra, terms })
    }

    /// The algebra.
    #[must_use]
    pub const fn algebra(&self) -> SimpleAlgebra {
        self.algebra
    }

    /// Number of different irreps.
    #[must_use]
    pub fn len(&self) -> usize {
        self.terms.len()
    }

    /// Whether it is the sum of nothing.
    #[must_use]
    pub fn is_empty(&self) -> bool {
        self.terms.is_empty()
    }

    /// The irreps with their multiplicities, in order.
    pub fn iter(&self) -> impl ExactSizeIterator<Item = (&Irrep, BigUint)> + DoubleEndedIterator {
        self.terms.iter().map(|(irrep, n)| (irrep, n.value()))
    }

    /// The different irreps, in order.
    pub fn irreps(&self) -> impl ExactSizeIterator<Item = &Irrep> + DoubleEndedIterator {
        self.terms.iter().map(|(irrep, _)| irrep)
    }

    /// How often `irrep` is in it; zero for an irrep of another algebra.
    #[must_use]
    pub fn multiplicity(&self, irrep: &Irrep) -> BigUint {
        let found = self.terms.binary_search_by(|(other, _)| other.cmp(irrep));
        found.map_or_else(|_| BigUint::zero(), |place| self.terms[place].1.value())
    }

    /// The dimension of the whole.
    #[must_use]
    pub fn dimension(&self) -> BigUint {
        self.iter().map(|(irrep, n)| irrep.dimension() * n).sum()
    }

    /// The Dynkin index of the whole.
    #[must_use]
    pub fn dynkin_index(&self) -> BigUint {
        self.iter().map(|(irrep, n)| irrep.dynkin_index() * n).sum()
    }

    /// The conjugate representation.
    #[must_use]
    pub fn conjugate(&self) -> Self {
        let terms = self.terms.iter();
        let mut terms: Vec<_> = terms
            .map(|(irrep, n)| (irrep.conjugate(), n.clone()))
            .collect();
        terms.sort_by(|(left, _), (right, _)| left.cmp(right));
        Self {
            algebra: self.algebra,
            terms,
        }
    }
}

/// The irrep with that highest weight.
pub(crate) fn irrep_of<L: Lanes>(algebra: SimpleAlgebra, highest: &L) -> Irrep {
    Irrep::from_labels(algebra, highest.dominant_labels(algebra.rank()))
}

/// The highest weight of an irrep.
pub(crate) fn highest_weight<L: Lanes>(irrep: &Irrep) -> L {
    L::pack(irrep.labels().iter().map(|&label| label.into()))
}

impl fmt::Debug for Decomposition {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        write!(f, "{}:", self.algebra)?;
        for (place, (irrep, n)) in self.iter().enumerate() {
            let plus = if place == 0 { " " } else { " + " };
            write!(f, "{plus}{n} {}", irrep.bracketed())?;
        }
        Ok(())
    }
}
