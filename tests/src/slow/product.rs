//! Tensor products of small irreps, by peeling the product of two characters from the top.

use std::collections::{BTreeMap, HashMap};

use super::SlowAlgebra;
use super::character::{Character, Weight, add};

impl SlowAlgebra {
    /// What the product of two irreps falls into: labels and how often.
    ///
    /// # Panics
    /// Where a multiplicity comes out negative, which it cannot.
    #[must_use]
    pub fn product(&self, left: &[i64], right: &[i64]) -> BTreeMap<Vec<i64>, i64> {
        let (left, right) = (self.character(left), self.character(right));
        let mut rest: HashMap<Weight, i64> = HashMap::new();
        for (w, m) in &left.weights {
            for (v, n) in &right.weights {
                *rest.entry(add(w, v)).or_default() += m * n;
            }
        }
        let mut terms = BTreeMap::new();
        while let Some(top) = self.highest(&rest) {
            let times = rest[&top];
            assert!(times > 0, "multiplicities are positive");
            let labels: Vec<i64> = top[..self.rank()].iter().map(|&l| l.into()).collect();
            self.take_off(&mut rest, &self.character(&labels), times);
            terms.insert(labels, times);
        }
        terms
    }

    /// The weight with the greatest pairing with all positive coroots: no other is above it.
    fn highest(&self, weights: &HashMap<Weight, i64>) -> Option<Weight> {
        let level = |w: &Weight| {
            self.steps(
                &w[..self.rank()]
                    .iter()
                    .map(|&l| l.into())
                    .collect::<Vec<_>>(),
            )
        };
        weights.keys().copied().max_by_key(level)
    }

    fn take_off(&self, rest: &mut HashMap<Weight, i64>, character: &Character, times: i64) {
        for (w, m) in &character.weights {
            *rest.get_mut(w).expect("an irrep's weights are all there") -= m * times;
        }
        rest.retain(|_, m| *m != 0);
    }
}
