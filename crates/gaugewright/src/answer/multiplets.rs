//! The multiplets of a model as an audit shows them.

use std::collections::BTreeMap;

use model::{FermionClass, Model, Multiplet, Spectrum};
use num_rational::BigRational;
use roots::{Numbering, Reality};
use serde::Serialize;

use super::irrep::labels as labels_in;
use crate::report::Exact;

/// One multiplet.
#[derive(Clone, Debug, Serialize)]
pub(super) struct MultipletAnswer {
    label: String,
    field: &'static str,
    copies: u32,
    /// Irrep name or charge by the label of the symmetry.
    transforms: BTreeMap<String, String>,
    /// Dynkin labels by the label of the symmetry.
    labels: BTreeMap<String, Vec<u32>>,
    /// Of one copy.
    dimension: u64,
    /// Electric charges of its states, where the model has an electric charge.
    #[serde(skip_serializing_if = "Option::is_none")]
    electric_charges: Option<Vec<ChargeOfStates>>,
    /// "chiral", "vector-like", "real" or "partly chiral"; none for scalars.
    #[serde(skip_serializing_if = "Option::is_none")]
    chirality: Option<&'static str>,
    /// With whom it pairs up.
    #[serde(skip_serializing_if = "Vec::is_empty")]
    partners: Vec<String>,
    #[serde(skip_serializing_if = "Option::is_none")]
    mass_gev: Option<serde_json::Number>,
}

#[derive(Clone, Debug, Serialize)]
pub(super) struct ChargeOfStates {
    charge: Exact,
    states: crate::report::Whole,
}

impl MultipletAnswer {
    /// Every multiplet of `model`.
    pub(super) fn all(model: &Model, standings: &[Standing], order: Numbering) -> Vec<Self> {
        let multiplets = model.spectrum().multiplets().iter().enumerate();
        multiplets
            .map(|(place, multiplet)| Self::new(model, multiplet, standings.get(place), order))
            .collect()
    }

    fn new(
        model: &Model,
        multiplet: &Multiplet,
        standing: Option<&Standing>,
        order: Numbering,
    ) -> Self {
        let symmetries = || model.spectrum().symmetries().iter().enumerate();
        let labels = symmetries().filter_map(|(place, symmetry)| {
            let irrep = multiplet.irrep(place)?;
            Some((symmetry.label().to_owned(), labels_in(irrep, order)))
        });
        let transforms = symmetries().map(|(place, symmetry)| {
            (
                symmetry.label().to_owned(),
                multiplet.transformation(place).to_string(),
            )
        });
        let charges = model.electric_charges(multiplet);
        Self {
            label: multiplet.label().to_owned(),
            field: multiplet.field().name(),
            copies: multiplet.copies(),
            transforms: transforms.collect(),
            labels: labels.collect(),
            dimension: multiplet.dimension(),
            electric_charges: charges.map(|charges| {
                let states = charges.into_iter().rev();
                let states = states.map(|(charge, states)| ChargeOfStates {
                    charge: charge.into(),
                    states: states.into(),
                });
                states.collect()
            }),
            chirality: standing.and_then(Standing::name),
            partners: standing
                .map(|one| one.partner_labels(model.spectrum()))
                .unwrap_or_default(),
            mass_gev: multiplet.mass_gev().and_then(decimal),
        }
    }

    /// Electric charges, highest first.
    pub(super) fn electric_charges(&self) -> impl Iterator<Item = &Exact> {
        self.electric_charges
            .iter()
            .flatten()
            .map(|one| &one.charge)
    }
}

/// The number as it may stand in a model file.
fn decimal(value: &BigRational) -> Option<serde_json::Number> {
    model::write_decimal(value)?.parse().ok()
}

/// Whether the gauge symmetries let a multiplet's fermions have a mass.
#[derive(Clone, Debug, PartialEq, Eq)]
pub(super) enum Standing {
    /// It has no fermions, or a charge is unknown.
    None,
    /// No copy may have a mass.
    Chiral,
    /// Every copy finds a partner in these multiplets.
    VectorLike(Vec<usize>),
    /// Copies pair up with these multiplets, but there are more copies than partners.
    Partly(Vec<usize>),
    /// Each copy may have a mass by itself.
    Real,
}

impl Standing {
    /// One for each multiplet.
    pub(super) fn all(spectrum: &Spectrum) -> Vec<Self> {
        let mut standings = vec![Self::None; spectrum.multiplets().len()];
        for class in spectrum.fermion_classes().into_iter().flatten() {
            let (own, opposite) = (class.copies(), class.conjugate_copies());
            for &place in class.members() {
                standings[place] = match class.reality() {
                    Reality::Real => Self::Real,
                    Reality::Pseudoreal => Self::pseudoreal(&class, place),
                    Reality::Complex => Self::complex(own, opposite, class.conjugate_members()),
                };
            }
            for &place in class.conjugate_members() {
                standings[place] = Self::complex(opposite, own, class.members());
            }
        }
        standings
    }

    fn pseudoreal(class: &FermionClass, place: usize) -> Self {
        let others = class.members().iter().copied();
        let others = others.filter(|&other| other != place).collect();
        match (class.massive(), class.chiral()) {
            (0, _) => Self::Chiral,
            (_, 0) => Self::VectorLike(others),
            _ => Self::Partly(others),
        }
    }

    /// The side with fewer copies finds a partner for each.
    fn complex(own: u64, opposite: u64, partners: &[usize]) -> Self {
        match opposite {
            0 => Self::Chiral,
            _ if own <= opposite => Self::VectorLike(partners.to_vec()),
            _ => Self::Partly(partners.to_vec()),
        }
    }

    /// The word for it in output.
    pub(super) const fn name(&self) -> Option<&'static str> {
        match self {
            Self::None => None,
            Self::Chiral => Some("chiral"),
            Self::VectorLike(_) => Some("vector-like"),
            Self::Partly(_) => Some("partly chiral"),
            Self::Real => Some("real"),
        }
    }

    pub(super) fn partner_labels(&self, spectrum: &Spectrum) -> Vec<String> {
        match self {
            Self::VectorLike(partners) | Self::Partly(partners) => {
                let labels = partners
                    .iter()
                    .map(|&place| spectrum.multiplets()[place].label());
                labels.map(str::to_owned).collect()
            }
            Self::None | Self::Chiral | Self::Real => Vec::new(),
        }
    }
}
