//! The types A to G of simple Lie algebras, with their rank.

use std::fmt;

use crate::Error;

/// The largest rank that is accepted: SU(257), SO(513), Sp(512).
///
/// Every list this crate makes of an algebra (roots, Cartan matrix) stays within memory below it.
pub const MAX_RANK: usize = 256;

/// The letter of a Cartan type.
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub enum Family {
    /// SU(n + 1).
    A,
    /// SO(2n + 1).
    B,
    /// Sp(2n).
    C,
    /// SO(2n).
    D,
    /// E6, E7, E8.
    E,
    /// F4.
    F,
    /// G2.
    G,
}

impl Family {
    /// The ranks at which the family has a simple algebra that no other family of an earlier
    /// letter has, except that B2 = C2 and A3 = D3 are kept apart because their irreps carry
    /// different labels.
    #[must_use]
    pub const fn ranks(self) -> std::ops::RangeInclusive<usize> {
        match self {
            Self::A => 1..=MAX_RANK,
            Self::B | Self::C => 2..=MAX_RANK,
            Self::D => 3..=MAX_RANK,
            Self::E => 6..=8,
            Self::F => 4..=4,
            Self::G => 2..=2,
        }
    }

    const fn letter(self) -> char {
        match self {
            Self::A => 'A',
            Self::B => 'B',
            Self::C => 'C',
            Self::D => 'D',
            Self::E => 'E',
            Self::F => 'F',
            Self::G => 'G',
        }
    }
}

impl fmt::Display for Family {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        write!(f, "{}", self.letter())
    }
}

/// A family and a rank that it has.
///
/// ```
/// use roots::{CartanType, Family};
/// assert_eq!(CartanType::new(Family::D, 5)?.to_string(), "D5");
/// assert!(CartanType::new(Family::E, 9).is_err());
/// # Ok::<(), roots::Error>(())
/// ```
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub struct CartanType {
    family: Family,
    /// Within `family.ranks()`.
    rank: u16,
}

impl CartanType {
    /// The type of that family and rank.
    ///
    /// # Errors
    /// [`Error::NoSuchType`] where the family has no algebra of that rank,
    /// [`Error::RankTooLarge`] above [`MAX_RANK`].
    pub fn new(family: Family, rank: usize) -> Result<Self, Error> {
        if rank > MAX_RANK && family.ranks().end() == &MAX_RANK {
            return Err(Error::RankTooLarge {
                written: format!("{family}{rank}"),
            });
        }
        match u16::try_from(rank) {
            Ok(small) if family.ranks().contains(&rank) => Ok(Self {
                family,
                rank: small,
            }),
            _ => Err(Error::NoSuchType { family, rank }),
        }
    }

    /// A to G.
    #[must_use]
    pub const fn family(self) -> Family {
        self.family
    }

    /// Number of nodes of the Dynkin diagram.
    #[must_use]
    pub const fn rank(self) -> usize {
        self.rank as usize
    }

    /// Place of an exceptional type among the five: G2, F4, E6, E7, E8.
    pub(crate) const fn exceptional_place(self) -> usize {
        match self.family {
            Family::G => 0,
            Family::F => 1,
            _ => self.rank() - 4,
        }
    }

    pub(crate) const fn rank_u16(self) -> u16 {
        self.rank
    }
}

impl fmt::Display for CartanType {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        write!(f, "{}{}", self.family, self.rank)
    }
}
