//! Products of simple algebras and U(1)s, and their irreps.

use std::fmt;
use std::str::FromStr;

use num_bigint::BigUint;
use num_rational::BigRational;

use crate::text::shortened;
use crate::{Error, Irrep, SimpleAlgebra};

/// One factor of a reductive algebra.
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub enum Factor {
    /// A simple algebra.
    Simple(SimpleAlgebra),
    /// U(1).
    U1,
}

impl Factor {
    /// Number of generators.
    #[must_use]
    pub fn dimension(self) -> usize {
        match self {
            Self::Simple(algebra) => algebra.dimension(),
            Self::U1 => 1,
        }
    }

    /// Number of generators that commute: 1 for U(1).
    #[must_use]
    pub const fn rank(self) -> usize {
        match self {
            Self::Simple(algebra) => algebra.rank(),
            Self::U1 => 1,
        }
    }
}

impl fmt::Display for Factor {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        match self {
            Self::Simple(algebra) => algebra.fmt(f),
            Self::U1 => f.write_str("U(1)"),
        }
    }
}

impl FromStr for Factor {
    type Err = Error;

    fn from_str(written: &str) -> Result<Self, Error> {
        let letters = written.chars().filter(|c| !c.is_whitespace());
        let letters: String = letters.take("U(1)".len() + 1).collect();
        if letters.eq_ignore_ascii_case("U(1)") || letters.eq_ignore_ascii_case("U1") {
            return Ok(Self::U1);
        }
        match written.parse() {
            Ok(algebra) => Ok(Self::Simple(algebra)),
            Err(Error::UnknownAlgebra { written, .. }) => Err(Error::UnknownAlgebra {
                written,
                also: "U(1)",
            }),
            Err(other) => Err(other),
        }
    }
}

/// A product of simple algebras and U(1)s, in a fixed order.
///
/// ```
/// use roots::ReductiveAlgebra;
/// let standard_model: ReductiveAlgebra = "SU(3) x SU(2) x U(1)".parse()?;
/// assert_eq!((standard_model.rank(), standard_model.dimension()), (4, 12));
/// let doublet = standard_model.read_irrep(&["3", "2", "1/6"])?;
/// assert_eq!(doublet.dimension(), 6u32.into());
/// # Ok::<(), roots::Error>(())
/// ```
#[derive(Clone, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub struct ReductiveAlgebra {
    factors: Vec<Factor>,
}

impl ReductiveAlgebra {
    /// The product of these factors.
    #[must_use]
    pub fn new(factors: impl IntoIterator<Item = Factor>) -> Self {
        Self {
            factors: factors.into_iter().collect(),
        }
    }

    /// The factors in order.
    #[must_use]
    pub fn factors(&self) -> &[Factor] {
        &self.factors
    }

    /// Sum of the ranks.
    #[must_use]
    pub fn rank(&self) -> usize {
        self.factors.iter().copied().map(Factor::rank).sum()
    }

    /// Number of generators.
    #[must_use]
    pub fn dimension(&self) -> usize {
        self.factors.iter().copied().map(Factor::dimension).sum()
    }

    /// The irrep made of one irrep or charge per factor.
    ///
    /// # Errors
    /// [`Error::FactorCount`], [`Error::FactorMismatch`].
    pub fn irrep(&self, parts: Vec<Part>) -> Result<ReductiveIrrep, Error> {
        self.count(parts.len())?;
        for (place, (factor, part)) in self.factors.iter().zip(&parts).enumerate() {
            if part.factor() != *factor {
                return Err(Error::FactorMismatch {
                    algebra: self.to_string(),
                    place: place + 1,
                    factor: factor.to_string(),
                    found: part.to_string(),
                });
            }
        }
        Ok(ReductiveIrrep { parts })
    }

    /// The irrep written as one name, bracket of labels or charge per factor.
    ///
    /// # Errors
    /// [`Error::FactorCount`], or what is wrong with the text of one of them.
    pub fn read_irrep(&self, written: &[&str]) -> Result<ReductiveIrrep, Error> {
        self.count(written.len())?;
        let parts = self.factors.iter().zip(written);
        let parts = parts.map(|(factor, written)| match factor {
            Factor::Simple(algebra) => algebra.read_irrep(written).map(Part::Irrep),
            Factor::U1 => crate::read_rational(written).map(Part::Charge),
        });
        Ok(ReductiveIrrep {
            parts: parts.collect::<Result<_, _>>()?,
        })
    }

    fn count(&self, found: usize) -> Result<(), Error> {
        if found == self.factors.len() {
            return Ok(());
        }
        Err(Error::FactorCount {
            algebra: self.to_string(),
            expected: self.factors.len(),
            found,
        })
    }
}

impl fmt::Display for ReductiveAlgebra {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        for (place, factor) in self.factors.iter().enumerate() {
            let separator = if place == 0 { "" } else { " x " };
            write!(f, "{separator}{factor}")?;
        }
        Ok(())
    }
}

impl FromStr for ReductiveAlgebra {
    type Err = Error;

    /// Reads `SU(3) x SU(2) x U(1)`.
    fn from_str(written: &str) -> Result<Self, Error> {
        let factors = written.split(['x', 'X', '\u{d7}']);
        let factors = factors.map(|factor| {
            if factor.trim().is_empty() {
                let written = shortened(written);
                return Err(Error::EmptyFactor { written });
            }
            factor.parse()
        });
        Ok(Self {
            factors: factors.collect::<Result<_, _>>()?,
        })
    }
}

impl From<SimpleAlgebra> for ReductiveAlgebra {
    fn from(algebra: SimpleAlgebra) -> Self {
        Self::new([Factor::Simple(algebra)])
    }
}

/// What an irrep of a product is under one factor.
#[derive(Clone, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub enum Part {
    /// An irrep of a simple factor.
    Irrep(Irrep),
    /// The charge under a U(1).
    Charge(BigRational),
}

impl Part {
    /// The factor it belongs to.
    #[must_use]
    pub const fn factor(&self) -> Factor {
        match self {
            Self::Irrep(irrep) => Factor::Simple(irrep.algebra()),
            Self::Charge(_) => Factor::U1,
        }
    }

    /// The conjugate: charges change sign.
    #[must_use]
    pub fn conjugate(&self) -> Self {
        match self {
            Self::Irrep(irrep) => Self::Irrep(irrep.conjugate()),
            Self::Charge(charge) => Self::Charge(-charge),
        }
    }
}

impl fmt::Display for Part {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        match self {
            Self::Irrep(irrep) => f.write_str(&irrep.name()),
            Self::Charge(charge) => charge.fmt(f),
        }
    }
}

/// An irrep of a reductive algebra: one irrep or charge per factor.
#[derive(Clone, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub struct ReductiveIrrep {
    parts: Vec<Part>,
}

impl ReductiveIrrep {
    /// One part per factor, in order.
    #[must_use]
    pub fn parts(&self) -> &[Part] {
        &self.parts
    }

    /// Product of the dimensions.
    #[must_use]
    pub fn dimension(&self) -> BigUint {
        let irreps = self.parts.iter().filter_map(|part| match part {
            Part::Irrep(irrep) => Some(irrep.dimension()),
            Part::Charge(_) => None,
        });
        irreps.product()
    }

    /// The conjugate irrep.
    #[must_use]
    pub fn conjugate(&self) -> Self {
        Self {
            parts: self.parts.iter().map(Part::conjugate).collect(),
        }
    }
}
