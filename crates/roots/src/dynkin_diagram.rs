//! Dynkin diagrams: the nodes, the bonds between them and the length of each simple root.
//!
//! This is the one place where the node numbering of [Slansky 1981] is written down.
//! The Cartan matrix follows from it, and everything else from the Cartan matrix.

use crate::{CartanType, Family};

/// The Dynkin diagram of a simple algebra; nodes count from 0 inside, from 1 in print.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct DynkinDiagram {
    bonds: Vec<(usize, usize)>,
    /// Squared length of each simple root in units of the shortest one's.
    lengths: Vec<u8>,
}

impl DynkinDiagram {
    /// The diagram of `cartan_type` in the numbering of [Slansky 1981].
    #[must_use]
    pub fn of(cartan_type: CartanType) -> Self {
        let n = cartan_type.rank();
        let chain = |length: usize| (1..length).map(|i| (i - 1, i));
        let bonds = match cartan_type.family() {
            Family::A | Family::B | Family::C | Family::F | Family::G => chain(n).collect(),
            Family::D => chain(n - 1).chain([(n - 3, n - 1)]).collect(),
            Family::E => chain(n - 1).chain([(2, n - 1)]).collect(),
        };
        let mut lengths = vec![1; n];
        match cartan_type.family() {
            Family::A | Family::D | Family::E => {}
            Family::B => lengths[..n - 1].fill(2),
            Family::C => lengths[n - 1] = 2,
            Family::F => lengths[..2].fill(2),
            Family::G => lengths[0] = 3,
        }
        Self { bonds, lengths }
    }

    /// Pairs of joined nodes, each pair once.
    #[must_use]
    pub fn bonds(&self) -> &[(usize, usize)] {
        &self.bonds
    }

    /// Squared length of each simple root divided by that of the shortest root: 1, 2 or 3.
    #[must_use]
    pub fn length_ratios(&self) -> &[u8] {
        &self.lengths
    }
}
