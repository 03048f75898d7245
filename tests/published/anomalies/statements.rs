//! Early statements on what is safe, and contents of larger groups written in smaller ones.

use model::{Field, Multiplet, Spectrum};
use num_bigint::BigInt;
use num_rational::BigRational;
use roots::SimpleAlgebra;

use super::{consistent, gauged, left, value};

/// What a multiplet is under each symmetry, and how many copies of it there are.
type Row<'a> = (&'a [&'a str], u32);

fn with(symmetries: &[(&str, &str)], content: &[Row<'_>]) -> Spectrum {
    let mut spectrum = gauged(symmetries);
    for (place, (parts, copies)) in content.iter().enumerate() {
        let mut draft = left(format!("f{place}")).copies(*copies);
        for ((label, _), part) in symmetries.iter().zip(*parts) {
            draft = draft.under(*label, *part);
        }
        spectrum.add(draft).unwrap();
    }
    spectrum
}

/// [Georgi-Glashow 1972]: any left-handed content whatever is safe under groups without complex
/// irreps and under SO(N), N not 6; SU(2) and Sp(2N) up to their parity, found later.
#[test]
fn safe_groups() {
    let safe = [
        "SU(2)", "SO(5)", "SO(7)", "SO(8)", "SO(9)", "SO(10)", "SO(14)", "Sp(6)", "G2", "F4", "E6",
        "E7", "E8",
    ];
    for name in safe {
        let algebra: SimpleAlgebra = name.parse().unwrap();
        for node in 0..algebra.rank() {
            let mut labels = vec![0; algebra.rank()];
            labels[node] = 1;
            let irrep = algebra.irrep(&labels).unwrap();
            let mut spectrum = gauged(&[("g", name)]);
            spectrum
                .add(left("psi").copies(2).under("g", irrep))
                .unwrap();
            assert!(consistent(&spectrum), "{name}, node {node}");
        }
    }
}

/// [Georgi-Glashow 1972]: SU(3) and SU(N) above are safe only with equal and opposite content.
#[test]
fn unsafe_groups() {
    for (name, irrep, conjugate) in [
        ("SU(3)", "3", "3bar"),
        ("SU(3)", "6", "6bar"),
        ("SU(4)", "4", "4bar"),
        ("SU(6)", "15", "15bar"),
        ("SO(6)", "4", "4bar"),
    ] {
        assert!(
            !consistent(&with(&[("g", name)], &[(&[irrep], 1)])),
            "{name}"
        );
        assert!(!consistent(&with(
            &[("g", name)],
            &[(&[irrep], 2), (&[conjugate], 1)]
        )));
        assert!(consistent(&with(
            &[("g", name)],
            &[(&[irrep], 2), (&[conjugate], 2)]
        )));
    }
    for (name, real) in [
        ("SU(3)", "8"),
        ("SU(4)", "6"),
        ("SU(6)", "20"),
        ("SO(6)", "6"),
    ] {
        assert!(consistent(&with(&[("g", name)], &[(&[real], 1)])), "{name}");
    }
    // One antisymmetric tensor of SU(N) takes N - 4 antifundamentals.
    for n in 5..=9 {
        let group = format!("SU({n})");
        let su: SimpleAlgebra = group.parse().unwrap();
        let irrep = |node: usize| {
            let labels: Vec<u32> = (0..n - 1).map(|i| u32::from(i == node)).collect();
            su.irrep(&labels).unwrap()
        };
        for copies in 1..=n {
            let mut spectrum = gauged(&[("g", &group)]);
            spectrum.add(left("tensor").under("g", irrep(1))).unwrap();
            let copies = u32::try_from(copies).unwrap();
            let vectors = left("antivectors").copies(copies).under("g", irrep(n - 2));
            spectrum.add(vectors).unwrap();
            assert_eq!(consistent(&spectrum), copies as usize == n - 4, "{group}");
        }
    }
}

/// [Bouchiat-Iliopoulos-Meyer 1972]: in SU(2) x U(1) leptons alone are anomalous, and quarks of
/// charges 2/3 and -1/3 mend it when there are three of each.
#[test]
fn three_colours_for_the_leptons() {
    for colours in 0..=7u32 {
        let mut content: Vec<Row<'_>> = vec![(&["2", "-1/2"], 1), (&["1", "1"], 1)];
        if colours > 0 {
            content.push((&["2", "1/6"], colours));
            content.push((&["1", "-2/3"], colours));
            content.push((&["1", "1/3"], colours));
        }
        let spectrum = with(&[("weak", "SU(2)"), ("hypercharge", "U(1)")], &content);
        let mixed = BigRational::new((i64::from(colours) - 3).into(), 6.into());
        assert_eq!(value(&spectrum, "weak^2 hypercharge"), mixed.to_string());
        assert_eq!(consistent(&spectrum), colours == 3, "{colours}");
    }
}

/// [Gross-Jackiw 1972]: the leptons of SU(2) x U(1) are mended by heavy ones of the opposite
/// handedness, and a theory that treats both handednesses alike has no anomaly.
#[test]
fn opposite_handedness() {
    let symmetries = [("weak", "SU(2)"), ("hypercharge", "U(1)")];
    let mut spectrum = gauged(&symmetries);
    let add = |spectrum: &mut Spectrum, name: &str, field, weak: &str, hypercharge: &str| {
        let draft = Multiplet::draft(name, field).under("weak", weak);
        spectrum
            .add(draft.under("hypercharge", hypercharge))
            .unwrap();
    };
    add(
        &mut spectrum,
        "lepton doublet",
        Field::LeftHandedFermion,
        "2",
        "-1/2",
    );
    add(
        &mut spectrum,
        "electron",
        Field::RightHandedFermion,
        "1",
        "-1",
    );
    assert!(!consistent(&spectrum));
    assert_eq!(value(&spectrum, "hypercharge^3"), "3/4");
    add(
        &mut spectrum,
        "heavy doublet",
        Field::RightHandedFermion,
        "2",
        "-1/2",
    );
    assert!(!consistent(&spectrum));
    add(
        &mut spectrum,
        "heavy electron",
        Field::LeftHandedFermion,
        "1",
        "-1",
    );
    assert!(consistent(&spectrum));
}

/// The branchings of the 16 of SO(10) and the 27 of E6, [Slansky 1981], tables of branching rules;
/// charges from memory, and each line traceless.
#[test]
fn contents_of_unified_families() {
    let standard = [
        ("colour", "SU(3)"),
        ("weak", "SU(2)"),
        ("Y", "U(1)"),
        ("B-L", "U(1)"),
    ];
    let sixteen: [Row<'_>; 6] = [
        (&["3", "2", "1/6", "1/3"], 1),
        (&["3bar", "1", "-2/3", "-1/3"], 1),
        (&["3bar", "1", "1/3", "-1/3"], 1),
        (&["1", "2", "-1/2", "-1"], 1),
        (&["1", "1", "1", "1"], 1),
        (&["1", "1", "0", "1"], 1),
    ];
    assert!(consistent(&with(&standard, &sixteen)));
    for missing in 0..6 {
        let mut rest = sixteen.to_vec();
        rest.remove(missing);
        assert!(!consistent(&with(&standard, &rest)), "without {missing}");
    }
    let five: [Row<'_>; 3] = [(&["10", "-1"], 1), (&["5bar", "3"], 1), (&["1", "-5"], 1)];
    assert!(consistent(&with(&[("g", "SU(5)"), ("X", "U(1)")], &five)));
    let ten: [Row<'_>; 3] = [(&["16", "1"], 1), (&["10", "-2"], 1), (&["1", "4"], 1)];
    assert!(consistent(&with(&[("g", "SO(10)"), ("psi", "U(1)")], &ten)));
    let both: [Row<'_>; 6] = [
        (&["10", "-1", "1"], 1),
        (&["5bar", "3", "1"], 1),
        (&["1", "-5", "1"], 1),
        (&["5", "2", "-2"], 1),
        (&["5bar", "-2", "-2"], 1),
        (&["1", "0", "4"], 1),
    ];
    let symmetries = [("g", "SU(5)"), ("chi", "U(1)"), ("psi", "U(1)")];
    assert!(consistent(&with(&symmetries, &both)));
    let thirds: [Row<'_>; 3] = [
        (&["3", "3bar", "1"], 1),
        (&["1", "3", "3bar"], 1),
        (&["3bar", "1", "3"], 1),
    ];
    assert!(consistent(&with(
        &[("c", "SU(3)"), ("l", "SU(3)"), ("r", "SU(3)")],
        &thirds
    )));
}

/// An anomaly of SU(5) is the same through the colour SU(3) inside it: 5, 10, 15 and their parts,
/// [Slansky 1981]; each sum of hypercharges is zero.
#[test]
fn the_anomaly_of_su5_through_colour() {
    let standard = [("colour", "SU(3)"), ("weak", "SU(2)"), ("Y", "U(1)")];
    let cases: [(&str, &[Row<'_>]); 4] = [
        ("5", &[(&["3", "1", "-1/3"], 1), (&["1", "2", "1/2"], 1)]),
        (
            "10",
            &[
                (&["3", "2", "1/6"], 1),
                (&["3bar", "1", "-2/3"], 1),
                (&["1", "1", "1"], 1),
            ],
        ),
        (
            "15",
            &[
                (&["6", "1", "-2/3"], 1),
                (&["3", "2", "1/6"], 1),
                (&["1", "3", "1"], 1),
            ],
        ),
        (
            "24",
            &[
                (&["8", "1", "0"], 1),
                (&["1", "3", "0"], 1),
                (&["1", "1", "0"], 1),
                (&["3", "2", "-5/6"], 1),
                (&["3bar", "2", "5/6"], 1),
            ],
        ),
    ];
    for (irrep, content) in cases {
        let unified = with(&[("g", "SU(5)")], &[(&[irrep], 1)]);
        let parts = with(&standard, content);
        assert_eq!(value(&unified, "g^3"), value(&parts, "colour^3"), "{irrep}");
        assert_eq!(value(&parts, "gravity^2 Y"), "0");
        // diag(-1/3, -1/3, -1/3, 1/2, 1/2) has the cube trace 3 (-1/27) + 2/8 = 5/36.
        let index = BigRational::new(5.into(), 36.into());
        let cubic: BigInt = value(&unified, "g^3").parse().unwrap();
        assert_eq!(value(&parts, "Y^3"), (index * cubic).to_string(), "{irrep}");
    }
}
