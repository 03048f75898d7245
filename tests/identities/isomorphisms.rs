//! Algebras that are one under two names: B2 = C2, A3 = D3, and A1 under all of its.

use proptest::prelude::*;
use roots::Irrep;

use crate::support::algebra;

fn same_facts(left: &Irrep, right: &Irrep) -> Result<(), TestCaseError> {
    prop_assert_eq!(left.dimension(), right.dimension());
    prop_assert_eq!(left.dynkin_index(), right.dynkin_index());
    prop_assert_eq!(left.casimir(), right.casimir());
    prop_assert_eq!(left.cubic_index(), right.cubic_index());
    prop_assert_eq!(left.reality(), right.reality());
    Ok(())
}

proptest! {
    /// The long node of SO(5) is node 1, that of Sp(4) node 2.
    #[test]
    fn so5_is_sp4(a in 0..60u32, b in 0..60u32) {
        let left = algebra("SO(5)").irrep(&[a, b]).unwrap();
        let right = algebra("Sp(4)").irrep(&[b, a]).unwrap();
        same_facts(&left, &right)?;
        prop_assert_eq!(left.congruency(), right.congruency());
    }

    /// Node 1 of SO(6) is the middle of SU(4), node 2, its plain spinor's, the first.
    #[test]
    fn so6_is_su4(a in 0..40u32, b in 0..40u32, c in 0..40u32) {
        let left = algebra("SO(6)").irrep(&[a, b, c]).unwrap();
        let right = algebra("SU(4)").irrep(&[b, a, c]).unwrap();
        same_facts(&left, &right)?;
        prop_assert_eq!(left.congruency(), right.congruency());
        let other = algebra("SU(4)").irrep(&[c, a, b]).unwrap();
        prop_assert_eq!(left.cubic_index(), -other.cubic_index());
    }

    /// A symmetry of the diagram of SO(8) changes no fact.
    #[test]
    fn triality(labels in prop::array::uniform4(0..12u32), turn in 0..6usize) {
        let orders = [[0, 2, 3], [0, 3, 2], [2, 0, 3], [2, 3, 0], [3, 0, 2], [3, 2, 0]];
        let mut turned = labels;
        for (place, from) in [0, 2, 3].into_iter().zip(orders[turn]) {
            turned[place] = labels[from];
        }
        let so8 = algebra("SO(8)");
        same_facts(&so8.irrep(&labels).unwrap(), &so8.irrep(&turned).unwrap())?;
    }
}

#[test]
fn names_of_one_algebra() {
    for name in [
        "SU(2)",
        "so3",
        "Sp(2)",
        "usp2",
        "A1",
        "B1",
        "c1",
        " su ( 2 ) ",
    ] {
        assert_eq!(algebra(name), algebra("A1"), "{name}");
    }
    for (left, right) in [
        ("SO(5)", "B2"),
        ("Sp(4)", "C2"),
        ("SO(6)", "D3"),
        ("USp(8)", "C4"),
    ] {
        assert_eq!(algebra(left), algebra(right));
    }
    assert_ne!(algebra("SO(5)"), algebra("Sp(4)"));
    assert_ne!(algebra("SO(6)"), algebra("SU(4)"));
}
