//! What a spectrum accepts, what it refuses, and the numbers it holds ready.

use model::{Error, Field, Group, Multiplet, MultipletDraft, Part, Problem, Spectrum, Symmetry};
use num_rational::BigRational;
use proptest::prelude::*;

fn group(name: &str) -> Group {
    name.parse().unwrap()
}

fn spectrum() -> Spectrum {
    Spectrum::new([
        Symmetry::gauge("colour", group("SU(3)")),
        Symmetry::gauge("weak", group("SU(2)")),
        Symmetry::gauge("hypercharge", Group::U1),
        Symmetry::gauge("parity", group("Z(4)")),
        Symmetry::global("lepton number", Group::U1),
    ])
    .unwrap()
}

fn fermion() -> MultipletDraft {
    Multiplet::draft("psi", Field::LeftHandedFermion)
}

fn refused(draft: MultipletDraft) -> (Part, Problem) {
    let mut spectrum = spectrum();
    let error = spectrum.add(draft).unwrap_err();
    assert!(spectrum.multiplets().is_empty());
    assert!(!error.problem().help().is_empty(), "{error}");
    (error.part().clone(), error.problem().clone())
}

#[test]
fn facts_of_a_quark_doublet() {
    let mut spectrum = spectrum();
    let draft = fermion().copies(3).under("colour", "3bar");
    let draft = draft.under("weak", "2").under("hypercharge", "1/6");
    spectrum.add(draft.under("parity", -1)).unwrap();
    let quark = &spectrum.multiplets()[0];
    assert_eq!((quark.dimension(), quark.copies()), (6, 3));
    let all: Vec<(u64, u64, i64)> = (0..5)
        .map(|i| {
            let indices = (quark.dynkin_index_under(i), quark.cubic_index_under(i));
            (quark.dimension_under(i), indices.0, indices.1)
        })
        .collect();
    assert_eq!(
        all,
        [(3, 1, -1), (2, 1, 0), (1, 0, 0), (1, 0, 0), (1, 0, 0)]
    );
    assert_eq!(quark.scaled_charge(2), Some(1));
    assert_eq!(spectrum.charge_denominator(2), Some(6));
    assert_eq!(spectrum.charge_denominator(0), None);
    assert_eq!(quark.scaled_charge(0), None);
    assert_eq!(quark.discrete_charge(3), Some(3));
    assert_eq!(quark.charge(4).unwrap().to_string(), "0");
    assert_eq!(quark.irrep(0).unwrap().name(), "3bar");
    assert_eq!(spectrum.multiplet("psi"), Some(quark));
}

#[test]
fn a_right_handed_field_is_its_conjugate_in_the_left_handed_view() {
    let signs = Field::ALL.map(Field::left_handed_sign);
    assert_eq!(signs, [1, -1, 1, 1, 1]);
    let fermions = Field::ALL.map(Field::has_fermions);
    assert_eq!(fermions, [true, true, false, false, true]);
}

#[test]
fn field_names_both_ways() {
    for field in Field::ALL {
        assert_eq!(field.to_string().parse(), Ok(field));
    }
    let error = "lefthanded fermion".parse::<Field>().unwrap_err();
    assert!(
        error
            .help()
            .starts_with("did you mean \"left-handed fermion\"?"),
        "{error}"
    );
}

#[test]
fn groups_both_ways() {
    for (written, shown) in [
        ("su3", "SU(3)"),
        ("U1", "U(1)"),
        ("u(1)", "U(1)"),
        ("Z3", "Z(3)"),
        ("z(12)", "Z(12)"),
        (" E6 ", "E6"),
        ("so10", "SO(10)"),
        ("usp(4)", "Sp(4)"),
        ("D5", "SO(10)"),
    ] {
        assert_eq!(group(written).to_string(), shown);
        assert_eq!(group(shown), group(written));
    }
    for (written, said) in [
        ("SU(3) x SU(2)", "write one symmetry for each factor"),
        ("Z(1)", "write Z(2) or larger"),
        ("Z(0)", "write Z(2) or larger"),
        ("Z(99999999999)", "at most Z(4294967295)"),
        ("SU3)", "U(1) or Z(N)"),
        ("SO(4)", "write two symmetries, each SU(2)"),
        ("SU(1000000)", "SU(257)"),
        ("", "U(1) or Z(N)"),
        ("Z(-3)", "U(1) or Z(N)"),
    ] {
        let error = written.parse::<Group>().unwrap_err();
        assert!(error.help().contains(said), "{written}: {error}");
    }
}

#[test]
fn the_common_denominator_grows_with_the_charges() {
    let mut spectrum = spectrum();
    for (label, charge) in [("a", "1/6"), ("b", "-3/4"), ("c", "2"), ("d", "?")] {
        let draft = Multiplet::draft(label, Field::LeftHandedFermion);
        spectrum.add(draft.under("hypercharge", charge)).unwrap();
    }
    assert_eq!(spectrum.charge_denominator(2), Some(12));
    let scaled: Vec<_> = spectrum
        .multiplets()
        .iter()
        .map(|m| m.scaled_charge(2))
        .collect();
    assert_eq!(scaled, [Some(2), Some(-9), Some(24), None]);
    assert!(spectrum.multiplets()[3].is_charge_unknown(2) && spectrum.has_unknown_charges());
}

/// Charges that share no denominator within 63 bits stay exact; only the whole numbers go.
#[test]
fn charges_beyond_63_bits_have_no_whole_numbers() {
    for pair in [
        ["1/4294967311", "1/4294967357"],
        ["1/4294967311", "4294967311"],
        ["9223372036854775808", "1"],
    ] {
        let mut spectrum = spectrum();
        for (label, charge) in ["a", "b"].into_iter().zip(pair) {
            let draft = Multiplet::draft(label, Field::LeftHandedFermion);
            spectrum.add(draft.under("hypercharge", charge)).unwrap();
        }
        assert_eq!(spectrum.charge_denominator(2), None, "{pair:?}");
        for (multiplet, written) in spectrum.multiplets().iter().zip(pair) {
            assert_eq!(multiplet.scaled_charge(2), None);
            assert_eq!(multiplet.charge(2).unwrap().to_string(), written);
        }
        assert_eq!(spectrum.charge_denominator(4), Some(1));
    }
}

#[test]
fn every_mistake_in_a_draft_is_refused() {
    let under = |symmetry: &str| Part::Under(symmetry.into());
    let named = |symmetry: &str| Part::SymmetryLabel(symmetry.into());
    let draft = |label: &str| Multiplet::draft(label, Field::LeftHandedFermion);
    let half = || BigRational::new(1.into(), 2.into());
    let quark = "SU(3)"
        .parse::<roots::SimpleAlgebra>()
        .unwrap()
        .read_irrep("3")
        .unwrap();
    let cases: Vec<(MultipletDraft, Part, &str)> = vec![
        (draft(""), Part::Label, "is empty"),
        (draft("a\nb"), Part::Label, "control character"),
        (draft(" a"), Part::Label, "begins or ends"),
        (draft(&"a".repeat(101)), Part::Label, "more than 100"),
        (fermion().copies(0), Part::Copies, "from 1 to 1000000"),
        (
            fermion().copies(1_000_001),
            Part::Copies,
            "from 1 to 1000000",
        ),
        (fermion().family_dependent(), Part::FamilyDependent, "\"?\""),
        (
            fermion().under("color", "3"),
            named("color"),
            "did you mean \"colour\"?",
        ),
        (
            fermion().under("weak", "2").under("weak", "2"),
            named("weak"),
            "given twice",
        ),
        (fermion().under("colour", "7"), under("colour"), "6 = (20)"),
        (
            fermion().under("colour", "(1,0,0)"),
            under("colour"),
            "write 2 in brackets",
        ),
        (
            fermion().under("colour", "15''"),
            under("colour"),
            "15' = (40)",
        ),
        (
            fermion().under("colour", "(1,-1)"),
            under("colour"),
            "from 0 to",
        ),
        (
            fermion().under("weak", quark.clone()),
            under("weak"),
            "write an irrep of SU(2)",
        ),
        (
            fermion().under("weak", half()),
            under("weak"),
            "write an irrep of SU(2)",
        ),
        (
            fermion().under("weak", 2),
            under("weak"),
            "in quotation marks, \"2\"",
        ),
        (
            fermion().under("hypercharge", quark),
            under("hypercharge"),
            "write a charge",
        ),
        (
            fermion().under("hypercharge", "0.5"),
            under("hypercharge"),
            "write \"1/2\"",
        ),
        (
            fermion().under("hypercharge", "-1e-1"),
            under("hypercharge"),
            "write \"-1/10\"",
        ),
        (
            fermion().under("hypercharge", "1/0"),
            under("hypercharge"),
            "a fraction such as -1/3",
        ),
        (
            fermion().under("hypercharge", "NaN"),
            under("hypercharge"),
            "a fraction such as -1/3",
        ),
        (
            fermion().under("parity", "1/2"),
            under("parity"),
            "write a whole number",
        ),
        (
            fermion().under("parity", "?"),
            under("parity"),
            "write a whole number",
        ),
        (
            fermion().under("parity", half()),
            under("parity"),
            "write a whole number",
        ),
        (fermion().mass_gev("0"), Part::Mass, "write a mass above 0"),
        (
            fermion().mass_gev("-1e3"),
            Part::Mass,
            "write a mass above 0",
        ),
        (fermion().mass_gev("inf"), Part::Mass, "750.5 or 1e12"),
        (fermion().mass_gev("1e201"), Part::Mass, "from -200 to 200"),
        (
            fermion().mass_gev("1e99999999999"),
            Part::Mass,
            "from -200 to 200",
        ),
        (
            fermion().mass_gev(BigRational::new(1.into(), 3.into())),
            Part::Mass,
            "750.5 or 1e12",
        ),
        (
            fermion().under("colour", "(4000000000,4000000000)"),
            under("colour"),
            "63 bits",
        ),
        (
            fermion().under("weak", "(4000000000)"),
            under("weak"),
            "63 bits",
        ),
        (
            fermion().copies(9_000).under("weak", "(1000000)"),
            under("weak"),
            "63 bits",
        ),
    ];
    for (draft, part, said) in cases {
        let shown = format!("{draft:?}");
        let (found, problem) = refused(draft);
        assert_eq!(found, part, "{shown}: {problem}");
        assert!(problem.to_string().contains(said), "{shown}: {problem}");
    }
}

#[test]
fn real_scalars_are_in_real_representations() {
    let real = || Multiplet::draft("s", Field::RealScalar);
    for (draft, said) in [
        (
            real().under("colour", "3"),
            "complex irrep (10) of \"colour\"",
        ),
        (
            real().under("weak", "2"),
            "pseudoreal irrep (1) of \"weak\"",
        ),
        (
            real().under("hypercharge", 1),
            "the charge 1 under \"hypercharge\"",
        ),
        (
            real().under("hypercharge", "?"),
            "the charge ? under \"hypercharge\"",
        ),
        (real().under("parity", 1), "the charge 1 under \"parity\""),
    ] {
        let (_, problem) = refused(draft);
        assert!(problem.message().contains(said), "{problem}");
    }
    spectrum()
        .add(
            real()
                .under("weak", "3")
                .under("colour", "8")
                .under("parity", 2),
        )
        .unwrap();
    let mut two =
        Spectrum::new(["left", "right"].map(|l| Symmetry::gauge(l, group("SU(2)")))).unwrap();
    two.add(real().under("left", "2").under("right", "2"))
        .unwrap();
}

#[test]
fn symmetry_labels_are_checked() {
    for (labels, said) in [
        (vec![], "there is no symmetry"),
        (vec!["a", "a"], "used twice"),
        (vec!["gravity"], "stands for gravity"),
        (vec![""], "is empty"),
    ] {
        let symmetries = labels
            .iter()
            .map(|label| Symmetry::gauge(*label, Group::U1));
        let error: Error = Spectrum::new(symmetries).unwrap_err();
        assert!(error.to_string().contains(said), "{error}");
    }
    let many = (0..).map(|i| Symmetry::gauge(format!("u{i}"), Group::U1));
    assert_eq!(
        *Spectrum::new(many).unwrap_err().problem(),
        Problem::TooManySymmetries
    );
}

#[test]
fn a_second_multiplet_of_one_label_is_refused() {
    let mut spectrum = spectrum();
    spectrum.add(fermion()).unwrap();
    let error = spectrum.add(fermion()).unwrap_err();
    assert_eq!(
        error.to_string(),
        "multiplet \"psi\": the label \"psi\" is used twice; give each one a label of its own"
    );
    assert_eq!(spectrum.multiplets().len(), 1);
}

#[test]
fn more_than_ten_thousand_multiplets_are_refused() {
    let mut spectrum = Spectrum::new([Symmetry::gauge("u", Group::U1)]).unwrap();
    for i in 0..10_000 {
        let draft = Multiplet::draft(i.to_string(), Field::LeftHandedFermion);
        spectrum.add(draft.under("u", i)).unwrap();
    }
    let error = spectrum.add(fermion()).unwrap_err();
    assert_eq!(*error.problem(), Problem::TooManyMultiplets);
}

proptest! {
    /// Whatever the charges, charge = scaled charge / denominator, exactly.
    #[test]
    fn scaled_charges_are_the_charges(
        charges in prop::collection::vec((any::<i32>(), 1..2000i64), 1..12)
    ) {
        let mut spectrum = spectrum();
        for (i, (above, below)) in charges.iter().enumerate() {
            let charge = BigRational::new((*above).into(), (*below).into());
            let draft = Multiplet::draft(i.to_string(), Field::LeftHandedFermion);
            spectrum.add(draft.under("hypercharge", charge)).unwrap();
        }
        let denominator = spectrum.charge_denominator(2);
        for multiplet in spectrum.multiplets() {
            let scaled = multiplet.scaled_charge(2);
            prop_assert_eq!(scaled.is_some(), denominator.is_some());
            if let (Some(scaled), Some(denominator)) = (scaled, denominator) {
                let quotient = BigRational::new(scaled.into(), denominator.into());
                prop_assert_eq!(&quotient, multiplet.charge(2).unwrap());
            }
        }
    }

    /// Reading what is written gives the number back, and no text panics.
    #[test]
    fn decimals_both_ways(digits in any::<i64>(), exponent in -100..100i32, text in ".{0,12}") {
        let value = model::read_decimal(&format!("{digits}e{exponent}")).unwrap();
        let written = model::write_decimal(&value).unwrap();
        prop_assert_eq!(model::read_decimal(&written).unwrap(), value);
        let _ = model::read_decimal(&text);
        let _ = text.parse::<Group>();
        let _ = text.parse::<Field>();
    }
}
