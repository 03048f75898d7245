//! The audit as a page: the verdict first, then why, then what the model is.

use model::{Field, Model, Multiplet, Transformation};
use num_traits::Zero;
use roots::{NameBook, Numbering};

use super::Answer;
use super::audit::{AuditAnswer, unified, unified_normalisation};
use super::irrep::name_and_labels;
use super::multiplets::Standing;
use crate::report::{Align, Page, Phrase, Table, to_json_line};

impl Answer for AuditAnswer {
    fn json(&self) -> String {
        to_json_line(self).expect("names and numbers have a JSON form")
    }

    fn page(&self) -> Page {
        lay_out(self)
    }

    fn is_refusal(&self) -> bool {
        !self.is_consistent()
    }
}

fn lay_out(audit: &AuditAnswer) -> Page {
    let model = audit.model();
    let mut page = Page::titled(model.title());
    audit.anomalies().tell_verdict(&mut page);
    if !audit.anomalies().is_empty() {
        page.section("Anomalies");
        page.table(audit.anomalies().table());
    }
    audit.anomalies().tell_gauginos(&mut page);
    symmetry(audit, &mut page);
    multiplets(audit, &mut page);
    masses(audit, &mut page);
    running(audit, &mut page);
    page.paragraph(
        "A model that is consistent is not thereby true. Beta coefficients are at one loop with \
         every multiplet taken as light.",
    );
    page
}

fn symmetry(audit: &AuditAnswer, page: &mut Page) {
    let model = audit.model();
    page.section("Symmetry and states");
    let mut facts: Vec<(Phrase, Phrase)> = Vec::new();
    for symmetry in model.spectrum().symmetries() {
        let group = Phrase::algebra(symmetry.group());
        let kind = if symmetry.is_gauged() { "" } else { ", global" };
        facts.push((symmetry.label().into(), group.then(kind)));
    }
    if let Some(center) = audit.center() {
        facts.push(("acts trivially".into(), Phrase::from(center_words(center))));
    }
    let states = model.degrees_of_freedom();
    let words = format!("{} fermionic, {} bosonic", states.fermionic, states.bosonic);
    facts.push(("degrees of freedom".into(), words.into()));
    if model.is_supersymmetric() {
        facts.push((
            "supersymmetry".into(),
            "every multiplet is a chiral superfield".into(),
        ));
    }
    if let Some(source) = model.source() {
        facts.push(("source".into(), source.into()));
    }
    page.facts(facts);
}

fn center_words(center: &str) -> String {
    match center {
        "trivial" => "no element of the centre but 1".to_owned(),
        group => format!("the subgroup {group} of the centre"),
    }
}

fn multiplets(audit: &AuditAnswer, page: &mut Page) {
    let model = audit.model();
    let symmetries = model.spectrum().symmetries();
    page.section("Multiplets");
    let mut columns = vec![
        (Phrase::from("multiplet"), Align::Left),
        ("field".into(), Align::Left),
        ("copies".into(), Align::Right),
    ];
    columns.extend(
        symmetries
            .iter()
            .map(|one| (Phrase::from(one.label()), Align::Left)),
    );
    columns.push(("dimension".into(), Align::Right));
    let has_charge = model.electric_charge().is_some();
    if has_charge {
        columns.push(("electric charge".into(), Align::Left));
    }
    let mut table = Table::new(columns);
    let mut names = Names::of(model, audit.order());
    for (multiplet, answer) in model.spectrum().multiplets().iter().zip(audit.multiplets()) {
        let mut row = vec![
            Phrase::from(multiplet.label()),
            short_field(multiplet.field()).into(),
            Phrase::from(multiplet.copies() as usize),
        ];
        row.extend((0..symmetries.len()).map(|place| names.under(multiplet, place)));
        row.push(Phrase::from(num_bigint::BigUint::from(
            multiplet.dimension(),
        )));
        if has_charge {
            let charges = answer
                .electric_charges()
                .map(|charge| charge.value().clone().into());
            row.push(Phrase::join(charges, ", "));
        }
        table.push(row);
    }
    page.table(table);
}

const fn short_field(field: Field) -> &'static str {
    match field {
        Field::LeftHandedFermion => "left-handed",
        Field::RightHandedFermion => "right-handed",
        Field::ComplexScalar => "complex scalar",
        Field::RealScalar => "real scalar",
        Field::ChiralSuperfield => "superfield",
    }
}

/// One name book for each symmetry.
struct Names {
    books: Vec<Option<NameBook>>,
    order: Numbering,
}

impl Names {
    fn of(model: &Model, order: Numbering) -> Self {
        let groups = model
            .spectrum()
            .symmetries()
            .iter()
            .map(|one| one.group().simple());
        Self {
            books: groups.map(|algebra| algebra.map(NameBook::new)).collect(),
            order,
        }
    }

    /// The irrep with its labels, or the charge; singlets without labels.
    fn under(&mut self, multiplet: &Multiplet, place: usize) -> Phrase {
        match (multiplet.transformation(place), &mut self.books[place]) {
            (Transformation::Irrep(irrep), Some(_)) if irrep.is_singlet() => "1".into(),
            (Transformation::Irrep(irrep), Some(names)) => {
                name_and_labels(names, irrep, self.order)
            }
            (Transformation::Charge(charge), _) => charge.clone().into(),
            (other, _) => other.to_string().into(),
        }
    }
}

fn masses(audit: &AuditAnswer, page: &mut Page) {
    let multiplets = audit.model().spectrum().multiplets();
    let label = |place: usize| multiplets[place].label();
    let mut chiral = Vec::new();
    let mut others: Vec<(Phrase, Phrase)> = Vec::new();
    for (place, standing) in audit.standings().iter().enumerate() {
        let with = |partners: &[usize]| {
            let partners: Vec<&str> = partners.iter().map(|&place| label(place)).collect();
            match partners.as_slice() {
                [] => "among its own copies".to_owned(),
                some => format!("with {}", some.join(", ")),
            }
        };
        match standing {
            Standing::None => {}
            Standing::Chiral => chiral.push(Phrase::from(label(place))),
            Standing::Real => others.push((
                label(place).into(),
                "real: may have a mass by itself".into(),
            )),
            Standing::VectorLike(partners) => {
                others.push((
                    label(place).into(),
                    format!("vector-like {}", with(partners)).into(),
                ));
            }
            Standing::Partly(partners) => {
                let words = format!("in part vector-like {}, the rest chiral", with(partners));
                others.push((label(place).into(), words.into()));
            }
        }
    }
    if chiral.is_empty() && others.is_empty() {
        return;
    }
    page.section("Fermion masses that the gauge symmetry allows");
    if !chiral.is_empty() {
        page.paragraph(
            Phrase::from("Chiral, so without any: ")
                .then(Phrase::join(chiral, ", "))
                .then("."),
        );
    }
    if !others.is_empty() {
        page.facts(others);
    }
}

fn running(audit: &AuditAnswer, page: &mut Page) {
    let model = audit.model();
    if audit.coefficients().is_empty() {
        return;
    }
    page.section("Running at one loop");
    let mut table = Table::new([
        (Phrase::from("coupling"), Align::Left),
        ("b".into(), Align::Right),
        ("asymptotically free".into(), Align::Left),
        ("".into(), Align::Left),
    ]);
    for coefficient in audit.coefficients() {
        let label = model.spectrum().symmetries()[coefficient.symmetry()].label();
        let Some(value) = coefficient.value() else {
            table.push([label.into(), "unknown".into(), "a charge is \"?\"".into()]);
            continue;
        };
        let free = match coefficient.is_asymptotically_free() {
            Some(true) => "yes",
            Some(false) if value.is_zero() => "no, constant",
            _ => "no",
        };
        let remark = match unified(model, coefficient) {
            Some(unified) => Phrase::from(unified)
                .then(" in unified normalisation, k = ")
                .then(unified_normalisation()),
            None => Phrase::new(),
        };
        table.push([label.into(), value.into(), free.into(), remark]);
    }
    page.table(table);
}
