//! Roots of a simple algebra, closed under reflections.

use std::collections::BTreeSet;

use super::cartan::slansky_cartan_matrix;

/// A simple algebra of rank up to 8, as a Cartan matrix and the positive roots that it gives.
pub struct SlowAlgebra {
    /// The letter of its type.
    pub letter: char,
    /// The Cartan matrix, Slansky's numbering.
    pub cartan: Vec<Vec<i64>>,
    /// Half the squared length of each simple root, the shortest being 1.
    pub halves: Vec<i64>,
    /// Positive roots in simple roots.
    pub positive_roots: Vec<Vec<i64>>,
}

impl SlowAlgebra {
    /// The algebra of that type.
    #[must_use]
    pub fn new(letter: char, rank: usize) -> Self {
        let cartan = slansky_cartan_matrix(letter, rank);
        let halves = half_lengths(&cartan);
        let positive_roots = reflect_until_closed(&cartan);
        Self {
            letter,
            cartan,
            halves,
            positive_roots,
        }
    }

    /// The algebra by its type's name, such as "D5".
    ///
    /// # Panics
    /// Where `name` is not a letter and a number.
    #[must_use]
    pub fn named(name: &str) -> Self {
        let mut characters = name.chars();
        let letter = characters.next().expect("a letter");
        Self::new(letter, characters.as_str().parse().expect("a rank"))
    }

    /// Number of simple roots.
    #[must_use]
    pub fn rank(&self) -> usize {
        self.cartan.len()
    }

    /// Number of generators.
    #[must_use]
    pub fn dimension(&self) -> usize {
        self.rank() + 2 * self.positive_roots.len()
    }

    /// Dynkin labels of a root given in simple roots.
    #[must_use]
    pub fn labels_of(&self, root: &[i64]) -> Vec<i64> {
        let label = |j: usize| (0..self.rank()).map(|i| root[i] * self.cartan[i][j]).sum();
        (0..self.rank()).map(label).collect()
    }

    /// Half the squared length of a root given in simple roots.
    #[must_use]
    pub fn half_length(&self, root: &[i64]) -> i64 {
        let labels = self.labels_of(root);
        let terms = root.iter().zip(&labels).zip(&self.halves);
        terms
            .map(|((c, label), half)| c * label * half)
            .sum::<i64>()
            / 2
    }

    /// The coroot of a root given in simple roots, in simple coroots.
    #[must_use]
    pub fn coroot(&self, root: &[i64]) -> Vec<i64> {
        let own = self.half_length(root);
        let terms = root.iter().zip(&self.halves);
        terms.map(|(c, half)| c * half / own).collect()
    }

    /// The root of greatest height.
    ///
    /// # Panics
    /// Never: there is at least one root.
    #[must_use]
    pub fn highest_root(&self) -> &[i64] {
        let by_height = self.positive_roots.iter();
        by_height
            .max_by_key(|root| root.iter().sum::<i64>())
            .expect("a simple algebra has roots")
    }
}

/// Spreads lengths along the bonds: `A[i][j] / A[j][i]` is the ratio of squared lengths i to j.
fn half_lengths(cartan: &[Vec<i64>]) -> Vec<i64> {
    let n = cartan.len();
    // Twelve has every ratio that can occur.
    let mut lengths = vec![0; n];
    lengths[0] = 12;
    for _ in 0..n {
        for i in 0..n {
            for j in 0..n {
                if cartan[i][j] != 0 && lengths[i] != 0 {
                    lengths[j] = lengths[i] * cartan[j][i] / cartan[i][j];
                }
            }
        }
    }
    let shortest = *lengths.iter().min().expect("at least one node");
    lengths.iter().map(|length| length / shortest).collect()
}

fn reflect_until_closed(cartan: &[Vec<i64>]) -> Vec<Vec<i64>> {
    let n = cartan.len();
    let unit = |i: usize| (0..n).map(|j| i64::from(i == j)).collect::<Vec<_>>();
    let mut all: BTreeSet<Vec<i64>> = (0..n).map(unit).collect();
    let mut open: Vec<Vec<i64>> = all.iter().cloned().collect();
    while let Some(root) = open.pop() {
        for j in 0..n {
            let label: i64 = (0..n).map(|i| root[i] * cartan[i][j]).sum();
            let mut reflected = root.clone();
            reflected[j] -= label;
            if reflected.iter().all(|&c| c >= 0) && all.insert(reflected.clone()) {
                open.push(reflected);
            }
        }
    }
    all.into_iter().collect()
}
