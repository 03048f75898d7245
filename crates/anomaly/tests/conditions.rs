//! Which conditions a spectrum has, what they are called, what counts in them, and when they hold.

use anomaly::{Anomaly, Condition, Kind, Report, ReportError, Rule, is_consistent};
use model::{Field, Group, Multiplet, MultipletDraft, Spectrum, Symmetry};
use num_rational::BigRational;

fn group(name: &str) -> Group {
    name.parse().unwrap()
}

fn left(label: &str) -> MultipletDraft {
    Multiplet::draft(label, Field::LeftHandedFermion)
}

fn right(label: &str) -> MultipletDraft {
    Multiplet::draft(label, Field::RightHandedFermion)
}

/// A spectrum under gauged `symmetries`.
fn gauged(
    symmetries: &[(&str, &str)],
    drafts: impl IntoIterator<Item = MultipletDraft>,
) -> Spectrum {
    let symmetries = symmetries.iter();
    let symmetries = symmetries.map(|(label, name)| Symmetry::gauge(*label, group(name)));
    let mut spectrum = Spectrum::new(symmetries).unwrap();
    for draft in drafts {
        spectrum.add(draft).unwrap();
    }
    spectrum
}

fn value(spectrum: &Spectrum, name: &str) -> String {
    condition(spectrum, name).value().to_string()
}

fn condition(spectrum: &Spectrum, name: &str) -> Condition {
    let report = Report::of(spectrum).unwrap();
    let found = report.conditions().iter().find(|one| one.name() == name);
    let condition = found.unwrap_or_else(|| panic!("no condition {name}"));
    let sum: BigRational = condition.contributions().iter().sum();
    assert_eq!(&sum, condition.value(), "{name}");
    assert_eq!(condition.contributions().len(), spectrum.multiplets().len());
    condition.clone()
}

/// All that four dimensions have, in order; a global symmetry's conditions are there and free.
#[test]
fn every_condition_by_name() {
    let spectrum = Spectrum::new([
        Symmetry::gauge("c", group("SU(3)")),
        Symmetry::gauge("w", group("SU(2)")),
        Symmetry::gauge("y", Group::U1),
        Symmetry::global("b", Group::U1),
        Symmetry::gauge("z", group("Z(6)")),
        Symmetry::gauge("e", group("E6")),
        Symmetry::global("f", group("SU(2)")),
    ])
    .unwrap();
    let report = Report::of(&spectrum).unwrap();
    let told = report.conditions().iter().map(|one| {
        let free = if one.must_cancel() { "" } else { ", free" };
        let factors = one.factors().join(",");
        format!("{}: {} [{factors}]{free}", one.name(), one.kind().name())
    });
    let expected = [
        "c^3: cubic [c,c,c]",
        "c^2 y: mixed [c,c,y]",
        "c^2 b: mixed [c,c,b], free",
        "w^2 y: mixed [w,w,y]",
        "w^2 b: mixed [w,w,b], free",
        "e^2 y: mixed [e,e,y]",
        "e^2 b: mixed [e,e,b], free",
        "f^2 y: mixed [f,f,y], free",
        "f^2 b: mixed [f,f,b], free",
        "y^3: cubic [y,y,y]",
        "y^2 b: mixed [y,y,b], free",
        "y b^2: mixed [y,b,b], free",
        "b^3: cubic [b,b,b], free",
        "gravity^2 y: gravitational [gravity,gravity,y]",
        "gravity^2 b: gravitational [gravity,gravity,b], free",
        "w parity: global [w]",
        "f parity: global [f], free",
        "c^2 z: discrete [c,c,z]",
        "w^2 z: discrete [w,w,z]",
        "e^2 z: discrete [e,e,z]",
        "f^2 z: discrete [f,f,z], free",
        "gravity^2 z: discrete [gravity,gravity,z]",
    ];
    assert_eq!(told.collect::<Vec<_>>(), expected);
}

/// No group but these has a cubic index [Georgi-Glashow 1972] or a parity [Witten 1982].
#[test]
fn which_groups_have_a_condition_of_their_own() {
    let cases = [
        ("SU(2)", "g parity"),
        ("SU(3)", "g^3"),
        ("SU(4)", "g^3"),
        ("SU(9)", "g^3"),
        ("SO(5)", "g parity"),
        ("SO(6)", "g^3"),
        ("SO(7)", ""),
        ("SO(10)", ""),
        ("Sp(4)", "g parity"),
        ("Sp(6)", "g parity"),
        ("Sp(20)", "g parity"),
        ("E6", ""),
        ("E7", ""),
        ("E8", ""),
        ("F4", ""),
        ("G2", ""),
        ("U(1)", "g^3, gravity^2 g"),
        ("Z(3)", "gravity^2 g"),
    ];
    for (name, expected) in cases {
        let report = Report::of(&gauged(&[("g", name)], [])).unwrap();
        let names: Vec<&str> = report.conditions().iter().map(Condition::name).collect();
        assert_eq!(names.join(", "), expected, "{name}");
    }
}

/// A right-handed triplet of charge q is a left-handed antitriplet of charge -q; scalars add
/// nothing, superfields what left-handed fermions do. One sum per kind by hand: 3 of A = 1, l = 1,
/// two doublets in it, five copies.
#[test]
fn signs_and_multiplicities() {
    let symmetries = [("c", "SU(3)"), ("w", "SU(2)"), ("y", "U(1)"), ("z", "Z(7)")];
    let fields = [
        (Field::LeftHandedFermion, 1),
        (Field::RightHandedFermion, -1),
        (Field::ChiralSuperfield, 1),
        (Field::ComplexScalar, 0),
    ];
    for (field, sign) in fields {
        let draft = Multiplet::draft("psi", field).copies(5).under("c", "3");
        let draft = draft.under("w", "2").under("y", "2/3").under("z", 3);
        let spectrum = gauged(&symmetries, [draft]);
        let expect = |name: &str, above: i64, below: i64| {
            let expected = BigRational::new((sign * above).into(), below.into());
            assert_eq!(
                value(&spectrum, name),
                expected.to_string(),
                "{field}, {name}"
            );
        };
        expect("c^3", 10, 1);
        expect("c^2 y", 20, 3);
        expect("w^2 y", 10, 1);
        expect("y^3", 80, 9);
        expect("gravity^2 y", 20, 1);
        expect("c^2 z", 30, 1);
        expect("w^2 z", 45, 1);
        expect("gravity^2 z", 90, 1);
        // A parity asks for a number of doublets, of either handedness.
        assert_eq!(value(&spectrum, "w parity"), (15 * sign.abs()).to_string());
    }
    let real = Multiplet::draft("phi", Field::RealScalar).under("c", "8");
    assert_eq!(value(&gauged(&symmetries, [real]), "c^3"), "0");
}

/// SO(6) is SU(4): 4 with 4bar cancels, 6 is real, 10 of SU(4) has A = 8 [Banks-Georgi 1976].
#[test]
fn so6_as_su4() {
    let cubic = |name: &str, irrep: &str| {
        value(
            &gauged(&[("g", name)], [left("psi").under("g", irrep)]),
            "g^3",
        )
    };
    for (irrep, expected) in [
        ("4", "1"),
        ("4bar", "-1"),
        ("6", "0"),
        ("10", "8"),
        ("15", "0"),
    ] {
        assert_eq!(cubic("SU(4)", irrep), expected, "{irrep}");
        assert_eq!(cubic("SO(6)", irrep), expected, "{irrep}");
    }
}

/// [Ibanez-Ross 1991]: with a gauge group modulo N, with gravity modulo N, or N/2 for even N.
#[test]
fn moduli_of_discrete_conditions() {
    for (n, with_gravity) in [
        (3, 3),
        (4, 2),
        (5, 5),
        (6, 3),
        (9, 9),
        (4_294_967_295, 4_294_967_295),
    ] {
        let name = format!("Z({n})");
        let spectrum = gauged(&[("w", "SU(2)"), ("z", &name)], []);
        let rule = |name: &str| condition(&spectrum, name).rule();
        assert_eq!(rule("w^2 z"), Rule::MultipleOf(n));
        assert_eq!(rule("gravity^2 z"), Rule::MultipleOf(with_gravity));
    }
    // Any sum will do for gravity with a Z(2): there is no such condition.
    let spectrum = gauged(&[("w", "SU(2)"), ("z", "Z(2)")], []);
    assert_eq!(condition(&spectrum, "w^2 z").rule(), Rule::MultipleOf(2));
    let report = Report::of(&spectrum).unwrap();
    assert!(
        report
            .conditions()
            .iter()
            .all(|one| one.name() != "gravity^2 z")
    );
}

/// Charges count modulo N however they are written, and a right-handed one is minus a left-handed.
#[test]
fn discrete_sums_hold_modulo_n() {
    let symmetries = [("w", "SU(2)"), ("z", "Z(6)")];
    let doublet = |label: &str, charge: i32| left(label).under("w", "2").under("z", charge);
    let cases = [
        (vec![doublet("a", 1), doublet("b", -1)], true),
        (vec![doublet("a", 1), doublet("b", 5)], true),
        (vec![doublet("a", 1), doublet("b", 2)], false),
        // Gravity sees 6, a multiple of 3; SU(2) sees 3, which is no multiple of 6.
        (vec![doublet("a", 3), doublet("b", 0)], false),
        // Gravity alone: 3 is a multiple of N/2; 1 is not.
        (vec![left("a").under("z", 3)], true),
        (vec![left("a").under("z", 1)], false),
        (
            vec![left("a").under("z", 2), right("b").under("z", 2)],
            true,
        ),
        (
            vec![left("a").under("z", 2), right("b").under("z", -1)],
            true,
        ),
        (
            vec![left("a").under("z", 2), right("b").under("z", 1)],
            false,
        ),
    ];
    for (case, (drafts, holds)) in cases.into_iter().enumerate() {
        let spectrum = gauged(&symmetries, drafts);
        assert_eq!(is_consistent(&spectrum), Ok(holds), "case {case}");
        assert_eq!(Report::of(&spectrum).unwrap().is_consistent(), holds);
    }
}

/// A global symmetry may be anomalous, by itself and under a gauge group.
#[test]
fn global_symmetries_need_not_cancel() {
    let build = |baryon: Symmetry| {
        let mut spectrum = Spectrum::new([Symmetry::gauge("w", group("SU(2)")), baryon]).unwrap();
        let quarks = left("quarks").copies(2).under("w", "2").under("b", 1);
        spectrum.add(quarks).unwrap();
        spectrum
    };
    let free = build(Symmetry::global("b", Group::U1));
    assert_eq!(is_consistent(&free), Ok(true));
    let mixed = condition(&free, "w^2 b");
    assert!(!mixed.cancels() && !mixed.must_cancel() && !mixed.is_violated());
    assert_eq!(mixed.value().to_string(), "2");
    let gauge = build(Symmetry::gauge("b", Group::U1));
    assert_eq!(is_consistent(&gauge), Ok(false));
    let report = Report::of(&gauge).unwrap();
    let violated: Vec<&str> = report.violated().map(Condition::name).collect();
    assert_eq!(violated, ["w^2 b", "b^3", "gravity^2 b"]);
}

/// One global U(1) among three, at any place of the product, sets it free.
#[test]
fn three_different_charges() {
    for global in 0..3 {
        let symmetries = ["a", "b", "c"].into_iter().enumerate();
        let mut spectrum = Spectrum::new(symmetries.map(|(place, label)| {
            if place == global {
                Symmetry::global(label, Group::U1)
            } else {
                Symmetry::gauge(label, Group::U1)
            }
        }))
        .unwrap();
        // (1,1,1) + (1,-1,-1) + (-1,1,-1) + (-1,-1,1): only the product of all three is left.
        let signs = [[1, 1, 1], [1, -1, -1], [-1, 1, -1], [-1, -1, 1]];
        for (place, [a, b, c]) in signs.into_iter().enumerate() {
            let draft = left(&format!("f{place}")).under("a", a);
            spectrum.add(draft.under("b", b).under("c", c)).unwrap();
        }
        let product = condition(&spectrum, "a b c");
        assert_eq!(
            (product.value().to_string(), product.kind()),
            ("4".into(), Kind::Mixed)
        );
        assert!(!product.cancels() && !product.must_cancel());
        assert_eq!(is_consistent(&spectrum), Ok(true));
    }
}

#[test]
fn an_unknown_charge_has_no_anomaly() {
    let spectrum = gauged(&[("y", "U(1)")], [left("psi").under("y", "?")]);
    let error = Report::of(&spectrum).unwrap_err();
    let ReportError::UnknownCharge(error) = error else {
        panic!("{error}");
    };
    assert_eq!((&*error.multiplet, &*error.symmetry), ("psi", "y"));
    assert_eq!(is_consistent(&spectrum), Err(error));
    // A scalar's charge enters nothing.
    let scalar = Multiplet::draft("phi", Field::ComplexScalar).under("y", "?");
    assert_eq!(is_consistent(&gauged(&[("y", "U(1)")], [scalar])), Ok(true));
}

#[test]
fn symmetries_of_an_anomaly() {
    let spectrum = gauged(&[("a", "U(1)"), ("b", "U(1)")], []);
    let all: Vec<Vec<usize>> = Anomaly::all(&spectrum).map(Anomaly::symmetries).collect();
    let triples = [[0, 0, 0], [0, 0, 1], [0, 1, 1], [1, 1, 1]].map(|one| one.to_vec());
    assert_eq!(all, [&triples[..], &[vec![0], vec![1]]].concat());
    let kinds: Vec<Kind> = Anomaly::all(&spectrum).map(Anomaly::kind).collect();
    let (cubic, mixed, gravity) = (Kind::Cubic, Kind::Mixed, Kind::Gravitational);
    assert_eq!(kinds, [cubic, mixed, mixed, cubic, gravity, gravity]);
}

/// A spectrum within the bounds of the model file can have more conditions than a report holds.
#[test]
fn a_report_that_would_be_too_long_is_refused() {
    let symmetries = (0..30).map(|i| Symmetry::gauge(format!("u{i}"), Group::U1));
    let mut spectrum = Spectrum::new(symmetries).unwrap();
    for i in 0..500 {
        let draft = Multiplet::draft(format!("psi{i}"), Field::LeftHandedFermion);
        spectrum.add(draft).unwrap();
    }
    // Triples of 30 U(1)s with repetition, and gravity with each.
    let conditions = 30 * 31 * 32 / 6 + 30;
    assert!(conditions * 500 > Report::MOST_SHARES);
    let refused = Report::of(&spectrum).unwrap_err();
    assert_eq!(
        refused,
        ReportError::TooLong {
            conditions,
            multiplets: 500,
            most: Report::MOST_SHARES,
        }
    );
    assert_eq!(is_consistent(&spectrum), Ok(true));
}
