//! Facts of one irrep.

use roots::{Congruency, Irrep, NameBook, Numbering};
use serde::{Serialize, Serializer};

use super::Answer;
use crate::report::{Exact, Page, Phrase, Whole, to_json_line};

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
    #[serde(skip)]
    of: Irrep,
    #[serde(skip)]
    order: Numbering,
}

impl IrrepAnswer {
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
            of: irrep,
            order,
        }
    }
}

impl Answer for IrrepAnswer {
    fn json(&self) -> String {
        to_json_line(self).expect("names and numbers have a JSON form")
    }

    fn page(&self) -> Page {
        let mut names = NameBook::new(self.of.algebra());
        let mut named = |irrep: &Irrep| {
            let labels = Phrase::labels(irrep.bracketed_in(self.order));
            match names.name(irrep) {
                name @ roots::IrrepName::Dimension { .. } => {
                    Phrase::from(name).then(" ").then(labels)
                }
                roots::IrrepName::Labels(_) => labels,
            }
        };
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
