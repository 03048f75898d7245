//! One-loop coefficients that are in print, and what must be true of all of them.

use model::{Field, Group, Model, Multiplet, MultipletDraft, Spectrum, Symmetry};
use running::one_loop;

fn spectrum(
    symmetries: &[(&str, &str)],
    drafts: impl IntoIterator<Item = MultipletDraft>,
) -> Spectrum {
    let symmetries = symmetries.iter();
    let symmetries = symmetries.map(|(label, name)| Symmetry::gauge(*label, name.parse().unwrap()));
    let mut spectrum = Spectrum::new(symmetries).unwrap();
    for draft in drafts {
        spectrum.add(draft).unwrap();
    }
    spectrum
}

fn values(model: &Model) -> Vec<String> {
    let coefficients = one_loop(model);
    for one in &coefficients {
        let shares = one.contributions().unwrap();
        assert_eq!(shares.len(), model.spectrum().multiplets().len());
        let sum = shares
            .iter()
            .fold(one.gauge_bosons().clone(), |sum, share| sum + share);
        assert_eq!(Some(sum), one.value());
    }
    coefficients
        .iter()
        .map(|one| one.value().unwrap().to_string())
        .collect()
}

fn plain(symmetry: &str, drafts: impl IntoIterator<Item = MultipletDraft>) -> String {
    let model = Model::new("test", spectrum(&[("g", symmetry)], drafts)).unwrap();
    values(&model).concat()
}

fn supersymmetric(symmetry: &str, drafts: impl IntoIterator<Item = MultipletDraft>) -> String {
    let model = Model::supersymmetric("test", spectrum(&[("g", symmetry)], drafts)).unwrap();
    values(&model).concat()
}

fn field(label: &str, field: Field, copies: u32, irrep: &str) -> MultipletDraft {
    Multiplet::draft(label, field)
        .copies(copies)
        .under("g", irrep)
}

const LEFT: Field = Field::LeftHandedFermion;
const RIGHT: Field = Field::RightHandedFermion;
const COMPLEX: Field = Field::ComplexScalar;
const REAL: Field = Field::RealScalar;
const SUPER: Field = Field::ChiralSuperfield;

/// [Gross-Wilczek 1973], [Politzer 1973]: -11 + 2/3 per flavour, lost from 17 flavours on.
#[test]
fn flavours_of_quarks() {
    for flavours in 1..=20u32 {
        let quarks = [
            field("q", LEFT, flavours, "3"),
            field("Q", RIGHT, flavours, "3"),
        ];
        let model = Model::new("flavours", spectrum(&[("g", "SU(3)")], quarks)).unwrap();
        let [colour] = &one_loop(&model)[..] else {
            panic!("one coupling")
        };
        let third = num_rational::BigRational::new((2 * i64::from(flavours) - 33).into(), 3.into());
        assert_eq!(colour.value(), Some(third));
        assert_eq!(colour.is_asymptotically_free(), Some(flavours <= 16));
    }
}

/// Gauge bosons alone: -11/3 times the dual Coxeter number; -3 times with gauginos.
#[test]
fn gauge_bosons() {
    let cases = [
        ("SU(2)", "-22/3", "-6"),
        ("SU(3)", "-11", "-9"),
        ("SO(10)", "-88/3", "-24"),
        ("Sp(4)", "-11", "-9"),
        ("G2", "-44/3", "-12"),
        ("E6", "-44", "-36"),
        ("E8", "-110", "-90"),
        ("U(1)", "0", "0"),
    ];
    for (name, bosons, with_gauginos) in cases {
        assert_eq!(plain(name, []), bosons, "{name}");
        assert_eq!(supersymmetric(name, []), with_gauginos, "{name}");
        if name != "U(1)" {
            // A gaugino is a Weyl fermion in the adjoint, -11/3 + 2/3 = -3: two ways to one number.
            let adjoint = name.parse::<Group>().unwrap().simple().unwrap().adjoint();
            let gaugino = Multiplet::draft("gaugino", LEFT).under("g", adjoint);
            assert_eq!(plain(name, [gaugino]), with_gauginos, "{name}");
        }
    }
}

/// N = 4 supersymmetry has no running: three superfields in the adjoint; or, component by
/// component, four Weyl fermions and six real scalars. Common practice, no source.
#[test]
fn no_running_with_four_supersymmetries() {
    for (name, adjoint) in [
        ("SU(2)", "3"),
        ("SU(3)", "8"),
        ("SU(5)", "24"),
        ("SO(10)", "45"),
    ] {
        assert_eq!(supersymmetric(name, [field("phi", SUPER, 3, adjoint)]), "0");
        let components = [
            field("lambda", LEFT, 4, adjoint),
            field("x", REAL, 6, adjoint),
        ];
        assert_eq!(plain(name, components), "0", "{name}");
    }
}

/// A complex scalar is two real ones.
#[test]
fn complex_and_real_scalars() {
    for (name, irrep) in [
        ("SU(2)", "3"),
        ("SO(10)", "54"),
        ("G2", "7"),
        ("Sp(4)", "5"),
    ] {
        let complex = plain(name, [field("phi", COMPLEX, 1, irrep)]);
        let real = plain(
            name,
            [field("a", REAL, 1, irrep), field("b", REAL, 1, irrep)],
        );
        assert_eq!(complex, real, "{name}");
    }
}

/// Dimensions under the other groups multiply, global and discrete symmetries have no coupling,
/// and the square of a charge does not see its sign or handedness.
#[test]
fn which_couplings_run() {
    let mut spectrum = Spectrum::new([
        Symmetry::gauge("c", "SU(3)".parse().unwrap()),
        Symmetry::global("f", "SU(4)".parse().unwrap()),
        Symmetry::gauge("z", "Z(4)".parse().unwrap()),
        Symmetry::gauge("y", Group::U1),
        Symmetry::global("b", Group::U1),
    ])
    .unwrap();
    let draft = Multiplet::draft("psi", RIGHT).copies(2).under("c", "3");
    let draft = draft
        .under("f", "4")
        .under("z", 1)
        .under("y", "-1/2")
        .under("b", 7);
    spectrum.add(draft).unwrap();
    let model = Model::new("test", spectrum).unwrap();
    let places: Vec<usize> = one_loop(&model)
        .iter()
        .map(running::BetaCoefficient::symmetry)
        .collect();
    assert_eq!(places, [0, 3]);
    // 2/3 * 2 * 4 / 2 - 11 and 2/3 * 2 * 12 / 4.
    assert_eq!(values(&model), ["-25/3", "4"]);
}

#[test]
fn an_unknown_charge_has_no_coefficient() {
    let unknown = Multiplet::draft("psi", LEFT).under("g", "?");
    let model = Model::new(
        "test",
        spectrum(&[("g", "U(1)"), ("c", "SU(3)")], [unknown]),
    )
    .unwrap();
    let [charge, colour] = &one_loop(&model)[..] else {
        panic!("two couplings")
    };
    assert_eq!(
        (charge.value(), charge.is_asymptotically_free()),
        (None, None)
    );
    assert_eq!(colour.value().unwrap().to_string(), "-11");
}
