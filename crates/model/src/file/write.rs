//! From the model to the text of a model file.

use std::fmt::Write as _;

use num_bigint::BigUint;
use num_rational::BigRational;

use crate::{
    ElectricCharge, Field, Group, Model, Multiplet, Symmetry, Transformation, write_decimal,
};

/// The text that reads back as the model.
pub(super) fn model(model: &Model) -> String {
    let mut text = String::from("[model]\n");
    line(&mut text, "title", &quoted(model.title()));
    if model.is_supersymmetric() {
        line(&mut text, "supersymmetric", "true");
    }
    let spectrum = model.spectrum();
    let symmetries = spectrum.symmetries();
    let hypercharge = model.hypercharge().map(|i| symmetries[i].label());
    if let Some(label) = hypercharge.filter(|&label| label != "hypercharge") {
        line(&mut text, "hypercharge", &quoted(label));
    }
    if let Some(source) = model.source() {
        line(&mut text, "source", &quoted(source));
    }
    if let Some(notes) = model.notes() {
        line(&mut text, "notes", &quoted(notes));
    }
    for symmetry in symmetries {
        self::symmetry(&mut text, symmetry);
    }
    for multiplet in spectrum.multiplets() {
        self::multiplet(&mut text, multiplet, symmetries);
    }
    let charge = model.electric_charge();
    if let Some(charge) = charge.filter(|_| charge != model.default_electric_charge().as_ref()) {
        electric_charge(&mut text, charge, symmetries);
    }
    text
}

fn symmetry(text: &mut String, symmetry: &Symmetry) {
    text.push_str("\n[[symmetry]]\n");
    line(text, "label", &quoted(symmetry.label()));
    line(text, "algebra", &quoted(&symmetry.group().to_string()));
    if !symmetry.is_gauged() {
        line(text, "global", "true");
    }
}

fn multiplet(text: &mut String, multiplet: &Multiplet, symmetries: &[Symmetry]) {
    text.push_str("\n[[multiplet]]\n");
    line(text, "label", &quoted(multiplet.label()));
    if multiplet.field() != Field::ChiralSuperfield {
        line(text, "field", &quoted(multiplet.field().name()));
    }
    if multiplet.copies() != 1 {
        line(text, "copies", &multiplet.copies().to_string());
    }
    if multiplet.is_family_dependent() {
        line(text, "family_dependent", "true");
    }
    let transforms: Vec<String> = symmetries
        .iter()
        .zip(multiplet.transformations())
        .filter(|(_, one)| !one.is_trivial())
        .map(|(symmetry, one)| format!("{} = {}", key(symmetry.label()), transformation(one)))
        .collect();
    if !transforms.is_empty() {
        line(
            text,
            "transforms",
            &format!("{{ {} }}", transforms.join(", ")),
        );
    }
    let mass = multiplet.mass_gev().and_then(write_decimal);
    if let Some(mass) = mass {
        line(text, "mass_gev", &mass);
    }
}

fn transformation(one: &Transformation) -> String {
    match one {
        Transformation::Irrep(irrep)
            if irrep.dimension() <= BigUint::from(irrep.algebra().named_up_to()) =>
        {
            quoted(&irrep.name())
        }
        Transformation::Irrep(irrep) => quoted(&irrep.bracketed()),
        Transformation::Charge(charge) => quoted(&charge.to_string()),
        Transformation::UnknownCharge => quoted("?"),
        Transformation::Discrete(charge) => charge.to_string(),
    }
}

fn electric_charge(text: &mut String, charge: &ElectricCharge, symmetries: &[Symmetry]) {
    text.push_str("\n[electric_charge]\n");
    for (i, symmetry) in symmetries.iter().enumerate() {
        let coefficients: Vec<String> = charge.coefficients(i).iter().map(fraction).collect();
        let value = match (symmetry.group(), coefficients.as_slice()) {
            (_, []) => continue,
            (Group::U1, [only]) => only.clone(),
            (_, many) => format!("[{}]", many.join(", ")),
        };
        line(text, &key(symmetry.label()), &value);
    }
}

fn fraction(value: &BigRational) -> String {
    quoted(&value.to_string())
}

fn line(text: &mut String, key: &str, value: &str) {
    writeln!(text, "{key} = {value}").expect("a String takes all that is written to it");
}

/// A key: bare where TOML allows it.
fn key(label: &str) -> String {
    let bare = |b: u8| b.is_ascii_alphanumeric() || b == b'_' || b == b'-';
    if !label.is_empty() && label.bytes().all(bare) {
        label.to_owned()
    } else {
        quoted(label)
    }
}

/// A basic string of TOML.
fn quoted(text: &str) -> String {
    let mut quoted = String::from("\"");
    for character in text.chars() {
        match character {
            '"' => quoted.push_str("\\\""),
            '\\' => quoted.push_str("\\\\"),
            '\n' => quoted.push_str("\\n"),
            '\t' => quoted.push_str("\\t"),
            c if c.is_control() => {
                write!(quoted, "\\u{:04X}", u32::from(c)).expect("a String takes all");
            }
            c => quoted.push(c),
        }
    }
    quoted.push('"');
    quoted
}
