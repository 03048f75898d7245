//! Tests that set one algorithm of this crate against another.

use proptest::prelude::*;

use crate::count::in_width;
use crate::decomposition::highest_weight;
use crate::dominant_weights::DominantWeights;
use crate::frame::{Frame, label_bound, largest_label};
use crate::lanes::{Bytes8, Bytes16, Lanes, Shorts8, Wide, on_lanes};
use crate::littlewood_richardson::Budget;
use crate::multiplicities::{RootSum, recursion};
use crate::{Decomposition, Irrep, Limits, SimpleAlgebra, klimyk, littlewood_richardson};

fn algebras(rank: usize) -> impl Strategy<Value = SimpleAlgebra> {
    prop::sample::select(SimpleAlgebra::up_to_rank(rank).collect::<Vec<_>>())
}

/// Labels raised at random nodes for as long as the dimension stays within the bound.
fn irrep_of(algebra: SimpleAlgebra, dimension: u64) -> impl Strategy<Value = Irrep> {
    let steps = prop::collection::vec(0..algebra.rank(), 0..9);
    steps.prop_map(move |steps| {
        let mut labels = vec![0; algebra.rank()];
        for node in steps {
            labels[node] += 1;
            if algebra.irrep(&labels).unwrap().dimension() > dimension.into() {
                labels[node] -= 1;
            }
        }
        algebra.irrep(&labels).unwrap()
    })
}

fn dominant<L: Lanes>(irrep: &Irrep, sum: RootSum) -> Vec<(Vec<i64>, i64)> {
    let held = L::frame(irrep.algebra().cartan_type());
    let weights = DominantWeights::below(&held, highest_weight(irrep), 100_000).unwrap();
    let found = recursion::<L, i64>(&held, weights, sum).unwrap();
    let labels = |weight: &L| (0..held.rank()).map(|i| weight.label(i)).collect();
    let mut listed: Vec<_> = found.iter().map(|(w, &n)| (labels(w), n)).collect();
    listed.sort();
    listed
}

fn by_klimyk<L: Lanes>(frame: &Frame<L>, large: &Irrep, small: &Irrep) -> Decomposition {
    let limits = Limits::default();
    in_width!(Counts => {
        let factor = crate::tensor_product::factor::<L, Counts>(frame, small, &limits).unwrap();
        let sum = [(highest_weight::<L>(large), Counts::from(1u8))];
        let terms = klimyk::times(frame, &sum, &factor.unwrap(), 1, &limits).unwrap();
        terms.and_then(|terms| {
            Decomposition::from_counts(large.algebra(), klimyk::unshifted(frame, &terms))
        })
    })
}

fn pair(algebras: impl Strategy<Value = SimpleAlgebra>) -> impl Strategy<Value = (Irrep, Irrep)> {
    algebras.prop_flat_map(|algebra| (irrep_of(algebra, 4000), irrep_of(algebra, 4000)))
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(150))]

    /// [Moody-Patera 1982] against the plain recursion of [Freudenthal 1954], and one width of
    /// lanes against the others.
    #[test]
    fn folded_sums_are_plain_sums(irrep in algebras(8).prop_flat_map(|a| irrep_of(a, 1_000_000))) {
        let folded = dominant::<Bytes8>(&irrep, RootSum::Folded);
        prop_assert_eq!(&folded, &dominant::<Bytes8>(&irrep, RootSum::Plain));
        prop_assert_eq!(&folded, &dominant::<Shorts8>(&irrep, RootSum::Folded));
        prop_assert_eq!(&folded, &dominant::<Bytes16>(&irrep, RootSum::Folded));
        prop_assert_eq!(&folded, &dominant::<Wide>(&irrep, RootSum::Folded));
    }

    /// Reflection in all widths, whichever factor is walked through.
    #[test]
    fn products_in_all_lanes((left, right) in pair(algebras(8))) {
        let of = left.algebra().cartan_type();
        let narrow = by_klimyk(&Bytes8::frame(of), &left, &right);
        prop_assert_eq!(&narrow, &by_klimyk(&Bytes8::frame(of), &right, &left));
        prop_assert_eq!(&narrow, &by_klimyk(&Shorts8::frame(of), &left, &right));
        prop_assert_eq!(&narrow, &by_klimyk(&Bytes16::frame(of), &left, &right));
        prop_assert_eq!(&narrow, &by_klimyk(&Wide::frame(of), &left, &right));
    }

    /// Young tableaux against reflection for SU(N), whichever diagram is put on the other.
    #[test]
    fn tableaux_are_reflections(
        (left, right) in pair((2usize..9).prop_map(|n| SimpleAlgebra::su(n).unwrap()))
    ) {
        let of = left.algebra().cartan_type();
        let bound = label_bound(of, [left.labels(), right.labels()].into_iter());
        on_lanes!(of, bound, |held| {
            let reflected = by_klimyk(&held, &left, &right);
            for (base, added) in [(&left, &right), (&right, &left)] {
                prop_assert_eq!(&reflected, &by_tableaux(&held, base, added));
            }
        });
    }
}

fn by_tableaux<L: Lanes>(_frame: &Frame<L>, base: &Irrep, added: &Irrep) -> Decomposition {
    let rows = littlewood_richardson::rows;
    let budget = Budget {
        steps: u64::MAX,
        terms: usize::MAX,
    };
    let product =
        littlewood_richardson::product::<L>(&rows(base.labels()), &rows(added.labels()), budget);
    let terms = product.unwrap().into_entries();
    let terms = terms.map(|(weight, n)| (weight, i128::from(n))).collect();
    Decomposition::from_counts(base.algebra(), terms).unwrap()
}

/// Beyond rank 8 and with labels that fit no lane: SU(N) by tableaux, SO(N) by dimension.
#[test]
fn large_ranks_and_labels() {
    for (algebra, left, right, terms) in [
        ("SO(20)", vec![(0, 1)], vec![(0, 1)], 3),
        ("SO(32)", vec![(1, 1)], vec![(1, 1)], 6),
        ("SO(40)", vec![(1, 1)], vec![(0, 1)], 3),
        ("Sp(60)", vec![(0, 1)], vec![(1, 1)], 3),
        ("SU(20)", vec![(0, 1), (18, 1)], vec![(0, 1), (18, 1)], 6),
        ("SU(3)", vec![(0, 70), (1, 70)], vec![(0, 1), (1, 1)], 7),
        ("G2", vec![(0, 40_000), (1, 3)], vec![(1, 1)], 7),
    ] {
        let algebra: SimpleAlgebra = algebra.parse().unwrap();
        let irrep = |labels: &[(usize, u32)]| {
            let label = |node| {
                labels
                    .iter()
                    .find(|(n, _)| *n == node)
                    .map_or(0, |(_, l)| *l)
            };
            Irrep::from_fn(algebra, label)
        };
        let (left, right) = (irrep(&left), irrep(&right));
        let product = left.product(&right).unwrap();
        assert_eq!(product.len(), terms, "{left:?} x {right:?}");
        assert_eq!(product.dimension(), left.dimension() * right.dimension());
    }
}

/// The bound on labels is the largest pairing with any coroot.
#[test]
fn bound_is_the_largest_pairing() {
    for algebra in SimpleAlgebra::up_to_rank(9) {
        for node in 0..algebra.rank() {
            let roots = algebra.root_system();
            let largest = roots.positive_roots().map(|root| root.coroot()[node]).max();
            let unit = (0..algebra.rank()).map(|i| u64::from(i == node));
            let bound = largest_label(algebra.cartan_type(), unit);
            assert_eq!(Some(bound), largest.map(u64::from), "{algebra} node {node}");
        }
    }
}

/// The order of the Weyl group from the frame is that from the exponents, and orbit sizes from the
/// subgroup are those from the coroots.
#[test]
fn orders_two_ways() {
    for algebra in SimpleAlgebra::up_to_rank(10) {
        let held =
            Shorts8::holds(algebra.rank(), 100).then(|| Shorts8::frame(algebra.cartan_type()));
        let wide = Wide::frame(algebra.cartan_type());
        let all = u32::MAX >> (32 - algebra.rank());
        assert_eq!(algebra.weyl_group_order(), wide.subgroup_order(all).into());
        for nodes in 0..1u32 << algebra.rank().min(8) {
            let irrep = Irrep::from_fn(algebra, |node| nodes >> node & 1);
            let size = crate::dimension::orbit_size(algebra.cartan_type(), irrep.labels());
            assert_eq!(size, wide.orbit_size(&highest_weight(&irrep)).into());
            if let Some(held) = &held {
                assert_eq!(size, held.orbit_size(&highest_weight(&irrep)).into());
            }
        }
    }
}

/// The sum of positive coroots, and which irreps have one orbit of weights: that of the root
/// system, for every type up to rank 9.
#[test]
fn heights_and_minuscule_weights() {
    for algebra in SimpleAlgebra::up_to_rank(9) {
        let wide = Wide::frame(algebra.cartan_type());
        for node in 0..algebra.rank() {
            let fundamental = Irrep::from_fn(algebra, |i| u32::from(i == node));
            let weight = highest_weight::<Wide>(&fundamental);
            let roots = algebra.root_system();
            let coroots = roots
                .positive_roots()
                .map(|root| i64::from(root.coroot()[node]));
            assert_eq!(
                wide.level(&weight),
                coroots.sum::<i64>(),
                "{algebra} node {node}"
            );
            let one_orbit =
                wide.orbit_size(&weight) == u64::try_from(fundamental.dimension()).unwrap();
            assert_eq!(
                wide.is_minuscule(&weight),
                one_orbit,
                "{algebra} node {node}"
            );
        }
    }
}
