//! Irreps by their dimension: all of one dimension, and all up to a bound.
//!
//! The dimension grows with every label, so both searches stop where it passes the bound.

use num_bigint::BigUint;

use crate::dimension::dimension_at_most;
use crate::{Error, Irrep, SimpleAlgebra, index};

/// Every irrep of that dimension, in no particular order.
///
/// The nodes whose fundamental irrep is within reach are walked the largest first: the two
/// smallest, which take the most values, are walked together.
///
/// # Cost
/// The number of irreps up to that dimension in all but two labels, times the largest values of
/// those two: for SU(3), the worst, a few times the square root of the dimension.
pub(crate) fn irreps_of_dimension(algebra: SimpleAlgebra, dimension: &BigUint) -> Vec<Irrep> {
    let mut labels = vec![0; algebra.rank()];
    let mut nodes = Vec::new();
    for node in 0..algebra.rank() {
        labels[node] = 1;
        let fundamental = dimension_at_most(algebra.cartan_type(), &labels, dimension);
        nodes.extend(fundamental.map(|fundamental| (fundamental, node)));
        labels[node] = 0;
    }
    nodes.sort_by(|left, right| right.cmp(left));
    let mut walk = Walk {
        algebra,
        dimension,
        nodes: nodes.into_iter().map(|(_, node)| node).collect(),
        labels,
        found: Vec::new(),
    };
    walk.from(0);
    walk.found
}

struct Walk<'a> {
    algebra: SimpleAlgebra,
    dimension: &'a BigUint,
    nodes: Vec<usize>,
    labels: Vec<u32>,
    found: Vec<Irrep>,
}

impl Walk<'_> {
    fn from(&mut self, depth: usize) {
        match self.nodes[depth..] {
            [] => self.keep_if_equal(),
            [last] => {
                self.raise_to_bound(last);
                self.keep_if_equal();
                self.labels[last] = 0;
            }
            [up, down] => self.along_two(up, down),
            [node, ..] => {
                while !self.is_past() {
                    self.from(depth + 1);
                    if !self.raise(node) {
                        break;
                    }
                }
                self.labels[node] = 0;
            }
        }
    }

    /// As one label rises, the largest value of the other can only fall.
    fn along_two(&mut self, up: usize, down: usize) {
        self.raise_to_bound(down);
        loop {
            while self.is_past() && self.labels[down] > 0 {
                self.labels[down] -= 1;
            }
            if self.is_past() {
                break;
            }
            self.keep_if_equal();
            if !self.raise(up) {
                break;
            }
        }
        self.labels[up] = 0;
        self.labels[down] = 0;
    }

    /// The largest label at `node` that keeps within the bound, by doubling and halving.
    fn raise_to_bound(&mut self, node: usize) {
        let mut within = 0u32;
        let mut step = 1u32;
        while step > 0 {
            let tried = within.checked_add(step);
            self.labels[node] = tried.unwrap_or(u32::MAX);
            if tried.is_some() && !self.is_past() {
                within = self.labels[node];
                step = step.saturating_mul(2);
            } else {
                step /= 2;
            }
        }
        self.labels[node] = within;
    }

    fn raise(&mut self, node: usize) -> bool {
        let raised = self.labels[node].checked_add(1);
        self.labels[node] = raised.unwrap_or(u32::MAX);
        raised.is_some()
    }

    /// The dimension that the labels have now, unless it is past the one looked for.
    fn within(&self) -> Option<BigUint> {
        dimension_at_most(self.algebra.cartan_type(), &self.labels, self.dimension)
    }

    fn is_past(&self) -> bool {
        self.within().is_none()
    }

    fn keep_if_equal(&mut self) {
        if self.within().as_ref() == Some(self.dimension) {
            let labels = &self.labels;
            self.found
                .push(Irrep::from_fn(self.algebra, |node| labels[node]));
        }
    }
}

/// A bound on what is listed.
#[derive(Clone, Debug, PartialEq, Eq)]
pub enum CatalogBound {
    /// Dimension at most this.
    Dimension(BigUint),
    /// Dynkin index at most this.
    DynkinIndex(BigUint),
}

impl CatalogBound {
    fn admits(&self, irrep: &Irrep) -> bool {
        let cartan_type = irrep.algebra().cartan_type();
        let within =
            |most: &BigUint| dimension_at_most(cartan_type, irrep.labels(), most).is_some();
        match self {
            Self::Dimension(most) => within(most),
            Self::DynkinIndex(most) => {
                index::largest_dimension(irrep.algebra(), irrep.labels(), most)
                    .is_none_or(|dimension| within(&dimension))
            }
        }
    }
}

impl SimpleAlgebra {
    /// Every irrep within `bound`, the singlet included, by dimension, then Dynkin index, then
    /// name.
    ///
    /// # Errors
    /// [`Error::TooMany`] where there are more than `limit`.
    /// # Cost
    /// For each irrep listed, at most `rank` that are not.
    ///
    /// ```
    /// use roots::{CatalogBound, SimpleAlgebra};
    /// let e8: SimpleAlgebra = "E8".parse()?;
    /// let small = e8.irreps_within(&CatalogBound::Dimension(5000u32.into()), 100)?;
    /// let names: Vec<String> = small.iter().map(|irrep| irrep.name()).collect();
    /// assert_eq!(names, ["1", "248", "3875"]);
    /// # Ok::<(), roots::Error>(())
    /// ```
    pub fn irreps_within(self, bound: &CatalogBound, limit: usize) -> Result<Vec<Irrep>, Error> {
        let mut found = Vec::new();
        // Each irrep is reached once: labels are raised at the last raised node or after it.
        let mut open = vec![(vec![0u32; self.rank()], 0)];
        while let Some((labels, from)) = open.pop() {
            let irrep = Irrep::from_fn(self, |node| labels[node]);
            if !bound.admits(&irrep) {
                continue;
            }
            if found.len() == limit {
                return Err(Error::TooMany {
                    what: format!("the list of irreps of {self} within that bound"),
                    limit,
                    instead: "lower the bound or raise the limit".to_owned(),
                });
            }
            found.push(irrep);
            for node in from..self.rank() {
                if let Some(raised) = labels[node].checked_add(1) {
                    let mut labels = labels.clone();
                    labels[node] = raised;
                    open.push((labels, node));
                }
            }
        }
        crate::NameBook::sort(&mut found);
        Ok(found)
    }
}
