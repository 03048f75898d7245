//! The bare verdict is the report's, also where whole numbers of 64 and 128 bits do not reach.

use anomaly::{Report, is_consistent};
use model::{Field, Group, Multiplet, MultipletDraft, Spectrum, Symmetry};
use num_bigint::BigInt;
use num_rational::BigRational;
use num_traits::Zero;
use proptest::prelude::*;

/// Charges of one to sixty digits, over denominators of one to sixty digits.
fn charge() -> impl Strategy<Value = BigRational> {
    let whole = |digits: &'static str| prop::string::string_regex(digits).unwrap();
    let small = (-9i64..=9, 1i64..=9).prop_map(|(a, b)| BigRational::new(a.into(), b.into()));
    let sixty_three_bits = prop_oneof![Just(i64::MAX), Just(i64::MIN + 1), any::<i64>()];
    let bits = sixty_three_bits.prop_map(|a| BigRational::from(BigInt::from(a)));
    let large = (
        any::<bool>(),
        whole("[1-9][0-9]{20,28}"),
        whole("[1-9][0-9]{0,28}"),
    );
    let large = large.prop_map(|(negative, above, below)| {
        let above: BigInt = above.parse().unwrap();
        let above = if negative { -above } else { above };
        BigRational::new(above, below.parse().unwrap())
    });
    prop_oneof![3 => small, 1 => bits, 2 => large]
}

#[derive(Clone, Debug)]
struct Fermion {
    right: bool,
    copies: u32,
    weak: u32,
    colour: [u32; 2],
    charges: [BigRational; 2],
    discrete: u32,
}

fn fermion() -> impl Strategy<Value = Fermion> {
    let colour = prop_oneof![
        Just([0, 0]),
        Just([1, 0]),
        Just([0, 1]),
        Just([1, 1]),
        Just([3, 0])
    ];
    let copies = prop_oneof![1u32..4, Just(1_000_000)];
    let parts = (
        any::<bool>(),
        copies,
        0u32..5,
        colour,
        [charge(), charge()],
        0u32..6,
    );
    parts.prop_map(|(right, copies, weak, colour, charges, discrete)| Fermion {
        right,
        copies,
        weak,
        colour,
        charges,
        discrete,
    })
}

impl Fermion {
    fn draft(&self, label: String) -> MultipletDraft {
        let field = if self.right {
            Field::RightHandedFermion
        } else {
            Field::LeftHandedFermion
        };
        let [a, b] = self.charges.clone();
        Multiplet::draft(label, field)
            .copies(self.copies)
            .under("weak", format!("({})", self.weak))
            .under("colour", format!("({},{})", self.colour[0], self.colour[1]))
            .under("a", a)
            .under("b", b)
            .under("z", self.discrete)
    }

    /// The same representation, left-handed and right-handed exchanged: what cancels it.
    fn mirror(&self) -> Self {
        Self {
            right: !self.right,
            ..self.clone()
        }
    }
}

fn spectrum(fermions: &[Fermion]) -> Spectrum {
    let mut spectrum = Spectrum::new([
        Symmetry::gauge("weak", "SU(2)".parse().unwrap()),
        Symmetry::gauge("colour", "SU(3)".parse().unwrap()),
        Symmetry::gauge("a", Group::U1),
        Symmetry::gauge("b", Group::U1),
        Symmetry::gauge("z", "Z(6)".parse().unwrap()),
    ])
    .unwrap();
    for (place, fermion) in fermions.iter().enumerate() {
        spectrum.add(fermion.draft(format!("f{place}"))).unwrap();
    }
    spectrum
}

fn same_verdict(fermions: &[Fermion]) -> bool {
    let spectrum = spectrum(fermions);
    let verdict = is_consistent(&spectrum).unwrap();
    assert_eq!(verdict, Report::of(&spectrum).unwrap().is_consistent());
    verdict
}

proptest! {
    #[test]
    fn any_spectrum(fermions in prop::collection::vec(fermion(), 0..6)) {
        same_verdict(&fermions);
    }

    /// What cancels must be found to cancel, and a charge changed a little no longer does.
    #[test]
    fn mirrors_cancel(
        fermions in prop::collection::vec(fermion(), 1..5),
        broken in any::<prop::sample::Index>(),
        by in charge().prop_filter("a change", |by| !by.is_zero()),
    ) {
        let mut all: Vec<Fermion> = fermions.iter().map(Fermion::mirror).collect();
        all.extend(fermions);
        prop_assert!(same_verdict(&all));
        // The sum of charges then is the change, times copies and dimensions.
        let changed = broken.get(&all).charges[1].clone() + by;
        let place = broken.index(all.len());
        all[place].charges[1] = changed;
        prop_assert!(!same_verdict(&all));
    }
}

/// Products of three charges within 63 bits, which 128 bits do not hold: 2^62 cubed is 2^186, and
/// wraps to 0 where nobody watches.
#[test]
fn beyond_128_bits() {
    let charged = |charge: i64, right| Fermion {
        right,
        copies: 1,
        weak: 0,
        colour: [0, 0],
        charges: [BigRational::zero(), BigRational::from(BigInt::from(charge))],
        discrete: 0,
    };
    // 2^62 - 2^61 - 2^61: the linear sum is zero, the cubic one 3 * 2^184.
    let one = [
        charged(1 << 62, false),
        charged(1 << 61, true),
        charged(1 << 61, true),
    ];
    assert!(!same_verdict(&one));
    let pair = [charged(1 << 62, false), charged(1 << 62, true)];
    assert!(same_verdict(&pair));
    // 1 + 5 + 9 = 7 + 8, and so do their cubes: no pair cancels, all five do.
    let scale = 1 << 58;
    let five = [1, 5, -7, -8, 9].map(|q| charged(q * scale, false));
    assert!(same_verdict(&five));
    let changed = [1, 5, -6, -9, 9].map(|q| charged(q * scale, false));
    assert!(!same_verdict(&changed));
}
