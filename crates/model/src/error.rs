//! What is wrong with a model, and where in it.

use std::fmt;

use crate::Problem;

/// An error of this crate: what is wrong, with which part of what, and what to write instead.
///
/// ```
/// use model::{Field, Group, Multiplet, Spectrum, Symmetry};
/// let mut spectrum = Spectrum::new([Symmetry::gauge("colour", "SU(3)".parse()?)])?;
/// let quark = Multiplet::draft("quark", Field::LeftHandedFermion).under("color", "3");
/// assert_eq!(
///     spectrum.add(quark).unwrap_err().to_string(),
///     "multiplet \"quark\": no symmetry has the label \"color\"; \
///      did you mean \"colour\"? write \"colour\"",
/// );
/// # Ok::<(), model::Error>(())
/// ```
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Error {
    owner: Owner,
    part: Part,
    problem: Box<Problem>,
}

/// Whose part is wrong.
#[derive(Clone, Debug, PartialEq, Eq)]
pub enum Owner {
    /// The model as a whole.
    Model,
    /// The symmetry of that label.
    Symmetry(String),
    /// The multiplet of that label.
    Multiplet(String),
}

/// Which part of it is wrong.
#[derive(Clone, Debug, PartialEq, Eq)]
pub enum Part {
    /// The whole of it.
    Whole,
    /// The title.
    Title,
    /// The label.
    Label,
    /// The group.
    Group,
    /// The kind of field.
    Field,
    /// The number of copies.
    Copies,
    /// The flag `family_dependent`.
    FamilyDependent,
    /// The mass.
    Mass,
    /// Something about a symmetry that does not exist, by the label written.
    SymmetryLabel(String),
    /// The irrep or charge under the symmetry of that label.
    Under(String),
    /// The choice of the hypercharge.
    Hypercharge,
    /// The electric charge's coefficients for the symmetry of that label.
    ElectricCharge(String),
}

impl Error {
    pub(crate) fn new(owner: Owner, part: Part, problem: impl Into<Problem>) -> Self {
        Self {
            owner,
            part,
            problem: Box::new(problem.into()),
        }
    }

    /// Whose part is wrong.
    #[must_use]
    pub const fn owner(&self) -> &Owner {
        &self.owner
    }

    /// Which part of it is wrong.
    #[must_use]
    pub const fn part(&self) -> &Part {
        &self.part
    }

    /// What is wrong with it.
    #[must_use]
    pub const fn problem(&self) -> &Problem {
        &self.problem
    }
}

impl From<Problem> for Error {
    fn from(problem: Problem) -> Self {
        Self::new(Owner::Model, Part::Whole, problem)
    }
}

impl From<roots::Error> for Error {
    fn from(error: roots::Error) -> Self {
        Problem::from(error).into()
    }
}

impl fmt::Display for Error {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        match &self.owner {
            Owner::Model => {}
            Owner::Symmetry(label) => write!(f, "symmetry \"{label}\"")?,
            Owner::Multiplet(label) => write!(f, "multiplet \"{label}\"")?,
        }
        let separator = if self.owner == Owner::Model { "" } else { ", " };
        match &self.part {
            Part::Under(symmetry) => write!(f, "{separator}under \"{symmetry}\": ")?,
            Part::ElectricCharge(symmetry) => {
                write!(f, "{separator}electric charge along \"{symmetry}\": ")?;
            }
            Part::Hypercharge => write!(f, "{separator}hypercharge: ")?,
            _ if self.owner == Owner::Model => {}
            _ => f.write_str(": ")?,
        }
        self.problem.fmt(f)
    }
}

impl std::error::Error for Error {}
