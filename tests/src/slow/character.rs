//! All weights of an irrep with their multiplicities, by Freudenthal's recursion.

use std::collections::HashMap;

use super::SlowAlgebra;

/// Dynkin labels of a weight, filled up with zeros behind the rank.
pub type Weight = [i16; 8];

/// A sum of weights, each so many times.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Character {
    /// Multiplicity of each weight.
    pub weights: HashMap<Weight, i64>,
}

/// Fills a weight's labels up with zeros.
///
/// # Panics
/// Where a label does not fit or there are more than eight.
#[must_use]
pub(super) fn weight(labels: &[i64]) -> Weight {
    let mut out = [0; 8];
    for (place, &label) in out.iter_mut().zip(labels) {
        *place = i16::try_from(label).expect("labels are small here");
    }
    assert!(labels.len() <= 8, "rank 8 at most");
    out
}

/// The sum of two weights.
#[must_use]
pub(super) fn add(left: &Weight, right: &Weight) -> Weight {
    std::array::from_fn(|i| left[i] + right[i])
}

/// The difference of two weights.
#[must_use]
pub(super) fn subtract(left: &Weight, right: &Weight) -> Weight {
    std::array::from_fn(|i| left[i] - right[i])
}

impl Character {
    /// Number of weights with their multiplicities: the dimension.
    #[must_use]
    pub fn dimension(&self) -> i64 {
        self.weights.values().sum()
    }
}

struct PairedRoot {
    labels: Weight,
    /// Coefficients times half lengths: the inner product with a weight is the sum of these times
    /// its labels.
    dual: Weight,
}

impl SlowAlgebra {
    /// The weights of the irrep with highest weight `labels`, level by level from the top; every
    /// one by Freudenthal's recursion, without use of the Weyl group.
    ///
    /// # Source
    /// [Humphreys 1972], 22.3.
    #[must_use]
    pub fn character(&self, labels: &[i64]) -> Character {
        let steps: Vec<Weight> = self.cartan.iter().map(|row| weight(row)).collect();
        let roots = self.paired_roots();
        let top = weight(labels);
        let mut weights = HashMap::from([(top, 1)]);
        // Each weight of a level with what was taken off the top, in simple roots.
        let mut level: HashMap<Weight, Weight> = HashMap::from([(top, [0; 8])]);
        while !level.is_empty() {
            let mut next: HashMap<Weight, Weight> = HashMap::new();
            for (above, taken) in &level {
                for (i, step) in steps.iter().enumerate() {
                    // The i-string through `above` goes down as far as its label says.
                    let mut up = add(above, step);
                    let mut times_up = 0;
                    while weights.contains_key(&up) {
                        up = add(&up, step);
                        times_up += 1;
                    }
                    if times_up + above[i] > 0 {
                        let mut taken = *taken;
                        taken[i] += 1;
                        next.insert(subtract(above, step), taken);
                    }
                }
            }
            for (below, taken) in &next {
                let multiplicity = self.freudenthal(&top, below, taken, &roots, &weights);
                weights.insert(*below, multiplicity);
            }
            level = next;
        }
        Character { weights }
    }

    fn paired_roots(&self) -> Vec<PairedRoot> {
        let pair = |root: &Vec<i64>| PairedRoot {
            labels: weight(&self.labels_of(root)),
            dual: weight(
                &root
                    .iter()
                    .zip(&self.halves)
                    .map(|(c, half)| c * half)
                    .collect::<Vec<_>>(),
            ),
        };
        self.positive_roots.iter().map(pair).collect()
    }

    /// `2 sum_(alpha > 0, k > 0) m(mu + k alpha) (mu + k alpha, alpha)` divided by
    /// `|lambda + rho|^2 - |mu + rho|^2`.
    fn freudenthal(
        &self,
        top: &Weight,
        below: &Weight,
        taken: &Weight,
        roots: &[PairedRoot],
        known: &HashMap<Weight, i64>,
    ) -> i64 {
        let mut sum = 0;
        for root in roots {
            let mut raised = *below;
            loop {
                raised = add(&raised, &root.labels);
                let Some(multiplicity) = known.get(&raised) else {
                    break;
                };
                let paired = raised.iter().zip(&root.dual);
                sum += multiplicity
                    * paired
                        .map(|(&a, &b)| i64::from(a) * i64::from(b))
                        .sum::<i64>();
            }
        }
        let difference: i64 = (0..self.rank())
            .map(|i| i64::from(taken[i]) * i64::from(top[i] + below[i] + 2) * self.halves[i])
            .sum();
        assert_eq!(2 * sum % difference, 0, "multiplicities are whole");
        2 * sum / difference
    }
}
