//! A scan's check of a spectrum takes no memory. In a binary of its own: the counter counts all
//! that its thread does.

use anomaly::is_consistent;
use model::{Field, Group, Multiplet, Spectrum, Symmetry};

/// Three families under SU(3) x SU(2) x U(1) x U(1) x Z(3), field by field, and two scalars.
fn twenty_multiplets() -> Spectrum {
    let mut spectrum = Spectrum::new([
        Symmetry::gauge("colour", "SU(3)".parse().unwrap()),
        Symmetry::gauge("weak", "SU(2)".parse().unwrap()),
        Symmetry::gauge("hypercharge", Group::U1),
        Symmetry::gauge("B-L", Group::U1),
        Symmetry::gauge("triality", "Z(3)".parse().unwrap()),
    ])
    .unwrap();
    let (left, right) = (Field::LeftHandedFermion, Field::RightHandedFermion);
    let fields = [
        ("Q", left, "3", "2", "1/6", "1/3"),
        ("u", right, "3", "1", "2/3", "1/3"),
        ("d", right, "3", "1", "-1/3", "1/3"),
        ("L", left, "1", "2", "-1/2", "-1"),
        ("e", right, "1", "1", "-1", "-1"),
        ("N", right, "1", "1", "0", "-1"),
    ];
    for family in 1..=3 {
        for (name, field, colour, weak, hypercharge, charge) in fields {
            let draft = Multiplet::draft(format!("{name}{family}"), field);
            let draft = draft.under("colour", colour).under("weak", weak);
            let draft = draft.under("hypercharge", hypercharge).under("B-L", charge);
            spectrum.add(draft.under("triality", 1)).unwrap();
        }
    }
    for name in ["H", "S"] {
        let scalar = Multiplet::draft(name, Field::ComplexScalar);
        spectrum.add(scalar.under("hypercharge", "1/2")).unwrap();
    }
    spectrum
}

#[test]
fn the_bare_verdict_allocates_nothing() {
    let spectrum = twenty_multiplets();
    assert_eq!(spectrum.multiplets().len(), 20);
    let mut verdict = None;
    let taken = allocation_counter::measure(|| verdict = Some(is_consistent(&spectrum)));
    assert_eq!(verdict, Some(Ok(true)));
    assert_eq!(taken.count_total, 0);
    // The counter does count.
    let taken = allocation_counter::measure(|| {
        anomaly::Report::of(&spectrum).unwrap();
    });
    assert!(taken.count_total > 100, "{}", taken.count_total);
}
