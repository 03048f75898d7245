//! What an audit says of models that are not the usual ones.

use serde_json::Value;

use crate::run::{with_input, workspace};

fn audit(model: &str, format: &str) -> String {
    with_input(&["audit", "-", "--format", format], model.as_bytes()).done()
}

fn audit_json(model: &str) -> Value {
    serde_json::from_str(&audit(model, "json")).unwrap()
}

/// The Standard Model with every hypercharge doubled, Q = T3 + Y/2: the coefficient in unified
/// normalisation is what it is with Q = T3 + Y, 41/10 ([Georgi-Quinn-Weinberg 1974]).
#[test]
fn unified_normalisation_follows_the_electric_charge() {
    let usual = workspace().join("docs/models/standard-model.toml");
    let usual = std::fs::read_to_string(usual).unwrap();
    let mut doubled = String::new();
    for line in usual.lines() {
        match line.split_once("hypercharge = \"") {
            Some((before, rest)) => {
                let (charge, after) = rest.split_once('"').unwrap();
                let charge: num_rational::BigRational = charge.parse().unwrap();
                let twice = &charge + &charge;
                doubled += &format!("{before}hypercharge = \"{twice}\"{after}\n");
            }
            None => doubled += &format!("{line}\n"),
        }
    }
    doubled += "[electric_charge]\nweak = [\"1/2\"]\nhypercharge = \"1/2\"\n";
    for model in [&usual, &doubled] {
        let answer = audit_json(model);
        assert_eq!(answer["running"]["one_loop"]["hypercharge"], "41/10");
    }
}

/// A charge of a scalar may be unknown: anomalies are told, the coefficient is not.
#[test]
fn an_unknown_coefficient_is_said_to_be_unknown() {
    let model = "[[symmetry]]\nlabel = \"u\"\nalgebra = \"U(1)\"\n\
                 [[multiplet]]\nlabel = \"phi\"\nfield = \"complex scalar\"\n\
                 transforms = { u = \"?\" }\n";
    assert_eq!(audit_json(model)["running"]["one_loop"]["u"], Value::Null);
    assert!(audit(model, "text").contains("unknown"));
}

/// Anomalies of global symmetries are no anomalies of the gauge group, and the verdict does not
/// deny them.
#[test]
fn anomalies_of_global_symmetries_are_not_denied() {
    let model = "[[symmetry]]\nlabel = \"g\"\nalgebra = \"G2\"\n\
                 [[symmetry]]\nlabel = \"flavour\"\nalgebra = \"U(1)\"\nglobal = true\n\
                 [[multiplet]]\nlabel = \"psi\"\nfield = \"left-handed fermion\"\n\
                 transforms = { g = \"7\", flavour = 1 }\n";
    let text = audit(model, "text");
    assert!(text.contains("those below belong to global ones"), "{text}");
    assert!(!text.contains("whatever the multiplets"));
    let conditions = audit_json(model)["anomalies"]["conditions"].clone();
    let values = conditions
        .as_array()
        .unwrap()
        .iter()
        .map(|one| one["value"].as_str().unwrap());
    // l(7) = 2, seven states of charge 1.
    assert_eq!(values.collect::<Vec<_>>(), ["2", "7", "7"]);
}

/// A mass is a decimal, as it is in the model file.
#[test]
fn a_mass_is_a_number() {
    let model = "[[symmetry]]\nlabel = \"u\"\nalgebra = \"U(1)\"\n\
                 [[multiplet]]\nlabel = \"phi\"\nfield = \"complex scalar\"\nmass_gev = 750.5\n";
    assert_eq!(
        audit_json(model)["multiplets"][0]["mass_gev"].to_string(),
        "750.5"
    );
}
