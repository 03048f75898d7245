//! The inner product of weights given by their Dynkin labels.

use std::sync::OnceLock;

use num_bigint::BigInt;
use num_rational::BigRational;

use crate::{CartanType, DynkinDiagram, SimpleAlgebra};

/// Inner products of fundamental weights, longest root squared 2, as whole numbers over one
/// denominator ([Slansky 1981]: his metric tensor G).
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct WeightMetric {
    rank: usize,
    denominator: i64,
    numerators: Vec<i64>,
}

impl WeightMetric {
    /// The metric of `algebra`: `(A^-1)[i][j] (alpha_j, alpha_j) / 2`.
    #[must_use]
    pub fn of(algebra: SimpleAlgebra) -> Self {
        let inverse = algebra.cartan_matrix().inverse();
        let lengths = DynkinDiagram::of(algebra.cartan_type())
            .length_ratios()
            .to_vec();
        let longest = lengths.iter().copied().max().unwrap_or(1);
        let row = |row: &[u32]| -> Vec<i64> {
            let terms = row.iter().zip(&lengths);
            terms
                .map(|(&entry, &length)| i64::from(entry) * i64::from(length))
                .collect()
        };
        Self {
            rank: algebra.rank(),
            denominator: i64::from(inverse.denominator()) * i64::from(longest),
            numerators: inverse.rows().flat_map(row).collect(),
        }
    }

    /// The metric of an exceptional type, found once: there are five.
    pub(crate) fn exceptional(cartan_type: CartanType) -> &'static Self {
        static HELD: [OnceLock<WeightMetric>; 5] = [const { OnceLock::new() }; 5];
        HELD[cartan_type.exceptional_place()]
            .get_or_init(|| Self::of(SimpleAlgebra::new(cartan_type)))
    }

    /// Number of fundamental weights.
    #[must_use]
    pub const fn rank(&self) -> usize {
        self.rank
    }

    /// The common denominator: every inner product times it is whole.
    #[must_use]
    pub const fn denominator(&self) -> i64 {
        self.denominator
    }

    /// Rows of numerators; the matrix is symmetric.
    pub fn rows(&self) -> impl ExactSizeIterator<Item = &[i64]> {
        self.numerators.chunks(self.rank)
    }

    /// The inner product of two weights given by their labels, one per node.
    #[must_use]
    pub fn inner_product(&self, left: &[i64], right: &[i64]) -> BigRational {
        let sum: BigInt = self
            .rows()
            .zip(left)
            .filter(|(_, label)| **label != 0)
            .map(|(row, &label)| {
                let terms = row.iter().zip(right);
                let paired: BigInt = terms.map(|(&g, &r)| BigInt::from(g) * r).sum();
                paired * label
            })
            .sum();
        BigRational::new(sum, self.denominator.into())
    }
}
