//! [Witten 1982]: an odd sum of Dynkin indices of SU(2) or Sp(2N) is inconsistent.

use outside_checks::slow::SlowAlgebra;

use super::{consistent, gauged, left, value};

/// Isospins 1/2 to 9/2: the index is `2 j (j + 1) (2 j + 1) / 3`, odd for 1/2, 5/2, 9/2 alone.
#[test]
fn half_integer_isospins() {
    for (twice, index, odd) in [
        (1i64, 1, true),
        (2, 4, false),
        (3, 10, false),
        (4, 20, false),
        (5, 35, true),
        (6, 56, false),
        (7, 84, false),
        (8, 120, false),
        (9, 165, true),
    ] {
        // The sum of (2m)^2 over the components is twice the index.
        let squares: i64 = (0..=twice).map(|k| (twice - 2 * k).pow(2)).sum();
        assert_eq!(squares, 2 * index);
        for copies in 1..=4u32 {
            let mut spectrum = gauged(&[("weak", "SU(2)")]);
            let draft = left("psi")
                .copies(copies)
                .under("weak", format!("({twice})"));
            spectrum.add(draft).unwrap();
            let sum = index * i64::from(copies);
            assert_eq!(value(&spectrum, "weak parity"), sum.to_string());
            let fails = odd && copies % 2 == 1;
            assert_eq!(
                consistent(&spectrum),
                !fails,
                "2j = {twice}, {copies} copies"
            );
        }
    }
}

/// Two odd ones are even, and what multiplies a doublet under another group counts.
#[test]
fn parities_add_up() {
    let mut spectrum = gauged(&[("weak", "SU(2)"), ("colour", "SU(3)")]);
    spectrum.add(left("doublet").under("weak", "2")).unwrap();
    assert!(!consistent(&spectrum));
    spectrum.add(left("sextet").under("weak", "(5)")).unwrap();
    assert_eq!(value(&spectrum, "weak parity"), "36");
    assert!(consistent(&spectrum));
    let octet = left("octets").under("weak", "2").under("colour", "8");
    spectrum.add(octet).unwrap();
    assert_eq!(value(&spectrum, "weak parity"), "44");
    assert!(consistent(&spectrum));
    // Three more doublets, and a colour condition too.
    spectrum
        .add(left("quarks").under("weak", "2").under("colour", "3"))
        .unwrap();
    assert_eq!(value(&spectrum, "weak parity"), "47");
    assert_eq!(value(&spectrum, "colour^3"), "2");
}

/// Irreps of Sp(2N) and SO(5) = Sp(4): indices of Slansky's tables, from memory; the sum over
/// weights is the second way.
#[test]
fn symplectic_irreps() {
    let cases: [(&str, &str, &[u32], i64); 20] = [
        ("Sp(4)", "C2", &[1, 0], 1),
        ("Sp(4)", "C2", &[0, 1], 2),
        ("Sp(4)", "C2", &[2, 0], 6),
        ("Sp(4)", "C2", &[1, 1], 12),
        ("Sp(4)", "C2", &[0, 2], 14),
        ("Sp(4)", "C2", &[3, 0], 21),
        ("SO(5)", "B2", &[0, 1], 1),
        ("SO(5)", "B2", &[1, 0], 2),
        ("SO(5)", "B2", &[0, 3], 21),
        ("SO(5)", "B2", &[1, 1], 12),
        ("Sp(6)", "C3", &[1, 0, 0], 1),
        ("Sp(6)", "C3", &[0, 1, 0], 4),
        ("Sp(6)", "C3", &[0, 0, 1], 5),
        ("Sp(6)", "C3", &[2, 0, 0], 8),
        ("Sp(6)", "C3", &[3, 0, 0], 36),
        ("Sp(6)", "C3", &[1, 1, 0], 32),
        ("Sp(8)", "C4", &[1, 0, 0, 0], 1),
        ("Sp(8)", "C4", &[0, 1, 0, 0], 6),
        ("Sp(8)", "C4", &[0, 0, 1, 0], 14),
        ("Sp(8)", "C4", &[0, 0, 0, 1], 14),
    ];
    for (group, cartan_type, labels, index) in cases {
        let slow = SlowAlgebra::named(cartan_type);
        let signed: Vec<i64> = labels.iter().map(|&label| label.into()).collect();
        assert_eq!(
            slow.index(&slow.character(&signed)),
            index,
            "{group} {labels:?}"
        );
        let irrep = group
            .parse::<roots::SimpleAlgebra>()
            .unwrap()
            .irrep(labels)
            .unwrap();
        let mut spectrum = gauged(&[("g", group)]);
        spectrum.add(left("psi").under("g", irrep.clone())).unwrap();
        assert_eq!(
            value(&spectrum, "g parity"),
            index.to_string(),
            "{group} {labels:?}"
        );
        assert_eq!(consistent(&spectrum), index % 2 == 0);
        spectrum.add(left("other").under("g", irrep)).unwrap();
        assert!(consistent(&spectrum));
    }
}
