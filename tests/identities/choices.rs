//! What proptest chooses from.

use proptest::prelude::*;
use roots::{Irrep, SimpleAlgebra};

/// Any algebra up to that rank.
pub(super) fn any_algebra(rank: usize) -> impl Strategy<Value = SimpleAlgebra> {
    proptest::sample::select(SimpleAlgebra::up_to_rank(rank).collect::<Vec<_>>())
}

/// Any irrep of `algebra` with labels from that strategy.
pub(super) fn irrep_of(
    algebra: SimpleAlgebra,
    labels: impl Strategy<Value = u32>,
) -> impl Strategy<Value = Irrep> {
    proptest::collection::vec(labels, algebra.rank())
        .prop_map(move |labels| algebra.irrep(&labels).unwrap())
}

/// Any irrep of any algebra up to rank 12; labels mostly small.
pub(super) fn any_irrep() -> impl Strategy<Value = Irrep> {
    let label = || prop_oneof![3 => Just(0u32), 4 => 0..4u32, 1 => 0..1000u32];
    any_algebra(12).prop_flat_map(move |algebra| irrep_of(algebra, label()))
}
