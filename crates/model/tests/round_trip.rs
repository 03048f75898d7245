//! Models built in code, as files, and back; and files that nobody meant to write.

use model::{ElectricCharge, Field, Group, Model, Multiplet, Spectrum, Symmetry};
use num_rational::BigRational;
use proptest::prelude::*;

const FILE: &str = r#"
[model]
title = "A model"
source = "nobody, never"
notes = """
Two
lines"""
hypercharge = "Y"

[[symmetry]]
label = "colour"
algebra = "su3"

[[symmetry]]
label = "SU(2) left"
algebra = "SU(2)"

[[symmetry]]
label = "Y"
algebra = "U1"

[[symmetry]]
label = "parity"
algebra = "Z4"

[[symmetry]]
label = "lepton number"
algebra = "U(1)"
global = true

[[multiplet]]
label = "quark doublet"
field = "left-handed fermion"
copies = 3
transforms = { colour = "3", "SU(2) left" = "2", Y = "1/6", parity = -1 }

[[multiplet]]
label = "heavy lepton"
field = "right-handed fermion"
copies = 2
family_dependent = true
mass_gev = 1_000.5
transforms.Y = "?"
transforms."lepton number" = 1

[[multiplet]]
label = "large"
field = "real scalar"
transforms = { colour = "(2,2)", parity = 0x2 }
mass_gev = 1e12

[electric_charge]
"SU(2) left" = ["1/2"]
Y = 1
"#;

fn built() -> Model {
    let mut spectrum = Spectrum::new([
        Symmetry::gauge("colour", "SU(3)".parse().unwrap()),
        Symmetry::gauge("SU(2) left", "SU(2)".parse().unwrap()),
        Symmetry::gauge("Y", Group::U1),
        Symmetry::gauge("parity", Group::cyclic(4).unwrap()),
        Symmetry::global("lepton number", Group::U1),
    ])
    .unwrap();
    let quarks = Multiplet::draft("quark doublet", Field::LeftHandedFermion).copies(3);
    let quarks = quarks.under("colour", "3").under("SU(2) left", "(1)");
    let sixth = BigRational::new(1.into(), 6.into());
    spectrum
        .add(quarks.under("Y", sixth).under("parity", 3))
        .unwrap();
    let lepton = Multiplet::draft("heavy lepton", Field::RightHandedFermion).copies(2);
    let lepton = lepton
        .family_dependent()
        .under("Y", "?")
        .under("lepton number", 1);
    spectrum.add(lepton.mass_gev("1000.5")).unwrap();
    let large = Multiplet::draft("large", Field::RealScalar).under("colour", "27");
    let mass = BigRational::from(num_bigint::BigInt::from(1_000_000_000_000_u64));
    spectrum
        .add(large.under("parity", 2).mass_gev(mass))
        .unwrap();
    let charge = ElectricCharge::draft().along("SU(2) left", ["1/2"]);
    Model::new("A model", spectrum)
        .unwrap()
        .with_hypercharge("Y")
        .unwrap()
        .with_electric_charge(charge.along("Y", [1]))
        .unwrap()
        .with_source("nobody, never")
        .with_notes("Two\nlines")
}

#[test]
fn built_in_code_or_read_from_a_file() {
    assert_eq!(Model::from_toml(FILE).unwrap(), built());
    let json = serde_json::json!({
        "model": {"title": "A model", "source": "nobody, never", "notes": "Two\nlines",
                  "hypercharge": "Y"},
        "symmetry": [
            {"label": "colour", "algebra": "SU(3)"},
            {"label": "SU(2) left", "algebra": "A1"},
            {"label": "Y", "algebra": "U(1)"},
            {"label": "parity", "algebra": "Z(4)"},
            {"label": "lepton number", "algebra": "U(1)", "global": true},
        ],
        "multiplet": [
            {"label": "quark doublet", "field": "left-handed fermion", "copies": 3,
             "transforms": {"colour": "3", "SU(2) left": "2", "Y": "1/6", "parity": 7}},
            {"label": "heavy lepton", "field": "right-handed fermion", "copies": 2,
             "family_dependent": true, "mass_gev": 1000.5,
             "transforms": {"Y": "?", "lepton number": 1}},
            {"label": "large", "field": "real scalar", "mass_gev": 1e12,
             "transforms": {"colour": "27", "parity": "2"}},
        ],
        "electric_charge": {"SU(2) left": "1/2", "Y": ["1"]},
    });
    assert_eq!(Model::from_json(&json).unwrap(), built());
}

#[test]
fn what_is_written_reads_back() {
    assert_eq!(Model::from_toml(&built().to_toml()).unwrap(), built());
}

#[test]
fn a_supersymmetric_model_needs_no_field() {
    let text = "[model]\nsupersymmetric = true\n[[symmetry]]\nlabel = \"u\"\nalgebra = \"U(1)\"\n\
                [[multiplet]]\nlabel = \"phi\"\n";
    let model = Model::from_toml(text).unwrap();
    assert!(model.is_supersymmetric());
    assert_eq!(
        model.spectrum().multiplets()[0].field(),
        Field::ChiralSuperfield
    );
    assert_eq!(Model::from_toml(&model.to_toml()).unwrap(), model);
    let with_field = format!("{text}field = \"chiral superfield\"\n");
    assert_eq!(Model::from_toml(&with_field).unwrap(), model);
}

/// Masses are kept as they are written, not as the nearest binary number.
#[test]
fn masses_are_exact() {
    let text = "[[symmetry]]\nlabel = \"u\"\nalgebra = \"U(1)\"\n\
                [[multiplet]]\nlabel = \"a\"\nfield = \"complex scalar\"\nmass_gev = 0.1\n";
    let model = Model::from_toml(text).unwrap();
    let mass = model.spectrum().multiplets()[0]
        .mass_gev()
        .unwrap()
        .to_string();
    assert_eq!(mass, "1/10");
}

fn label() -> impl Strategy<Value = String> {
    "[a-z\"'\\\\=.#\u{e9}\u{1f600} \\[\\]{}-]{1,12}"
        .prop_map(|text| text.trim().to_owned())
        .prop_filter("labels are not empty", |text| !text.is_empty())
}

fn group() -> impl Strategy<Value = Group> {
    const NAMES: &[&str] = &[
        "SU(2)", "SU(3)", "SU(5)", "SO(8)", "SO(10)", "Sp(4)", "E6", "G2", "U(1)", "Z(3)", "Z(4)",
    ];
    prop::sample::select(NAMES).prop_map(|name| name.parse().unwrap())
}

/// Numbers to make one multiplet from.
type Seeds = (String, usize, u32, Vec<(i64, i64)>, Option<(u32, i32)>);

fn seeds() -> impl Strategy<Value = Seeds> {
    let charges = prop::collection::vec((-40..40i64, 1..13i64), 5);
    let mass = prop::option::of((1..1_000_000u32, -8..20i32));
    (label(), 0..4usize, 1..5u32, charges, mass)
}

fn draft(symmetries: &[Symmetry], seeds: Seeds) -> model::MultipletDraft {
    let (label, field, copies, numbers, mass) = seeds;
    let field = Field::ALL[field];
    let mut draft = Multiplet::draft(label, field).copies(copies);
    let is_real = field == Field::RealScalar;
    for (symmetry, (above, below)) in symmetries.iter().zip(numbers) {
        let label = symmetry.label();
        draft = match symmetry.group() {
            Group::Simple(algebra) if is_real => draft.under(label, algebra.adjoint()),
            Group::Simple(algebra) => {
                let node = usize::try_from(below).unwrap() % algebra.rank();
                let size = u32::try_from(above.rem_euclid(3)).unwrap();
                let labels: Vec<u32> = (0..algebra.rank())
                    .map(|i| if i == node { size } else { 0 })
                    .collect();
                draft.under(label, algebra.irrep(&labels).unwrap())
            }
            _ if is_real => draft,
            Group::U1 if above == 0 => draft.under(label, "?").family_dependent(),
            Group::U1 => draft.under(label, BigRational::new(above.into(), below.into())),
            Group::Discrete(_) => draft.under(label, above),
        };
    }
    match mass {
        Some((digits, exponent)) => draft.mass_gev(&*format!("{digits}e{exponent}")),
        None => draft,
    }
}

fn some_model() -> impl Strategy<Value = Model> {
    let symmetries = prop::collection::vec((label(), group(), any::<bool>()), 1..5);
    let multiplets = prop::collection::vec(seeds(), 0..5);
    (
        symmetries,
        multiplets,
        "[ -~\u{a0}-\u{24f}]{0,20}",
        any::<String>(),
    )
        .prop_map(|(symmetries, multiplets, title, notes)| {
            let symmetries =
                symmetries
                    .into_iter()
                    .enumerate()
                    .map(|(i, (label, group, gauged))| {
                        let label = format!("{label}{i}");
                        if gauged {
                            Symmetry::gauge(label, group)
                        } else {
                            Symmetry::global(label, group)
                        }
                    });
            let mut spectrum = Spectrum::new(symmetries).unwrap();
            for seeds in multiplets {
                let draft = draft(spectrum.symmetries(), seeds);
                // Two labels may fall together; the spectrum then goes without the second.
                let _ = spectrum.add(draft);
            }
            let title = format!("title {title}");
            let mut charge = ElectricCharge::draft();
            for symmetry in spectrum.symmetries().iter().filter(|s| s.is_gauged()) {
                charge = match symmetry.group() {
                    Group::Simple(algebra) => {
                        charge.along(symmetry.label(), vec!["-1/3"; algebra.rank()])
                    }
                    Group::U1 => charge.along(symmetry.label(), ["7/2"]),
                    Group::Discrete(_) => charge,
                };
            }
            let model = Model::new(title, spectrum).unwrap().with_notes(notes);
            model.with_electric_charge(charge).unwrap()
        })
}

proptest! {
    #[test]
    fn any_model_survives_its_file(model in some_model()) {
        let text = model.to_toml();
        let read = Model::from_toml(&text);
        prop_assert_eq!(read.as_ref(), Ok(&model), "{}", text);
    }

    #[test]
    fn no_text_panics(text in any::<String>(), bytes in prop::collection::vec(any::<u8>(), 0..200)) {
        let _ = Model::from_toml(&text);
        let _ = Model::from_toml(&String::from_utf8_lossy(&bytes));
    }

    /// A file with a piece cut out, doubled or overwritten is read or refused with a place in the
    /// text, never a panic; what is read survives its own file.
    #[test]
    fn damaged_files_are_read_or_refused(
        start in 0..FILE.len(), length in 0..30usize, piece in "[ -~\n]{0,6}", doubled in any::<bool>()
    ) {
        let end = (start + length).min(FILE.len());
        let (before, after) = if doubled { (end, start) } else { (start, end) };
        let text = format!("{}{piece}{}", &FILE[..before], &FILE[after..]);
        match Model::from_toml(&text) {
            Ok(model) => prop_assert_eq!(Model::from_toml(&model.to_toml()), Ok(model)),
            Err(error) => {
                let line = error.line().unwrap();
                let source = text.split('\n').nth(line - 1).unwrap();
                prop_assert_eq!(error.source_line(), Some(source));
                prop_assert!(error.column().unwrap() <= source.chars().count() + 1);
                prop_assert!(!error.help().is_empty());
            }
        }
    }
}
