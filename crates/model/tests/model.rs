//! What belongs to a model as a whole.

use model::{
    ElectricCharge, ElectricChargeDraft, Field, Group, Model, Multiplet, Spectrum, Symmetry,
};

fn spectrum(field: Field) -> Spectrum {
    let mut spectrum = Spectrum::new([
        Symmetry::gauge("colour", "SU(3)".parse().unwrap()),
        Symmetry::gauge("weak", "SU(2)".parse().unwrap()),
        Symmetry::gauge("hypercharge", Group::U1),
        Symmetry::gauge("Y", Group::U1),
        Symmetry::global("baryon number", Group::U1),
        Symmetry::gauge("parity", "Z2".parse().unwrap()),
    ])
    .unwrap();
    spectrum.add(Multiplet::draft("psi", field)).unwrap();
    spectrum
}

fn model() -> Model {
    Model::new("a model", spectrum(Field::LeftHandedFermion)).unwrap()
}

#[test]
fn the_default_electric_charge_is_isospin_and_hypercharge() {
    let model = model();
    assert_eq!(model.hypercharge(), Some(2));
    let charge = model.electric_charge().unwrap();
    assert_eq!(charge.of_weight(1, &[-1]).to_string(), "-1/2");
    assert_eq!(charge.of_weight(0, &[1, 0]).to_string(), "0");
    assert_eq!(charge.coefficients(2)[0].to_string(), "1");
    let other = model.with_hypercharge("Y").unwrap();
    let charge = other.electric_charge().unwrap();
    assert!(charge.coefficients(2).is_empty() && charge.coefficients(3).len() == 1);
}

#[test]
fn a_given_electric_charge_stays() {
    let draft = ElectricCharge::draft().along("Y", [2]);
    let model = model().with_electric_charge(draft).unwrap();
    let model = model.with_hypercharge("Y").unwrap();
    let charge = model.electric_charge().unwrap();
    assert!(charge.coefficients(1).is_empty());
    assert_eq!(charge.coefficients(3)[0].to_string(), "2");
}

#[test]
fn a_global_hypercharge_or_another_weak_group_gives_no_electric_charge() {
    for (weak, hypercharge) in [
        (
            Symmetry::gauge("weak", "SU(3)".parse().unwrap()),
            Symmetry::gauge("hypercharge", Group::U1),
        ),
        (
            Symmetry::global("weak", "SU(2)".parse().unwrap()),
            Symmetry::gauge("hypercharge", Group::U1),
        ),
        (
            Symmetry::gauge("weak", "SU(2)".parse().unwrap()),
            Symmetry::global("hypercharge", Group::U1),
        ),
    ] {
        let model = Model::new("a model", Spectrum::new([weak, hypercharge]).unwrap()).unwrap();
        assert_eq!(model.electric_charge(), None);
    }
}

#[test]
fn mistakes_in_the_electric_charge_are_refused() {
    let along = |label: &str, coefficients: &[&str]| -> ElectricChargeDraft {
        ElectricCharge::draft().along(label, coefficients.iter().copied())
    };
    for (draft, said) in [
        (along("wek", &["1/2"]), "did you mean \"weak\"?"),
        (along("colour", &["1/2"]), "takes 2 coefficients"),
        (along("Y", &["1", "1"]), "takes 1 coefficient of"),
        (along("Y", &["0.5"]), "write \"1/2\""),
        (along("baryon number", &["1"]), "a global symmetry"),
        (along("parity", &["1"]), "a discrete symmetry"),
        (along("Y", &["1"]).along("Y", ["1"]), "given twice"),
    ] {
        let error = model().with_electric_charge(draft).unwrap_err().to_string();
        assert!(error.contains(said), "{error}");
    }
}

#[test]
fn the_hypercharge_is_a_gauged_u1() {
    for (label, said) in [
        ("hipercharge", "did you mean \"hypercharge\"?"),
        ("weak", "no gauged U(1)"),
        ("baryon number", "no gauged U(1)"),
    ] {
        let error = model().with_hypercharge(label).unwrap_err().to_string();
        assert!(error.contains(said), "{error}");
    }
}

#[test]
fn superfields_belong_to_supersymmetric_models() {
    assert!(
        Model::supersymmetric("a", spectrum(Field::ChiralSuperfield))
            .unwrap()
            .is_supersymmetric()
    );
    let error = Model::new("a", spectrum(Field::ChiralSuperfield)).unwrap_err();
    assert!(
        error
            .to_string()
            .starts_with("multiplet \"psi\": a chiral superfield"),
        "{error}"
    );
    let error = Model::supersymmetric("a", spectrum(Field::ComplexScalar)).unwrap_err();
    assert!(
        error.to_string().contains("write \"chiral superfield\""),
        "{error}"
    );
}

#[test]
fn a_title_is_one_line() {
    for title in ["", " ", "a\nb", &"a".repeat(301)] {
        assert!(
            Model::new(title, spectrum(Field::RealScalar)).is_err(),
            "{title:?}"
        );
    }
    let model = model().with_source("Author 1980").with_notes("two\nlines");
    assert_eq!(
        (model.source(), model.notes()),
        (Some("Author 1980"), Some("two\nlines"))
    );
}
