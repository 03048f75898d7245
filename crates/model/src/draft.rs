//! A multiplet as it is written down, before a spectrum has checked it.

use crate::{Field, Mass, Written};

/// A multiplet on its way into a [`Spectrum`](crate::Spectrum), which checks all of it.
///
/// ```
/// use model::{Field, Multiplet};
/// let heavy = Multiplet::draft("heavy lepton", Field::LeftHandedFermion)
///     .under("hypercharge", -1)
///     .under("dark charge", "2/3")
///     .mass_gev("2e3");
/// # let _ = heavy;
/// ```
#[derive(Clone, Debug, PartialEq, Eq)]
#[must_use = "a draft does nothing until a spectrum takes it"]
pub struct MultipletDraft {
    pub(crate) label: String,
    pub(crate) field: Field,
    pub(crate) copies: u32,
    pub(crate) family_dependent: bool,
    /// By the label of the symmetry, in the order given.
    pub(crate) under: Vec<(String, Written)>,
    pub(crate) mass: Option<Mass>,
}

impl MultipletDraft {
    pub(crate) const fn new(label: String, field: Field) -> Self {
        Self {
            label,
            field,
            copies: 1,
            family_dependent: false,
            under: Vec::new(),
            mass: None,
        }
    }

    /// How many families there are; 1 unless said.
    pub const fn copies(mut self, copies: u32) -> Self {
        self.copies = copies;
        self
    }

    /// Gives each family its own unknown charges, where there are any.
    pub const fn family_dependent(mut self) -> Self {
        self.family_dependent = true;
        self
    }

    /// What it is under the symmetry of that label: an irrep or charge, as text or typed. A
    /// symmetry that is not mentioned leaves it a singlet of charge 0.
    pub fn under(
        mut self,
        symmetry: impl Into<String>,
        transformation: impl Into<Written>,
    ) -> Self {
        self.under.push((symmetry.into(), transformation.into()));
        self
    }

    /// Its mass in GeV, a decimal as text or an exact number.
    pub fn mass_gev(mut self, mass: impl Into<Mass>) -> Self {
        self.mass = Some(mass.into());
        self
    }
}
