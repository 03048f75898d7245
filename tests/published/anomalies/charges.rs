//! [Geng-Marshak 1989], [Minahan-Ramond-Warner 1990]: the hypercharges of one family that cancel.

use std::collections::BTreeSet;

use model::Spectrum;

use super::{consistent, gauged, left};

fn family([q, u, d, l, e]: [i64; 5]) -> Spectrum {
    let mut spectrum = gauged(&[
        ("colour", "SU(3)"),
        ("weak", "SU(2)"),
        ("hypercharge", "U(1)"),
    ]);
    let fields = [
        ("quark doublet", "3", "2", q),
        ("up antiquark", "3bar", "1", u),
        ("down antiquark", "3bar", "1", d),
        ("lepton doublet", "1", "2", l),
        ("positron", "1", "1", e),
    ];
    for (label, colour, weak, charge) in fields {
        let draft = left(label).under("colour", colour).under("weak", weak);
        spectrum.add(draft.under("hypercharge", charge)).unwrap();
    }
    spectrum
}

/// Among all whole-number charges with the quark doublet's 1 or 0: the Standard Model's, with up
/// and down antiquark exchanged too, and the "bizarre" one of opposite antiquarks alone.
#[test]
fn two_solutions() {
    let mut found = BTreeSet::new();
    for q in [0, 1] {
        for u in -4..=4 {
            for d in -4..=4 {
                for l in -3..=3 {
                    for e in -6..=6 {
                        let charges = [q, u, d, l, e];
                        let spectrum = family(charges);
                        if anomaly::is_consistent(&spectrum) == Ok(true) {
                            assert!(consistent(&spectrum));
                            found.insert(charges);
                        }
                    }
                }
            }
        }
    }
    let mut expected = BTreeSet::from([[1, -4, 2, -3, 6], [1, 2, -4, -3, 6]]);
    expected.extend((-4..=4).map(|a| [0, a, -a, 0, 0]));
    assert_eq!(found, expected);
}
