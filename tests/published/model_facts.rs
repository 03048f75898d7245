//! Facts of the example models besides anomalies: what of the centre acts trivially, degrees of
//! freedom, which fermions may have masses.

use gaugewright::answer::{Answer, AuditAnswer};
use model::{FermionClass, Field, Model, Multiplet, Spectrum};

use super::anomalies::{example, examples, gauged, left};

fn center(spectrum: &Spectrum) -> String {
    spectrum.trivially_acting_center().unwrap().to_string()
}

/// Z6 for the Standard Model, [Tong 2017]; Z2 for Pati-Salam, Z3 for trinification, as subgroups of
/// SO(10) and E6, [Baez-Huerta 2010] and common practice; the others from charges by hand.
#[test]
fn trivially_acting_centers() {
    for name in examples("") {
        let expected = match &*name {
            "standard-model"
            | "standard-model-right-handed-neutrinos"
            | "mssm"
            | "b-minus-l"
            | "l-mu-minus-l-tau"
            | "lanternfish"
            | "left-right" => "Z6",
            "su5" | "so10" | "e6" => "trivial",
            "flipped-su5" => "Z5",
            "pati-salam" => "Z2",
            "trinification" | "minimal-331" => "Z3",
            other => panic!("no centre is written down for {other}"),
        };
        assert_eq!(center(example(&name).spectrum()), expected, "{name}");
    }
    // The charges 1/6 and 1/3 on quark doublets leave nothing.
    let mistyped = example("broken/quark-hypercharge-mistyped");
    assert_eq!(center(mistyped.spectrum()), "trivial");
}

/// The centre of one group, under what is in it: its whole centre until something is charged.
#[test]
fn centers_of_one_group() {
    let cases: [(&str, &[&str], &str); 20] = [
        ("SU(5)", &[], "Z5"),
        ("SU(5)", &["24"], "Z5"),
        ("SU(5)", &["5bar", "10"], "trivial"),
        ("SU(6)", &["15"], "Z2"),
        ("SU(6)", &["20"], "Z3"),
        ("SU(6)", &["15", "20"], "trivial"),
        ("SU(4)", &["6"], "Z2"),
        ("SO(10)", &["45"], "Z4"),
        ("SO(10)", &["45", "10"], "Z2"),
        ("SO(10)", &["45", "16"], "trivial"),
        ("SO(10)", &["126"], "Z2"),
        ("SO(8)", &["28"], "Z2 x Z2"),
        ("SO(8)", &["8v"], "Z2"),
        ("SO(8)", &["8s"], "Z2"),
        ("SO(8)", &["8s", "8c"], "trivial"),
        ("SO(12)", &["12", "77"], "Z2"),
        ("Sp(6)", &["14"], "Z2"),
        ("E6", &["78"], "Z3"),
        ("E7", &["56"], "trivial"),
        ("E8", &["248"], "trivial"),
    ];
    for (name, irreps, expected) in cases {
        let mut spectrum = gauged(&[("g", name)]);
        for irrep in irreps {
            spectrum.add(left(*irrep).under("g", *irrep)).unwrap();
        }
        assert_eq!(center(&spectrum), expected, "{name} {irreps:?}");
    }
}

/// Parts of the Standard Model: without quarks, SU(3) acts on nothing, and Z2 is common to SU(2)
/// and hypercharge; a doublet without hypercharge, or a triplet without, undoes its part.
#[test]
fn parts_of_the_standard_model() {
    let build = |fields: &[[&str; 3]]| {
        let groups = [
            ("colour", "SU(3)"),
            ("weak", "SU(2)"),
            ("hypercharge", "U(1)"),
        ];
        let mut spectrum = gauged(&groups);
        for (place, [colour, weak, hypercharge]) in fields.iter().enumerate() {
            let draft = left(format!("f{place}")).under("colour", *colour);
            let draft = draft
                .under("weak", *weak)
                .under("hypercharge", *hypercharge);
            spectrum.add(draft).unwrap();
        }
        center(&spectrum)
    };
    let doublet = ["1", "2", "-1/2"];
    let electron = ["1", "1", "-1"];
    let up = ["3", "1", "2/3"];
    assert_eq!(build(&[]), "Z6");
    assert_eq!(build(&[doublet, electron]), "Z6");
    assert_eq!(build(&[up, doublet, electron]), "Z6");
    assert_eq!(build(&[up, doublet, electron, ["1", "2", "0"]]), "Z3");
    assert_eq!(build(&[up, doublet, electron, ["3", "1", "0"]]), "Z2");
    assert_eq!(build(&[up, doublet, electron, ["3", "2", "0"]]), "trivial");
    assert_eq!(build(&[up, doublet, electron, ["8", "3", "0"]]), "Z6");
    // Half the charges, half the U(1): nothing changes.
    assert_eq!(
        build(&[["3", "1", "1/3"], ["1", "2", "-1/4"], ["1", "1", "-1/2"]]),
        "Z6"
    );
}

/// Two U(1)s in other combinations are the same group.
#[test]
fn the_center_does_not_see_how_charges_are_combined() {
    let build = |mix: fn(i64, i64) -> (i64, i64)| {
        let mut spectrum = gauged(&[("c", "SU(3)"), ("w", "SU(2)"), ("a", "U(1)"), ("b", "U(1)")]);
        // Hypercharge times 6 and B-L times 3.
        let fields = [
            ("3", "2", 1, 1),
            ("3", "1", 4, 1),
            ("3", "1", -2, 1),
            ("1", "2", -3, -3),
            ("1", "1", 0, -3),
        ];
        for (place, (colour, weak, y, x)) in fields.into_iter().enumerate() {
            let (a, b) = mix(y, x);
            let draft = left(format!("f{place}"))
                .under("c", colour)
                .under("w", weak);
            spectrum.add(draft.under("a", a).under("b", b)).unwrap();
        }
        center(&spectrum)
    };
    assert_eq!(build(|y, x| (y, x)), "Z6");
    assert_eq!(build(|y, x| (2 * y + 3 * x, y - x)), "Z6");
    assert_eq!(build(|y, x| (7 * y, x + y)), "Z6");
}

/// 45 Weyl fermions of two states, a complex doublet, twelve gauge bosons of two: the Standard
/// Model's 90 and 28 are common practice, no source; the others the same count.
#[test]
fn degrees_of_freedom() {
    let cases = [
        ("standard-model", 90, 28),
        ("standard-model-right-handed-neutrinos", 96, 28),
        // Gauginos 24, (45 + 4) superfields of two and two.
        ("mssm", 122, 122),
        ("su5", 90, 48 + 24 + 10),
        ("so10", 96, 90 + 20 + 252 + 45),
        ("e6", 162, 156 + 54 + 702),
        ("pati-salam", 96, 42 + 8 + 60),
        ("left-right", 96, 30 + 8 + 12),
        ("trinification", 162, 48 + 36),
        // Right-handed neutrinos; a gauge boson and a complex scalar more.
        ("b-minus-l", 96, 32),
        // Two lure leptons; a gauge boson, a doublet and a singlet more.
        ("lanternfish", 100, 36),
    ];
    for (name, fermionic, bosonic) in cases {
        let states = example(name).degrees_of_freedom();
        assert_eq!(
            (states.fermionic, states.bosonic),
            (fermionic, bosonic),
            "{name}"
        );
    }
}

fn classes(model: &Model) -> Vec<FermionClass> {
    model.spectrum().fermion_classes().unwrap()
}

/// Chiral families and what pairs up: in the supersymmetric model the up-type Higgs doublet finds
/// a partner for each of its copies, of the four lepton and Higgs doublets three are left.
#[test]
fn fermions_that_pair_up() {
    for one in classes(&example("standard-model")) {
        assert_eq!((one.massive(), one.chiral()), (0, 3));
    }
    let mssm = classes(&example("mssm"));
    let doublets = mssm.iter().find(|one| one.massive() > 0).unwrap();
    assert_eq!(
        (doublets.members(), doublets.conjugate_members()),
        (&[3, 6][..], &[5][..])
    );
    assert_eq!((doublets.copies(), doublets.conjugate_copies()), (4, 1));
    assert_eq!((doublets.massive(), doublets.chiral()), (1, 3));
    let lanternfish = classes(&example("lanternfish"));
    let massive: Vec<_> = lanternfish.iter().filter(|one| one.massive() > 0).collect();
    let places: Vec<_> = massive
        .iter()
        .map(|one| (one.members(), one.conjugate_members()))
        .collect();
    // Light neutrinos, which are real; the lure leptons.
    assert_eq!(places, [(&[5][..], &[][..]), (&[12][..], &[13][..])]);
}

/// The same, as the audit tells it.
#[test]
fn standing_of_each_multiplet() {
    let json = AuditAnswer::new(example("mssm"), roots::Numbering::default())
        .unwrap()
        .json();
    let standing = |label: &str| {
        let (_, after) = json
            .split_once(&format!("\"label\":\"{label}\",\"field\""))
            .unwrap();
        let (_, after) = after.split_once("\"chirality\":\"").unwrap();
        after.split_once('"').unwrap().0.to_owned()
    };
    assert_eq!(standing("quark doublet"), "chiral");
    assert_eq!(standing("up-type Higgs doublet"), "vector-like");
    assert_eq!(standing("down-type Higgs doublet"), "partly chiral");
    assert_eq!(standing("lepton doublet"), "partly chiral");
}

/// Pseudoreal irreps pair with themselves in twos, two of them make a real one, and opposite
/// charges, discrete ones too, make a pair.
#[test]
fn classes_by_reality() {
    let build = |symmetries: &[(&str, &str)], fields: &[(Field, &[&str], u32)]| {
        let mut spectrum = gauged(symmetries);
        for (place, (field, parts, copies)) in fields.iter().enumerate() {
            let mut draft = Multiplet::draft(format!("f{place}"), *field).copies(*copies);
            for ((label, _), part) in symmetries.iter().zip(*parts) {
                draft = draft.under(*label, *part);
            }
            spectrum.add(draft).unwrap();
        }
        let classes = spectrum.fermion_classes().unwrap();
        let told = classes
            .iter()
            .map(|one| (one.reality(), one.massive(), one.chiral()));
        told.collect::<Vec<_>>()
    };
    use roots::Reality::{Complex, Pseudoreal, Real};
    let (left, right) = (Field::LeftHandedFermion, Field::RightHandedFermion);
    let su2 = [("l", "SU(2)"), ("r", "SU(2)")];
    let doublets = [(left, &["2", "1"][..], 2), (right, &["2", "1"], 3)];
    assert_eq!(build(&su2, &doublets), [(Pseudoreal, 2, 1)]);
    assert_eq!(build(&su2, &[(left, &["2", "2"], 3)]), [(Real, 3, 0)]);
    assert_eq!(build(&su2, &[(left, &["3", "2"], 1)]), [(Pseudoreal, 0, 1)]);
    let z = [("z", "Z(4)"), ("y", "U(1)")];
    assert_eq!(build(&z, &[(left, &["2", "0"], 3)]), [(Real, 3, 0)]);
    let opposite = [(left, &["1", "1"][..], 1), (left, &["3", "-1"], 2)];
    assert_eq!(build(&z, &opposite), [(Complex, 1, 1)]);
    let alike = [(left, &["1", "1"][..], 1), (right, &["1", "1"], 1)];
    assert_eq!(build(&z, &alike), [(Complex, 1, 0)]);
    let apart = [(left, &["1", "1"][..], 1), (left, &["1", "-1"], 1)];
    assert_eq!(build(&z, &apart), [(Complex, 0, 1), (Complex, 0, 1)]);
    let su3 = [("c", "SU(3)")];
    let quarks = [
        (left, &["3"][..], 2),
        (left, &["3bar"], 1),
        (right, &["3"], 1),
        (right, &["8"], 1),
    ];
    assert_eq!(build(&su3, &quarks), [(Complex, 2, 0), (Real, 1, 0)]);
}
