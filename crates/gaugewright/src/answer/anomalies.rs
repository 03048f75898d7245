//! Every anomaly condition of a model.

use anomaly::{Condition, Kind, Report, Rule};
use model::{Group, Model};
use num_traits::Zero;
use serde::Serialize;

use super::Answer;
use crate::Failure;
use crate::report::{Align, Exact, Page, Phrase, Table, Verdict, Whole, to_json_line};

/// What `gaugewright anomalies` answers.
#[derive(Clone, Debug, Serialize)]
pub struct AnomaliesAnswer {
    consistent: bool,
    conditions: Vec<ConditionAnswer>,
    /// Gauginos of a supersymmetric model, which add nothing.
    #[serde(skip_serializing_if = "Vec::is_empty")]
    gauginos: Vec<Gaugino>,
    #[serde(skip)]
    title: String,
    #[serde(skip)]
    report: Report,
    #[serde(skip)]
    multiplets: Vec<String>,
}

/// One condition.
#[derive(Clone, Debug, Serialize)]
struct ConditionAnswer {
    name: String,
    kind: &'static str,
    factors: Vec<String>,
    value: Exact,
    /// "0", "even" or "a multiple of N".
    cancels_if: String,
    cancels: bool,
    /// False where a global symmetry takes part.
    must_cancel: bool,
    /// One for each multiplet with fermions.
    contributions: Vec<Share>,
}

#[derive(Clone, Debug, Serialize)]
struct Share {
    multiplet: String,
    value: Exact,
}

/// The superpartners of one group's gauge bosons: an adjoint, whose cubic index is 0 and whose
/// Dynkin index is even.
#[derive(Clone, Debug, Serialize)]
struct Gaugino {
    symmetry: String,
    cubic_index: Whole,
    dynkin_index: Whole,
}

impl AnomaliesAnswer {
    /// The conditions of `model`.
    ///
    /// # Errors
    /// [`Failure::Anomalies`] where a charge is written `"?"`, or a report would be too long.
    pub fn new(model: &Model) -> Result<Self, Failure> {
        let spectrum = model.spectrum();
        let report = Report::of(spectrum)?;
        let conditions = report.conditions().iter();
        Ok(Self {
            consistent: report.is_consistent(),
            conditions: conditions.map(|one| condition(one, model)).collect(),
            gauginos: if model.is_supersymmetric() {
                gauginos(model)
            } else {
                Vec::new()
            },
            title: model.title().to_owned(),
            multiplets: spectrum
                .multiplets()
                .iter()
                .map(|one| one.label().to_owned())
                .collect(),
            report,
        })
    }

    /// Whether the symmetries can have no anomaly at all.
    #[must_use]
    pub fn is_empty(&self) -> bool {
        self.conditions.is_empty()
    }

    /// Whether every condition that must hold does.
    #[must_use]
    pub const fn is_consistent(&self) -> bool {
        self.consistent
    }

    /// Tells the verdict, then the conditions that fail with the multiplets behind them.
    pub(super) fn tell_verdict(&self, page: &mut Page) {
        let required = self
            .report
            .conditions()
            .iter()
            .filter(|one| one.must_cancel())
            .count();
        let violated: Vec<&Condition> = self.report.violated().collect();
        match (required, violated.len()) {
            (0, _) if self.is_empty() => page.verdict(
                Verdict::Consistent,
                "these groups have no anomaly, whatever the multiplets",
            ),
            (0, _) => page.verdict(
                Verdict::Consistent,
                "the gauge symmetries have no anomaly; those below belong to global ones",
            ),
            (1, 0) => page.verdict(Verdict::Consistent, "the one anomaly condition holds"),
            (_, 0) => page.verdict(
                Verdict::Consistent,
                format!("all {required} anomaly conditions hold"),
            ),
            (_, failing) => {
                let noun = if required == 1 {
                    "condition"
                } else {
                    "conditions"
                };
                let verb = if failing == 1 { "fails" } else { "fail" };
                let words = format!("{failing} of {required} anomaly {noun} {verb}");
                page.verdict(Verdict::Inconsistent, words);
                page.facts(violated.into_iter().map(|one| (name(one), self.blame(one))));
            }
        }
    }

    /// The sum that should have cancelled, multiplet by multiplet.
    fn blame(&self, condition: &Condition) -> Phrase {
        let shares = self.multiplets.iter().zip(condition.contributions());
        let shares = shares.filter(|(_, share)| !share.is_zero());
        let shares =
            shares.map(|(label, share)| Phrase::from(share.clone()).then(format!(" from {label}")));
        Phrase::from(condition.value().clone())
            .then(format!(", must be {}: ", needed(condition.rule())))
            .then(Phrase::join(shares, ", "))
    }

    /// The table of all conditions.
    pub(super) fn table(&self) -> Table {
        let mut table = Table::new([
            (Phrase::from("condition"), Align::Left),
            ("kind".into(), Align::Left),
            ("sum".into(), Align::Right),
            ("must be".into(), Align::Left),
            ("".into(), Align::Left),
        ]);
        for condition in self.report.conditions() {
            let (needed, verdict) = match (condition.must_cancel(), condition.cancels()) {
                (true, true) => (needed(condition.rule()), Phrase::from("holds")),
                (true, false) => (needed(condition.rule()), Phrase::strong("FAILS")),
                (false, true) => ("free".to_owned(), "cancels, though global".into()),
                (false, false) => ("free".to_owned(), "global: need not cancel".into()),
            };
            table.push([
                name(condition),
                condition.kind().name().into(),
                condition.value().clone().into(),
                needed.into(),
                verdict,
            ]);
        }
        table
    }

    /// What is said about gauginos; nothing without supersymmetry.
    pub(super) fn tell_gauginos(&self, page: &mut Page) {
        if self.gauginos.is_empty() {
            return;
        }
        let each = self.gauginos.iter().map(|gaugino| {
            Phrase::from(format!("{} ", gaugino.symmetry))
                .then(gaugino.dynkin_index.value().clone())
        });
        page.paragraph(
            Phrase::from("Gauginos are adjoints: cubic index 0 and an even Dynkin index (")
                .then(Phrase::join(each, ", "))
                .then("), so they add nothing."),
        );
    }
}

fn condition(condition: &Condition, model: &Model) -> ConditionAnswer {
    let multiplets = model
        .spectrum()
        .multiplets()
        .iter()
        .zip(condition.contributions());
    let with_fermions = multiplets.filter(|(multiplet, _)| multiplet.has_fermions());
    ConditionAnswer {
        name: condition.name().to_owned(),
        kind: condition.kind().name(),
        factors: condition.factors().to_vec(),
        value: condition.value().clone().into(),
        cancels_if: needed(condition.rule()),
        cancels: condition.cancels(),
        must_cancel: condition.must_cancel(),
        contributions: with_fermions
            .map(|(multiplet, share)| Share {
                multiplet: multiplet.label().to_owned(),
                value: share.clone().into(),
            })
            .collect(),
    }
}

fn gauginos(model: &Model) -> Vec<Gaugino> {
    let gauged = model
        .spectrum()
        .symmetries()
        .iter()
        .filter(|one| one.is_gauged());
    gauged
        .filter_map(|symmetry| match symmetry.group() {
            Group::Simple(algebra) => Some(Gaugino {
                symmetry: symmetry.label().to_owned(),
                cubic_index: algebra.adjoint().cubic_index().into(),
                dynkin_index: algebra.adjoint().dynkin_index().into(),
            }),
            Group::U1 | Group::Discrete(_) => None,
        })
        .collect()
}

fn needed(rule: Rule) -> String {
    match rule {
        Rule::Zero => "0".to_owned(),
        // With gravity, a Z(2) has no condition.
        Rule::MultipleOf(2) => "even".to_owned(),
        Rule::MultipleOf(modulus) => format!("a multiple of {modulus}"),
    }
}

/// The condition's name, powers raised.
fn name(condition: &Condition) -> Phrase {
    let powers = condition.powers().into_iter().map(|(label, power)| {
        let label = Phrase::from(label);
        match power {
            2 => label.then(Phrase::symbol("^2", "^{2}")),
            3 => label.then(Phrase::symbol("^3", "^{3}")),
            _ => label,
        }
    });
    let name = Phrase::join(powers, " ");
    if condition.kind() == Kind::Global {
        name.then(" parity")
    } else {
        name
    }
}

impl Answer for AnomaliesAnswer {
    fn json(&self) -> String {
        to_json_line(self).expect("names and numbers have a JSON form")
    }

    fn page(&self) -> Page {
        let mut page = Page::titled(format!("Anomalies of: {}", self.title));
        self.tell_verdict(&mut page);
        if self.is_empty() {
            return page;
        }
        page.section("Conditions");
        page.table(self.table());
        page.section("What each multiplet adds");
        let mut table = Table::new([
            (Phrase::from("condition"), Align::Left),
            ("multiplet".into(), Align::Left),
            ("adds".into(), Align::Right),
        ]);
        for condition in self.report.conditions() {
            let shares = self.multiplets.iter().zip(condition.contributions());
            let mut heading = name(condition);
            for (label, share) in shares.filter(|(_, share)| !share.is_zero()) {
                table.push([heading, label.as_str().into(), share.clone().into()]);
                heading = Phrase::new();
            }
        }
        page.table(table);
        self.tell_gauginos(&mut page);
        page
    }

    fn is_refusal(&self) -> bool {
        !self.consistent
    }
}
