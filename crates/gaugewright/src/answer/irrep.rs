//! Facts of one irrep.

use num_bigint::BigUint;
use roots::{Congruency, Irrep, LimitKind, Limits, NameBook, Numbering, Weight};
use serde::{Serialize, Serializer};

use super::Answer;
use crate::Failure;
use crate::report::{Align, Exact, Page, Phrase, Table, Whole, to_json_line};

/// What `gaugewright irrep` answers. Labels are in `numbering`'s order.
#[derive(Clone, Debug, Serialize)]
pub struct IrrepAnswer {
    algebra: String,
    numbering: String,
    labels: Vec<u32>,
    name: String,
    dimension: Whole,
    /// Name of the conjugate irrep.
    conjugate: String,
    conjugate_labels: Vec<u32>,
    reality: String,
    congruency: Class,
    casimir: Exact,
    dynkin_index: Whole,
    trace_index: Exact,
    cubic_index: Whole,
    #[serde(skip_serializing_if = "Option::is_none")]
    weights: Option<Vec<WeightEntry>>,
    #[serde(skip)]
    of: Irrep,
    #[serde(skip)]
    order: Numbering,
}

#[derive(Clone, Debug, Serialize)]
struct WeightEntry {
    weight: Vec<i64>,
    multiplicity: Whole,
}

/// Which weights are listed with an irrep.
#[derive(Clone, Copy, Debug, PartialEq, Eq, serde::Deserialize)]
#[serde(rename_all = "lowercase")]
pub enum WeightsAsked {
    /// The dominant ones.
    Dominant,
    /// All of them.
    All,
}

/// Weights that are listed unless told otherwise.
const MOST_WEIGHTS: usize = 1_000_000;

impl IrrepAnswer {
    /// The facts of `irrep` with its weights, nodes in `order`.
    ///
    /// # Errors
    /// Where there are more weights than `most`, or else than a million.
    pub fn with_weights(
        irrep: Irrep,
        asked: WeightsAsked,
        most: Option<usize>,
        order: Numbering,
    ) -> Result<Self, Failure> {
        let most = most.unwrap_or(MOST_WEIGHTS);
        let limits = Limits::default().with_dominant_weights(most);
        let entry = |weight: &Weight, multiplicity: &BigUint| WeightEntry {
            weight: order.from_slansky(irrep.algebra().cartan_type(), weight.labels()),
            multiplicity: multiplicity.clone().into(),
        };
        let dominant = irrep
            .dominant_weights_within(&limits)
            .map_err(|_| too_many(&irrep, most))?;
        let mut weights = Vec::new();
        for (dominant, multiplicity) in dominant {
            let orbit: Vec<WeightEntry> = match asked {
                WeightsAsked::Dominant => vec![entry(&dominant, &multiplicity)],
                WeightsAsked::All if dominant.orbit_size() > BigUint::from(most) => {
                    return Err(too_many(&irrep, most));
                }
                WeightsAsked::All => dominant
                    .orbit()
                    .map(|weight| entry(&weight, &multiplicity))
                    .collect(),
            };
            weights.extend(orbit);
            if weights.len() > most {
                return Err(too_many(&irrep, most));
            }
        }
        Ok(Self {
            weights: Some(weights),
            ..Self::new(irrep, order)
        })
    }

    /// The facts of `irrep`, nodes in `order`.
    #[must_use]
    pub fn new(irrep: Irrep, order: Numbering) -> Self {
        let mut names = NameBook::new(irrep.algebra());
        let conjugate = irrep.conjugate();
        Self {
            algebra: irrep.algebra().to_string(),
            numbering: order.to_string(),
            labels: labels(&irrep, order),
            name: written_name(&mut names, &irrep, order),
            dimension: irrep.dimension().into(),
            conjugate: written_name(&mut names, &conjugate, order),
            conjugate_labels: labels(&conjugate, order),
            reality: irrep.reality().to_string(),
            congruency: Class(irrep.congruency()),
            casimir: irrep.casimir().into(),
            dynkin_index: irrep.dynkin_index().into(),
            trace_index: irrep.trace_index().into(),
            cubic_index: irrep.cubic_index().into(),
            weights: None,
            of: irrep,
            order,
        }
    }
}

fn too_many(irrep: &Irrep, most: usize) -> Failure {
    roots::Error::BeyondLimit {
        what: format!("the list of weights of {}", irrep.bracketed()),
        size: format!("more than {most} entries"),
        limit: most as u64,
        raised_by: Some(LimitKind::Weights),
        instead: "ask for the dominant ones, or raise the limit on weights".to_owned(),
    }
    .into()
}

impl Answer for IrrepAnswer {
    fn json(&self) -> String {
        to_json_line(self).expect("names and numbers have a JSON form")
    }

    fn page(&self) -> Page {
        let mut names = NameBook::new(self.of.algebra());
        let mut named = |irrep: &Irrep| name_and_labels(&mut names, irrep, self.order);
        let title = named(&self.of)
            .then(" of ")
            .then(Phrase::algebra(&self.algebra));
        let mut page = Page::titled(title);
        page.facts([
            ("dimension", Phrase::from(self.of.dimension())),
            ("conjugate", named(&self.of.conjugate())),
            ("reality", self.reality.as_str().into()),
            ("congruency class", self.congruency.phrase(&self.of)),
            ("quadratic Casimir", self.of.casimir().into()),
            ("Dynkin index", self.of.dynkin_index().into()),
            ("trace index", self.of.trace_index().into()),
            ("cubic index", self.of.cubic_index().into()),
        ]);
        if let Some(weights) = &self.weights {
            page.section(format!("Weights, {} listed", weights.len()));
            let mut table = Table::new([
                (Phrase::from("multiplicity"), Align::Right),
                ("weight".into(), Align::Left),
            ]);
            for entry in weights {
                let labels: Vec<String> = entry.weight.iter().map(i64::to_string).collect();
                let weight = Phrase::labels(format!("({})", labels.join(",")));
                table.push([entry.multiplicity.value().clone().into(), weight]);
            }
            page.table(table);
        }
        page
    }
}

/// Labels in `order`.
pub(super) fn labels(irrep: &Irrep, order: Numbering) -> Vec<u32> {
    order.from_slansky(irrep.algebra().cartan_type(), irrep.labels())
}

/// The name; where that is the labels, they are in `order` too.
pub(super) fn written_name(names: &mut NameBook, irrep: &Irrep, order: Numbering) -> String {
    match names.name(irrep) {
        roots::IrrepName::Labels(_) => irrep.bracketed_in(order),
        name @ roots::IrrepName::Dimension { .. } => name.to_string(),
    }
}

/// The name in print; where that is the labels, they are in `order`.
pub(super) fn name_phrase(names: &mut NameBook, irrep: &Irrep, order: Numbering) -> Phrase {
    match names.name(irrep) {
        roots::IrrepName::Labels(_) => Phrase::labels(irrep.bracketed_in(order)),
        name @ roots::IrrepName::Dimension { .. } => name.into(),
    }
}

/// The name with the labels beside it; the labels alone where they are the name.
pub(super) fn name_and_labels(names: &mut NameBook, irrep: &Irrep, order: Numbering) -> Phrase {
    let name = name_phrase(names, irrep, order);
    let labels = Phrase::labels(irrep.bracketed_in(order));
    if name == labels {
        labels
    } else {
        name.then(" ").then(labels)
    }
}

/// A congruency class in JSON: a number, or for SO(4k) a pair of them.
#[derive(Clone, Copy, Debug)]
pub(super) struct Class(pub(super) Congruency);

impl Class {
    fn phrase(self, irrep: &Irrep) -> Phrase {
        let center = irrep.algebra().center();
        Phrase::from(format!("{} under the centre, {center}", self.0))
    }
}

impl Serialize for Class {
    fn serialize<S: Serializer>(&self, serializer: S) -> Result<S::Ok, S::Error> {
        match self.0 {
            Congruency::Cyclic(class) => class.serialize(serializer),
            Congruency::Pair(first, second) => [first, second].serialize(serializer),
        }
    }
}
