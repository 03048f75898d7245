//! Indices, reality and classes of an irrep, as sums over its weights.

use std::collections::{HashMap, HashSet};

use super::SlowAlgebra;
use super::character::{Character, Weight, add, subtract, weight};

impl SlowAlgebra {
    /// The Dynkin index: the trace of the square of the coroot of the highest root, halved; the
    /// trace is 2 in the doublet of that root's SU(2).
    ///
    /// # Panics
    /// Where the trace is odd, which it cannot be.
    #[must_use]
    pub fn index(&self, character: &Character) -> i64 {
        let coroot = weight(&self.coroot(self.highest_root()));
        let trace: i64 = character
            .weights
            .iter()
            .map(|(w, times)| times * pair(w, &coroot).pow(2))
            .sum();
        assert_eq!(trace % 2, 0);
        trace / 2
    }

    /// The Dynkin index again: the sum of squared lengths of the weights over the rank, the
    /// longest root squared being 2. Numerator and denominator.
    ///
    /// # Panics
    /// Never.
    #[must_use]
    pub fn index_from_lengths(&self, character: &Character) -> (i128, i128) {
        let (adjugate, determinant) = adjugate(&self.cartan);
        let longest = i128::from(*self.halves.iter().max().expect("at least one node"));
        let rank = self.rank();
        let mut sum = 0i128;
        for (w, times) in &character.weights {
            for i in 0..rank {
                for j in 0..rank {
                    // (w, w) = sum of w_i (A^-1)_ij w_j half_j, shortest half length 1.
                    sum += i128::from(*times)
                        * i128::from(w[i])
                        * i128::from(w[j])
                        * adjugate[i][j]
                        * i128::from(self.halves[j]);
                }
            }
        }
        (
            sum,
            determinant * longest * i128::try_from(rank).expect("small"),
        )
    }

    /// The cubic index of an irrep of type A: the trace of the cube of diag(1, ..., 1, -(N - 1)),
    /// over that of the fundamental.
    ///
    /// # Panics
    /// For another type, for SU(2), and where it is not whole.
    #[must_use]
    pub fn cubic_index(&self, character: &Character) -> i64 {
        assert!(self.letter == 'A' && self.rank() >= 2);
        let n = i64::try_from(self.rank()).expect("small") + 1;
        let diagonal = weight(&(1..n).collect::<Vec<_>>());
        let trace: i64 = character
            .weights
            .iter()
            .map(|(w, times)| times * pair(w, &diagonal).pow(3))
            .sum();
        let fundamental = (n - 1) - (n - 1).pow(3);
        assert_eq!(trace % fundamental, 0, "the cubic index is whole");
        trace / fundamental
    }

    /// Whether the weights are symmetric under negation.
    #[must_use]
    pub fn is_self_conjugate(character: &Character) -> bool {
        let weights = &character.weights;
        weights
            .iter()
            .all(|(w, times)| weights.get(&subtract(&[0; 8], w)) == Some(times))
    }

    /// Highest weight of the conjugate irrep: minus the labels, reflected until dominant.
    #[must_use]
    pub fn conjugate(&self, labels: &[i64]) -> Vec<i64> {
        let mut w: Vec<i64> = labels.iter().map(|label| -label).collect();
        while let Some(i) = w.iter().position(|&label| label < 0) {
            let label = w[i];
            for (entry, &c) in w.iter_mut().zip(&self.cartan[i]) {
                *entry -= label * c;
            }
        }
        w
    }

    /// Number of steps from the highest to the lowest weight: the sum of the labels' pairing with
    /// all positive coroots.
    #[must_use]
    pub fn steps(&self, labels: &[i64]) -> i64 {
        let coroots = self.positive_roots.iter().map(|root| self.coroot(root));
        coroots
            .map(|coroot| {
                coroot
                    .iter()
                    .zip(labels)
                    .map(|(c, label)| c * label)
                    .sum::<i64>()
            })
            .sum()
    }

    /// Every element of the Weyl group, as its action on rho and its sign: `(w rho - rho) / 2`
    /// where that has whole labels. What the Frobenius-Schur indicator needs.
    #[must_use]
    pub fn halved_rho_differences(&self) -> Vec<(Weight, i64)> {
        let steps: Vec<Weight> = self.cartan.iter().map(|row| weight(row)).collect();
        let rho = weight(&vec![1; self.rank()]);
        let mut seen = HashSet::from([rho]);
        let mut open = vec![(rho, 1)];
        let mut out = Vec::new();
        while let Some((w, sign)) = open.pop() {
            let difference = subtract(&w, &rho);
            if difference.iter().all(|label| label % 2 == 0) {
                out.push((difference.map(|label| label / 2), sign));
            }
            for (i, step) in steps.iter().enumerate() {
                let reflected = std::array::from_fn(|j| w[j] - w[i] * step[j]);
                if seen.insert(reflected) {
                    open.push((reflected, -sign));
                }
            }
        }
        out
    }

    /// The Frobenius-Schur indicator: 1 for real, -1 for pseudoreal, 0 for complex. It is how
    /// often the singlet is in the symmetric square less how often in the antisymmetric one: the
    /// singlet's part of the character at doubled weights, by Weyl's formula the signed sum of
    /// the multiplicities of `(w rho - rho) / 2`.
    #[must_use]
    pub fn frobenius_schur(character: &Character, differences: &[(Weight, i64)]) -> i64 {
        let terms = differences.iter();
        terms
            .map(|(w, sign)| sign * character.weights.get(w).copied().unwrap_or(0))
            .sum()
    }
}

fn pair(w: &Weight, with: &Weight) -> i64 {
    let terms = w.iter().zip(with);
    terms.map(|(&a, &b)| i64::from(a) * i64::from(b)).sum()
}

/// The adjugate and the determinant, by cofactors; ranks are small.
fn adjugate(matrix: &[Vec<i64>]) -> (Vec<Vec<i128>>, i128) {
    let n = matrix.len();
    let minor = |row: usize, column: usize| -> Vec<Vec<i64>> {
        let rows = (0..n).filter(|&i| i != row);
        rows.map(|i| {
            (0..n)
                .filter(|&j| j != column)
                .map(|j| matrix[i][j])
                .collect()
        })
        .collect()
    };
    let sign = |i: usize, j: usize| if (i + j).is_multiple_of(2) { 1 } else { -1 };
    let adjugate = (0..n)
        .map(|i| {
            (0..n)
                .map(|j| sign(i, j) * determinant(&minor(j, i)))
                .collect()
        })
        .collect();
    (adjugate, determinant(matrix))
}

fn determinant(matrix: &[Vec<i64>]) -> i128 {
    let Some(first) = matrix.first() else {
        return 1;
    };
    let mut sum = 0;
    for (j, &entry) in first.iter().enumerate().filter(|(_, entry)| **entry != 0) {
        let below: Vec<Vec<i64>> = matrix[1..]
            .iter()
            .map(|row| {
                let kept = row.iter().enumerate().filter(|(k, _)| *k != j);
                kept.map(|(_, &entry)| entry).collect()
            })
            .collect();
        let sign = if j % 2 == 0 { 1 } else { -1 };
        sum += sign * i128::from(entry) * determinant(&below);
    }
    sum
}

/// Multiplicities of dominant weights alone, for irreps with too many weights to list.
impl SlowAlgebra {
    /// Dimension and Dynkin index from the dominant weights: each counts as often as its orbit is
    /// long, and the squares of its orbit's pairing with the highest coroot add up to the same as
    /// its own squared pairings with all long coroots, averaged.
    #[must_use]
    pub fn dimension_and_index_by_orbits(&self, labels: &[i64]) -> (i128, i128) {
        let multiplicities = self.dominant_multiplicities(labels);
        let longest = self.half_length(self.highest_root());
        let long: Vec<Weight> = self
            .positive_roots
            .iter()
            .filter(|root| self.half_length(root) == longest)
            .map(|root| weight(&self.coroot(root)))
            .collect();
        let (mut dimension, mut traces) = (0, 0);
        for (w, times) in &multiplicities {
            let count = i128::from(*times) * self.orbit_length(w);
            let squares: i64 = long.iter().map(|coroot| pair(w, coroot).pow(2)).sum();
            dimension += count;
            traces += count * i128::from(squares);
        }
        let long = i128::try_from(long.len()).expect("few roots");
        assert_eq!(traces % (2 * long), 0, "the index is whole");
        (dimension, traces / (2 * long))
    }

    /// Length of the Weyl orbit of a dominant weight: the order of the group over that of the
    /// stabiliser, each the product of `(height + 1) / height` over its positive roots.
    ///
    /// # Source
    /// [Macdonald 1972], The Poincare series of a Coxeter group, from memory.
    fn orbit_length(&self, dominant: &Weight) -> i128 {
        let (mut above, mut below) = (1i128, 1i128);
        for root in &self.positive_roots {
            if root
                .iter()
                .zip(dominant)
                .any(|(&c, &label)| c > 0 && label > 0)
            {
                let height = i128::from(root.iter().sum::<i64>());
                above *= height + 1;
                below *= height;
                let common = gcd(above, below);
                above /= common;
                below /= common;
            }
        }
        assert_eq!(below, 1, "orbits have whole lengths");
        above
    }

    fn dominant_multiplicities(&self, labels: &[i64]) -> HashMap<Weight, i64> {
        let roots: Vec<(Weight, Weight, Weight)> = self
            .positive_roots
            .iter()
            .map(|root| {
                let dual: Vec<i64> = root.iter().zip(&self.halves).map(|(c, h)| c * h).collect();
                (weight(&self.labels_of(root)), weight(&dual), weight(root))
            })
            .collect();
        let top = weight(labels);
        let mut taken: HashMap<Weight, Weight> = HashMap::from([(top, [0; 8])]);
        let mut open = vec![top];
        while let Some(w) = open.pop() {
            for (root, _, coefficients) in &roots {
                let below = subtract(&w, root);
                if below.iter().all(|&label| label >= 0) && !taken.contains_key(&below) {
                    taken.insert(below, add(&taken[&w], coefficients));
                    open.push(below);
                }
            }
        }
        let mut order: Vec<(Weight, Weight)> = taken.into_iter().collect();
        order.sort_by_key(|(_, taken)| taken.iter().sum::<i16>());
        let mut known = HashMap::from([(top, 1i64)]);
        for (w, taken) in &order[1..] {
            let mut sum = 0;
            for (root, dual, _) in &roots {
                let mut raised = add(w, root);
                while let Some(times) = known.get(&self.dominant(&raised)) {
                    sum += times * pair(&raised, dual);
                    raised = add(&raised, root);
                }
            }
            let difference: i64 = (0..self.rank())
                .map(|i| i64::from(taken[i]) * i64::from(top[i] + w[i] + 2) * self.halves[i])
                .sum();
            assert_eq!(2 * sum % difference, 0, "multiplicities are whole");
            known.insert(*w, 2 * sum / difference);
        }
        known
    }

    fn dominant(&self, w: &Weight) -> Weight {
        let mut w = *w;
        while let Some(i) = w.iter().position(|&label| label < 0) {
            let label = w[i];
            for (entry, &c) in w.iter_mut().zip(&self.cartan[i]) {
                *entry -= label * i16::try_from(c).expect("entries are small");
            }
        }
        w
    }
}

const fn gcd(a: i128, b: i128) -> i128 {
    if b == 0 { a } else { gcd(b, a % b) }
}
