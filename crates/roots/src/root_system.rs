//! Positive roots, built from the Cartan matrix by root strings.

use std::collections::HashMap;
use std::sync::OnceLock;

use crate::{CartanMatrix, CartanType, DynkinDiagram};

/// One positive root.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub struct Root<'a> {
    coefficients: &'a [u8],
    coroot: &'a [u8],
    length_ratio: u8,
}

impl<'a> Root<'a> {
    /// Coefficients in simple roots, node 1 first.
    #[must_use]
    pub const fn coefficients(self) -> &'a [u8] {
        self.coefficients
    }

    /// Coefficients of the coroot `2 alpha / (alpha, alpha)` in simple coroots: the pairing with
    /// a weight is the sum of these times its Dynkin labels.
    #[must_use]
    pub const fn coroot(self) -> &'a [u8] {
        self.coroot
    }

    /// Squared length in units of the shortest root's: 1, 2 or 3.
    #[must_use]
    pub const fn length_ratio(self) -> u8 {
        self.length_ratio
    }

    /// Sum of the coefficients in simple roots.
    #[must_use]
    pub fn height(self) -> usize {
        self.coefficients.iter().copied().map(usize::from).sum()
    }
}

/// The positive roots of a simple algebra, by height, the simple ones first and the highest last.
///
/// ```
/// let e8: roots::SimpleAlgebra = "E8".parse()?;
/// let roots = e8.root_system();
/// assert_eq!(roots.positive_roots().len(), 120);
/// assert_eq!(roots.highest_root().coefficients(), [2, 4, 6, 5, 4, 3, 2, 3]);
/// # Ok::<(), roots::Error>(())
/// ```
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct RootSystem {
    rank: usize,
    coefficients: Vec<u8>,
    coroots: Vec<u8>,
    length_ratios: Vec<u8>,
}

impl RootSystem {
    /// Every positive root of `cartan_type`.
    ///
    /// # Cost
    /// Each root is reached from those one lower, at most `rank` of them; all are kept.
    /// # Source
    /// Root strings: [Humphreys 1972], 9.4 and 11.1.
    #[must_use]
    pub fn of(cartan_type: CartanType) -> Self {
        let matrix = CartanMatrix::of(cartan_type);
        let lengths = DynkinDiagram::of(cartan_type).length_ratios().to_vec();
        let mut system = Self {
            rank: cartan_type.rank(),
            coefficients: Vec::new(),
            coroots: Vec::new(),
            length_ratios: Vec::new(),
        };
        let mut level = simple_roots(&matrix, &lengths);
        while !level.is_empty() {
            let next = one_higher(&level, &matrix, &lengths);
            for growing in level {
                system.push(&growing, &lengths);
            }
            level = next;
        }
        system
    }

    /// The root system of an exceptional type, built once in the life of the program: there are
    /// five of them, so what is held is bounded.
    pub(crate) fn exceptional(cartan_type: CartanType) -> &'static Self {
        static HELD: [OnceLock<RootSystem>; 5] = [const { OnceLock::new() }; 5];
        HELD[cartan_type.exceptional_place()].get_or_init(|| Self::of(cartan_type))
    }

    fn push(&mut self, root: &Growing, lengths: &[u8]) {
        let coroot = root.coefficients.iter().zip(lengths);
        self.coroots
            .extend(coroot.map(|(&c, &length)| c * length / root.length_ratio));
        self.coefficients.extend(&root.coefficients);
        self.length_ratios.push(root.length_ratio);
    }

    /// Number of simple roots.
    #[must_use]
    pub const fn rank(&self) -> usize {
        self.rank
    }

    /// The positive roots by height.
    pub fn positive_roots(&self) -> impl DoubleEndedIterator<Item = Root<'_>> + ExactSizeIterator {
        (0..self.length_ratios.len()).map(|i| self.root(i))
    }

    fn root(&self, i: usize) -> Root<'_> {
        let place = i * self.rank..(i + 1) * self.rank;
        Root {
            coefficients: &self.coefficients[place.clone()],
            coroot: &self.coroots[place],
            length_ratio: self.length_ratios[i],
        }
    }

    /// The highest root, whose Dynkin labels are those of the adjoint irrep.
    #[must_use]
    pub fn highest_root(&self) -> Root<'_> {
        self.root(self.length_ratios.len() - 1)
    }

    /// The Coxeter number: one more than the height of the highest root.
    #[must_use]
    pub fn coxeter_number(&self) -> usize {
        self.highest_root().height() + 1
    }

    /// The dual Coxeter number: one more than the height of the highest root's coroot.
    #[must_use]
    pub fn dual_coxeter_number(&self) -> usize {
        let comarks = self.highest_root().coroot().iter();
        comarks.copied().map(usize::from).sum::<usize>() + 1
    }

    /// The exponents, ascending: as many are at least h as there are roots of height h.
    ///
    /// # Source
    /// Kostant's theorem on heights, [Humphreys 1990], 3.20.
    #[must_use]
    pub fn exponents(&self) -> Vec<usize> {
        let mut at_height = vec![0; self.coxeter_number() + 1];
        for root in self.positive_roots() {
            at_height[root.height()] += 1usize;
        }
        (1..self.coxeter_number())
            .flat_map(|h| std::iter::repeat_n(h, at_height[h] - at_height[h + 1]))
            .collect()
    }
}

/// A root on its way up: `depths[i]` is how often simple root i can be taken off it.
#[derive(Clone)]
struct Growing {
    coefficients: Vec<u8>,
    labels: Vec<i8>,
    depths: Vec<u8>,
    length_ratio: u8,
}

fn simple_roots(matrix: &CartanMatrix, lengths: &[u8]) -> Vec<Growing> {
    let unit = |i| {
        let mut coefficients = vec![0; lengths.len()];
        coefficients[i] = 1;
        coefficients
    };
    let rows = matrix.rows().enumerate();
    rows.map(|(i, row)| Growing {
        coefficients: unit(i),
        labels: row.to_vec(),
        // Taking the simple root itself off leaves zero, and once more its negative.
        depths: unit(i).iter().map(|&c| 2 * c).collect(),
        length_ratio: lengths[i],
    })
    .collect()
}

/// The roots one higher: adding simple root i stays inside the i-string while
/// `depth - label > 0`.
fn one_higher(level: &[Growing], matrix: &CartanMatrix, lengths: &[u8]) -> Vec<Growing> {
    let mut next: Vec<Growing> = Vec::new();
    let mut place: HashMap<Vec<u8>, usize> = HashMap::new();
    for below in level {
        for (i, row) in matrix.rows().enumerate() {
            if below.depths[i].cast_signed() <= below.labels[i] {
                continue;
            }
            let mut coefficients = below.coefficients.clone();
            coefficients[i] += 1;
            let found = place
                .entry(coefficients)
                .or_insert_with_key(|coefficients| {
                    next.push(raise(below, i, coefficients, row, lengths));
                    next.len() - 1
                });
            next[*found].depths[i] = below.depths[i] + 1;
        }
    }
    next
}

fn raise(below: &Growing, i: usize, coefficients: &[u8], row: &[i8], lengths: &[u8]) -> Growing {
    let labels = below.labels.iter().zip(row).map(|(a, b)| a + b).collect();
    // |b + a|^2 = |b|^2 + |a|^2 + 2 (b, a), and 2 (b, a) = label * |a|^2.
    let length =
        below.length_ratio.cast_signed() + lengths[i].cast_signed() * (1 + below.labels[i]);
    Growing {
        coefficients: coefficients.to_vec(),
        labels,
        depths: vec![0; lengths.len()],
        length_ratio: length.cast_unsigned(),
    }
}
