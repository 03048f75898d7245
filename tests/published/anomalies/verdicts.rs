//! The example models of docs/models: conditions, values, shares and guilt. The publication that
//! says it cancels is each file's `source`; broken ones and their guilty multiplets are summed by
//! hand.

use std::collections::BTreeMap;

use anomaly::{Report, Rule};
use gaugewright::answer::{AnomaliesAnswer, Answer, AuditAnswer};
use model::Model;
use num_rational::BigRational;
use num_traits::Zero;

use super::{condition, example, examples};

const STANDARD_MODEL: &str = "colour^3 cubic, colour^2 hypercharge mixed, weak^2 hypercharge mixed, \
     hypercharge^3 cubic, gravity^2 hypercharge gravitational, weak parity global";

/// Names and kinds of conditions, and the index sums of parities.
fn expected(name: &str) -> (String, Vec<(&'static str, i64)>) {
    let with_second = |label: &str| {
        format!(
            "colour^3 cubic, colour^2 hypercharge mixed, colour^2 {label} mixed, weak^2 hypercharge \
             mixed, weak^2 {label} mixed, hypercharge^3 cubic, hypercharge^2 {label} mixed, \
             hypercharge {label}^2 mixed, {label}^3 cubic, gravity^2 hypercharge gravitational, \
             gravity^2 {label} gravitational, weak parity global"
        )
    };
    let twelve = vec![("weak parity", 12)];
    match name {
        "standard-model" | "standard-model-right-handed-neutrinos" => {
            (STANDARD_MODEL.into(), twelve)
        }
        "mssm" => (STANDARD_MODEL.into(), vec![("weak parity", 14)]),
        "b-minus-l" => (with_second("(B-L)"), twelve),
        "l-mu-minus-l-tau" => (with_second("(L_mu-L_tau)"), twelve),
        "lanternfish" => (with_second("lantern"), twelve),
        "su5" => ("unified^3 cubic".into(), vec![]),
        "flipped-su5" => (
            "unified^3 cubic, unified^2 X mixed, X^3 cubic, gravity^2 X gravitational".into(),
            vec![],
        ),
        "so10" | "e6" => (String::new(), vec![]),
        "pati-salam" => (
            "colour^3 cubic, left parity global, right parity global".into(),
            vec![("left parity", 12), ("right parity", 12)],
        ),
        "left-right" => (
            "colour^3 cubic, colour^2 (B-L) mixed, left^2 (B-L) mixed, right^2 (B-L) mixed, (B-L)^3 cubic, \
             gravity^2 (B-L) gravitational, left parity global, right parity global"
                .into(),
            vec![("left parity", 12), ("right parity", 12)],
        ),
        "trinification" => ("colour^3 cubic, left^3 cubic, right^3 cubic".into(), vec![]),
        "minimal-331" => (
            "colour^3 cubic, left^3 cubic, colour^2 X mixed, left^2 X mixed, X^3 cubic, gravity^2 \
             X gravitational"
                .into(),
            vec![],
        ),
        other => panic!("no conditions are written down for {other}"),
    }
}

/// Contributions add up, none comes from a scalar, factors spell the name.
fn coherent(model: &Model, report: &Report) {
    for one in report.conditions() {
        let sum: BigRational = one.contributions().iter().sum();
        assert_eq!(&sum, one.value(), "{}", one.name());
        let multiplets = model.spectrum().multiplets();
        assert_eq!(one.contributions().len(), multiplets.len());
        for (multiplet, share) in multiplets.iter().zip(one.contributions()) {
            assert!(multiplet.has_fermions() || share.is_zero());
        }
        let mut powers: BTreeMap<&str, usize> = BTreeMap::new();
        for factor in one.factors() {
            *powers.entry(factor).or_default() += 1;
        }
        for (label, power) in powers {
            // Labels of several words stand in brackets.
            let label = match label.contains(['-', ' ']) {
                true => format!("({label})"),
                false => label.to_owned(),
            };
            let spelt = if power == 1 {
                label
            } else {
                format!("{label}^{power}")
            };
            assert!(one.name().contains(&spelt), "{}: {spelt}", one.name());
        }
        let expected = match one.name().ends_with(" parity") {
            true => Rule::MultipleOf(2),
            false => Rule::Zero,
        };
        assert_eq!(one.rule(), expected);
        assert!(one.must_cancel());
    }
}

fn refused(model: &Model) -> bool {
    let anomalies = AnomaliesAnswer::new(model).unwrap();
    let audit = AuditAnswer::new(model.clone(), roots::Numbering::default()).unwrap();
    assert_eq!(anomalies.is_refusal(), audit.is_refusal());
    assert_eq!(
        anomalies.is_refusal(),
        anomaly::is_consistent(model.spectrum()) == Ok(false)
    );
    audit.is_refusal()
}

#[test]
fn published_models_are_consistent() {
    let names = examples("");
    assert_eq!(names.len(), 14);
    for name in names {
        let model = example(&name);
        let report = Report::of(model.spectrum()).unwrap();
        coherent(&model, &report);
        let told = report.conditions().iter();
        let told: Vec<String> = told
            .map(|one| format!("{} {}", one.name(), one.kind().name()))
            .collect();
        let (conditions, parities) = expected(&name);
        assert_eq!(told.join(", "), conditions, "{name}");
        for one in report.conditions() {
            let parity = parities.iter().find(|(parity, _)| *parity == one.name());
            let value = parity.map_or(0, |(_, value)| *value);
            assert_eq!(
                one.value().to_string(),
                value.to_string(),
                "{name}, {}",
                one.name()
            );
            assert!(one.cancels());
        }
        assert!(!refused(&model), "{name}");
    }
}

/// The shares of one family times three, by hand: [Bouchiat-Iliopoulos-Meyer 1972].
#[test]
fn shares_of_quarks_and_leptons() {
    let model = example("standard-model");
    let report = Report::of(model.spectrum()).unwrap();
    let cases = [
        ("colour^3", ["6", "-3", "-3", "0", "0", "0"]),
        ("colour^2 hypercharge", ["1", "-2", "1", "0", "0", "0"]),
        ("weak^2 hypercharge", ["3/2", "0", "0", "-3/2", "0", "0"]),
        ("hypercharge^3", ["1/12", "-8/3", "1/3", "-3/4", "3", "0"]),
        ("gravity^2 hypercharge", ["3", "-6", "3", "-3", "3", "0"]),
        ("weak parity", ["9", "0", "0", "3", "0", "0"]),
    ];
    for (name, shares) in cases {
        let found = condition(&report, name);
        let found: Vec<String> = found
            .contributions()
            .iter()
            .map(ToString::to_string)
            .collect();
        assert_eq!(found, shares, "{name}");
    }
}

/// What fails, its value, and who adds what to it.
fn guilt(name: &str) -> Vec<(&'static str, &'static str, &'static str)> {
    match name {
        "broken/b-minus-l-without-neutrinos" => vec![
            (
                "(B-L)^3",
                "-3",
                "quark doublet 2/3, right-handed up quark -1/3, right-handed down quark -1/3, \
                 lepton doublet -6, right-handed electron 3",
            ),
            (
                "gravity^2 (B-L)",
                "-3",
                "quark doublet 6, right-handed up quark -3, right-handed down quark -3, lepton \
                 doublet -6, right-handed electron 3",
            ),
        ],
        "broken/baryon-number" => vec![
            ("weak^2 (baryon number)", "3", "quark doublet 3"),
            (
                "hypercharge^2 (baryon number)",
                "-3/2",
                "quark doublet 1/6, right-handed up quark -4/3, right-handed down quark -1/3",
            ),
        ],
        "broken/chiral-triplet" => vec![("colour^3", "1", "triplet 1")],
        "broken/sp4-one-4" => vec![("gauge parity", "1", "four 1")],
        "broken/odd-doublets" => vec![("weak parity", "3", "doublet 3")],
        "broken/su5-missing-5bar" => {
            vec![("unified^3", "1", "fermions 5bar -2, fermions 10 3")]
        }
        "broken/mssm-one-higgs-doublet" => vec![
            (
                "weak^2 hypercharge",
                "1/2",
                "quark doublet 3/2, lepton doublet -3/2, up-type Higgs doublet 1/2",
            ),
            (
                "hypercharge^3",
                "1/4",
                "quark doublet 1/12, up antiquark -8/3, down antiquark 1/3, lepton doublet -3/4, \
                 positron 3, up-type Higgs doublet 1/4",
            ),
            (
                "gravity^2 hypercharge",
                "1",
                "quark doublet 3, up antiquark -6, down antiquark 3, lepton doublet -3, positron \
                 3, up-type Higgs doublet 1",
            ),
            (
                "weak parity",
                "13",
                "quark doublet 9, lepton doublet 3, up-type Higgs doublet 1",
            ),
        ],
        "broken/quark-hypercharge-mistyped" => vec![
            (
                "colour^2 hypercharge",
                "1/3",
                "quark doublet 2/3, mistyped quark doublet 2/3, right-handed up quark -2, \
                 right-handed down quark 1",
            ),
            (
                "weak^2 hypercharge",
                "1/2",
                "quark doublet 1, mistyped quark doublet 1, lepton doublet -3/2",
            ),
            (
                "hypercharge^3",
                "7/36",
                "quark doublet 1/18, mistyped quark doublet 2/9, right-handed up quark -8/3, \
                 right-handed down quark 1/3, lepton doublet -3/4, right-handed electron 3",
            ),
            (
                "gravity^2 hypercharge",
                "1",
                "quark doublet 2, mistyped quark doublet 2, right-handed up quark -6, \
                 right-handed down quark 3, lepton doublet -3, right-handed electron 3",
            ),
        ],
        other => panic!("no guilt is written down for {other}"),
    }
}

#[test]
fn broken_models_fail_where_they_are_broken() {
    let names = examples("broken/");
    assert_eq!(names.len(), 8);
    for name in names {
        let model = example(&name);
        let report = Report::of(model.spectrum()).unwrap();
        coherent(&model, &report);
        let multiplets = model.spectrum().multiplets();
        let found: Vec<(String, String, String)> = report
            .violated()
            .map(|one| {
                let shares = multiplets.iter().zip(one.contributions());
                let shares = shares.filter(|(_, share)| !share.is_zero());
                let shares: Vec<String> = shares
                    .map(|(one, share)| format!("{} {share}", one.label()))
                    .collect();
                (
                    one.name().to_owned(),
                    one.value().to_string(),
                    shares.join(", "),
                )
            })
            .collect();
        let written = guilt(&name).into_iter();
        let written: Vec<_> = written
            .map(|(a, b, c)| (a.to_owned(), b.to_owned(), c.to_owned()))
            .collect();
        assert_eq!(found, written, "{name}");
        assert!(refused(&model), "{name}");
    }
}
