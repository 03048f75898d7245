//! The main job: everything about one model in one report.

use std::collections::BTreeMap;

use model::{Model, Spectrum};
use num_bigint::BigInt;
use num_rational::BigRational;
use num_traits::One;
use roots::Numbering;
use running::BetaCoefficient;
use serde::Serialize;

use super::anomalies::AnomaliesAnswer;
use super::multiplets::{MultipletAnswer, Standing};
use crate::Failure;
use crate::report::Exact;

/// What `gaugewright audit` answers.
#[derive(Clone, Debug, Serialize)]
pub struct AuditAnswer {
    consistent: bool,
    numbering: String,
    model: ModelFacts,
    symmetry: Vec<SymmetryFacts>,
    multiplets: Vec<MultipletAnswer>,
    degrees_of_freedom: States,
    /// The subgroup of the centre that acts trivially, e.g. "Z6".
    trivially_acting_center: Option<String>,
    anomalies: AnomaliesAnswer,
    running: RunningFacts,
    /// Not worked out by this version.
    embeddings: Option<()>,
    /// Not worked out by this version.
    couplings: Option<()>,
    #[serde(skip)]
    order: Numbering,
    #[serde(skip)]
    of: Model,
    #[serde(skip)]
    standings: Vec<Standing>,
    #[serde(skip)]
    coefficients: Vec<BetaCoefficient>,
}

#[derive(Clone, Debug, Serialize)]
struct ModelFacts {
    title: String,
    supersymmetric: bool,
    #[serde(skip_serializing_if = "Option::is_none")]
    source: Option<String>,
    #[serde(skip_serializing_if = "Option::is_none")]
    notes: Option<String>,
}

#[derive(Clone, Debug, Serialize)]
struct SymmetryFacts {
    label: String,
    algebra: String,
    gauged: bool,
}

#[derive(Clone, Debug, Serialize)]
struct States {
    fermionic: u128,
    bosonic: u128,
}

#[derive(Clone, Debug, Serialize)]
struct RunningFacts {
    loops: u8,
    /// By label; hypercharge in unified normalisation. None while a charge is unknown.
    one_loop: BTreeMap<String, Option<Exact>>,
    asymptotically_free: BTreeMap<String, Option<bool>>,
    /// k in alpha_1 = k alpha_Y, where the model has a hypercharge.
    #[serde(skip_serializing_if = "Option::is_none")]
    hypercharge_normalisation: Option<Exact>,
}

/// k of SU(5), in which hypercharge is given unless stated otherwise ([Georgi-Quinn-Weinberg
/// 1974]).
pub(super) fn unified_normalisation() -> BigRational {
    BigRational::new(BigInt::from(5), BigInt::from(3))
}

impl AuditAnswer {
    /// Everything about `model`, labels of irreps in `order`.
    ///
    /// # Errors
    /// [`Failure::Anomalies`] where a charge is written `"?"`, or a report would be too long.
    pub fn new(model: Model, order: Numbering) -> Result<Self, Failure> {
        let anomalies = AnomaliesAnswer::new(&model)?;
        let coefficients = running::one_loop(&model);
        let standings = Standing::all(model.spectrum());
        let states = model.degrees_of_freedom();
        Ok(Self {
            consistent: anomalies.is_consistent(),
            numbering: order.to_string(),
            model: ModelFacts {
                title: model.title().to_owned(),
                supersymmetric: model.is_supersymmetric(),
                source: model.source().map(str::to_owned),
                notes: model.notes().map(str::to_owned),
            },
            symmetry: symmetry_facts(model.spectrum()),
            multiplets: MultipletAnswer::all(&model, &standings, order),
            degrees_of_freedom: States {
                fermionic: states.fermionic,
                bosonic: states.bosonic,
            },
            trivially_acting_center: model
                .spectrum()
                .trivially_acting_center()
                .map(|group| group.to_string()),
            anomalies,
            running: running_facts(&model, &coefficients),
            embeddings: None,
            couplings: None,
            standings,
            coefficients,
            order,
            of: model,
        })
    }

    /// Whether every condition that must hold does.
    #[must_use]
    pub const fn is_consistent(&self) -> bool {
        self.consistent
    }

    pub(super) const fn model(&self) -> &Model {
        &self.of
    }

    pub(super) const fn order(&self) -> Numbering {
        self.order
    }

    pub(super) const fn anomalies(&self) -> &AnomaliesAnswer {
        &self.anomalies
    }

    pub(super) fn multiplets(&self) -> &[MultipletAnswer] {
        &self.multiplets
    }

    pub(super) fn standings(&self) -> &[Standing] {
        &self.standings
    }

    pub(super) fn coefficients(&self) -> &[BetaCoefficient] {
        &self.coefficients
    }

    pub(super) fn center(&self) -> Option<&str> {
        self.trivially_acting_center.as_deref()
    }
}

fn symmetry_facts(spectrum: &Spectrum) -> Vec<SymmetryFacts> {
    let facts = spectrum.symmetries().iter().map(|symmetry| SymmetryFacts {
        label: symmetry.label().to_owned(),
        algebra: symmetry.group().to_string(),
        gauged: symmetry.is_gauged(),
    });
    facts.collect()
}

fn running_facts(model: &Model, coefficients: &[BetaCoefficient]) -> RunningFacts {
    let label = |one: &BetaCoefficient| {
        let symmetry = &model.spectrum().symmetries()[one.symmetry()];
        symmetry.label().to_owned()
    };
    let value = |one: &BetaCoefficient| unified(model, one).or_else(|| one.value());
    let values = coefficients
        .iter()
        .map(|one| (label(one), value(one).map(Exact::from)));
    let free = coefficients
        .iter()
        .map(|one| (label(one), one.is_asymptotically_free()));
    RunningFacts {
        loops: 1,
        one_loop: values.collect(),
        asymptotically_free: free.collect(),
        hypercharge_normalisation: model.hypercharge().map(|_| unified_normalisation().into()),
    }
}

/// The coefficient of the hypercharge in unified normalisation; `None` for other symmetries, and
/// while a charge is unknown.
///
/// Y is the charge as it is written times its coefficient in the electric charge.
pub(super) fn unified(model: &Model, coefficient: &BetaCoefficient) -> Option<BigRational> {
    let place = model
        .hypercharge()
        .filter(|&place| place == coefficient.symmetry())?;
    let scale = model
        .electric_charge()
        .and_then(|charge| charge.coefficients(place).first());
    let scale = scale.cloned().unwrap_or_else(BigRational::one);
    Some(coefficient.value()? * scale.pow(2) / unified_normalisation())
}
