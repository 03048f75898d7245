//! [Ibanez-Ross 1991], and their parities of 1992: Z(N) symmetries of the supersymmetric Standard
//! Model. Charges from memory; the sums are done by hand beside each.

use anomaly::Report;
use model::{Field, Multiplet, Spectrum, Symmetry};

use super::consistent;

/// Charges of Q, u, d, L, e (left-handed, three families each) and of the two Higgs doublets.
fn parity(order: u32, [q, u, d, l, e, up, down]: [i64; 7]) -> Spectrum {
    let mut spectrum = Spectrum::new([
        Symmetry::gauge("colour", "SU(3)".parse().unwrap()),
        Symmetry::gauge("weak", "SU(2)".parse().unwrap()),
        Symmetry::gauge("hypercharge", "U(1)".parse().unwrap()),
        Symmetry::gauge("parity", format!("Z({order})").parse().unwrap()),
    ])
    .unwrap();
    let fields = [
        ("Q", 3, "3", "2", "1/6", q),
        ("u", 3, "3bar", "1", "-2/3", u),
        ("d", 3, "3bar", "1", "1/3", d),
        ("L", 3, "1", "2", "-1/2", l),
        ("e", 3, "1", "1", "1", e),
        ("Hu", 1, "1", "2", "1/2", up),
        ("Hd", 1, "1", "2", "-1/2", down),
    ];
    for (label, copies, colour, weak, hypercharge, charge) in fields {
        let draft = Multiplet::draft(label, Field::ChiralSuperfield).copies(copies);
        let draft = draft.under("colour", colour).under("weak", weak);
        let draft = draft
            .under("hypercharge", hypercharge)
            .under("parity", charge);
        spectrum.add(draft).unwrap();
    }
    spectrum
}

const R: [i64; 7] = [0, -1, 1, 0, 1, 1, -1];
const L: [i64; 7] = [0, 0, 0, -1, 1, 0, 0];
const A: [i64; 7] = [0, 0, -1, -1, 0, 0, 1];

fn combined(r: i64, l: i64, a: i64) -> [i64; 7] {
    std::array::from_fn(|i| r * R[i] + l * L[i] + a * A[i])
}

/// The linear sums of `R^r L^l A^a` over three families and the Higgs doublets, without
/// right-handed neutrinos: with colour -3a; with weak -3l - 2a; with gravity 3r - 3l - 13a.
#[test]
fn generalised_parities() {
    for order in 2..=12u32 {
        let n = i64::from(order);
        for r in 0..n {
            for l in 0..n {
                for a in 0..n {
                    let gravity = if n % 2 == 0 { n / 2 } else { n };
                    let holds = (3 * a) % n == 0
                        && (3 * l + 2 * a) % n == 0
                        && (3 * r - 3 * l - 13 * a) % gravity == 0;
                    let spectrum = parity(order, combined(r, l, a));
                    assert_eq!(consistent(&spectrum), holds, "Z({n}): {r}, {l}, {a}");
                }
            }
        }
    }
}

/// Of the parities Z(2): matter parity is free of anomalies; lepton and baryon parity are not, since
/// three lepton doublets are an odd number.
#[test]
fn matter_parity_alone() {
    for ((r, l), holds) in [((1, 0), true), ((0, 1), false), ((1, 1), false)] {
        let spectrum = parity(2, combined(r, l, 0));
        assert_eq!(consistent(&spectrum), holds, "R^{r} L^{l}");
        let report = Report::of(&spectrum).unwrap();
        let violated: Vec<&str> = report.violated().map(anomaly::Condition::name).collect();
        assert_eq!(violated, if holds { vec![] } else { vec!["weak^2 parity"] });
    }
}

/// Baryon triality R L of Z(3) is free of anomalies, for there are three lepton doublets; its like
/// of Z(5) is not.
#[test]
fn baryon_triality() {
    assert!(consistent(&parity(3, combined(1, 1, 0))));
    assert!(!consistent(&parity(5, combined(1, 1, 0))));
}
