//! What kind of field a multiplet is.

use std::fmt;
use std::str::FromStr;

use crate::Problem;
use crate::suggestion::Choice;

/// The kind of field: spin and chirality, or a superfield.
///
/// ```
/// use model::Field;
/// let field: Field = "right-handed fermion".parse()?;
/// assert_eq!((field, field.left_handed_sign()), (Field::RightHandedFermion, -1));
/// # Ok::<(), model::Problem>(())
/// ```
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub enum Field {
    /// A left-handed Weyl fermion.
    LeftHandedFermion,
    /// A right-handed Weyl fermion.
    RightHandedFermion,
    /// A complex scalar.
    ComplexScalar,
    /// A real scalar, in a real representation.
    RealScalar,
    /// A chiral superfield: a left-handed Weyl fermion and a complex scalar.
    ChiralSuperfield,
}

impl Field {
    /// Every kind, in the order of a listing.
    pub const ALL: [Self; 5] = [
        Self::LeftHandedFermion,
        Self::RightHandedFermion,
        Self::ComplexScalar,
        Self::RealScalar,
        Self::ChiralSuperfield,
    ];

    /// The name as it stands in a model file.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::LeftHandedFermion => "left-handed fermion",
            Self::RightHandedFermion => "right-handed fermion",
            Self::ComplexScalar => "complex scalar",
            Self::RealScalar => "real scalar",
            Self::ChiralSuperfield => "chiral superfield",
        }
    }

    /// Whether it holds a Weyl fermion, and so counts in anomalies.
    #[must_use]
    pub const fn has_fermions(self) -> bool {
        match self {
            Self::LeftHandedFermion | Self::RightHandedFermion | Self::ChiralSuperfield => true,
            Self::ComplexScalar | Self::RealScalar => false,
        }
    }

    /// -1 for a right-handed fermion, which counts as its left-handed conjugate; 1 otherwise.
    #[must_use]
    pub const fn left_handed_sign(self) -> i64 {
        match self {
            Self::RightHandedFermion => -1,
            _ => 1,
        }
    }
}

impl fmt::Display for Field {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        f.write_str(self.name())
    }
}

impl FromStr for Field {
    type Err = Problem;

    /// Reads the names of a model file, exactly.
    fn from_str(written: &str) -> Result<Self, Problem> {
        let found = Self::ALL.into_iter().find(|field| field.name() == written);
        found.ok_or_else(|| Problem::UnknownField {
            choice: Choice::new(written, Self::ALL.map(Self::name)),
        })
    }
}
