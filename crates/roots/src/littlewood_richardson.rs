//! Products of SU(N) irreps by Young diagrams.

use crate::lane_table::LaneTable;
use crate::lanes::Lanes;

/// Rows of the Young diagram of an SU(N) irrep, N of them, the last one 0.
pub(crate) fn rows(labels: &[u32]) -> Vec<i64> {
    let mut rows = vec![0; labels.len() + 1];
    for (i, &label) in labels.iter().enumerate().rev() {
        rows[i] = rows[i + 1] + i64::from(label);
    }
    rows
}

/// The product of the irreps with diagrams `base` and `added`, by highest weights; `None` where
/// it takes more than `budget` steps. Stops early with more than `most_terms` terms.
///
/// The boxes of `added` are put on `base`, those of its first row first, no two of one row in one
/// column, so that read from the right, row by row from the top, each row's boxes never outnumber
/// those of the row above.
///
/// # Cost
/// At most N steps per tableau, which are as many as the multiplicities add up to, and those of
/// tableaux that cannot be finished.
/// # Source
/// [Littlewood-Richardson 1934]; [Fulton 1997], 5.2.
pub(crate) fn product<L: Lanes>(
    base: &[i64],
    added: &[i64],
    budget: u64,
    most_terms: usize,
) -> Option<LaneTable<L, u64>> {
    let last = added.iter().rposition(|&row| row > 0);
    let mut filling = Filling {
        shape: base.to_vec(),
        before: base.to_vec(),
        added,
        last: last.unwrap_or(0),
        above: vec![0; base.len()],
        steps_left: budget,
        most_terms,
        terms: LaneTable::for_entries(16),
    };
    let whole = if last.is_none() {
        filling.keep();
        Some(())
    } else {
        filling.row_of_boxes(0)
    };
    whole.map(|()| filling.terms)
}

struct Filling<'a, L> {
    /// The diagram as it grows.
    shape: Vec<i64>,
    /// The diagram before the boxes that are being put on.
    before: Vec<i64>,
    added: &'a [i64],
    /// The last row of `added` with boxes.
    last: usize,
    /// How many boxes of the row before the current one lie in each row of the diagram.
    above: Vec<i64>,
    steps_left: u64,
    most_terms: usize,
    terms: LaneTable<L, u64>,
}

impl<L: Lanes> Filling<'_, L> {
    /// Puts on the boxes of row `value` of `added`, and then the rest.
    fn row_of_boxes(&mut self, value: usize) -> Option<()> {
        let outer = std::mem::replace(&mut self.before, self.shape.clone());
        let mut placed = vec![0; self.shape.len()];
        let done = self.place(value, value, self.added[value], 0, &mut placed);
        self.before = outer;
        done
    }

    /// Puts `left` boxes on row `row` and below. `allowance` is by how many the boxes of the row
    /// above outnumber these so far.
    fn place(
        &mut self,
        value: usize,
        row: usize,
        left: i64,
        allowance: i64,
        placed: &mut Vec<i64>,
    ) -> Option<()> {
        self.steps_left = self.steps_left.checked_sub(1)?;
        if self.terms.len() > self.most_terms {
            return Some(());
        }
        if left == 0 {
            return self.finish(value, placed);
        }
        if row == self.shape.len() {
            return Some(());
        }
        let allowance = if value == 0 {
            left
        } else {
            allowance + self.above[row - 1]
        };
        let room = if row == 0 {
            left
        } else {
            self.before[row - 1] - self.before[row]
        };
        let most = left.min(room).min(allowance);
        // The rows below have room for no more than the row is longer than the last one.
        let last = self.before[self.before.len() - 1];
        let least = (left - (self.before[row] - last)).max(0);
        for boxes in least..=most {
            self.shape[row] = self.before[row] + boxes;
            placed[row] = boxes;
            self.place(value, row + 1, left - boxes, allowance - boxes, placed)?;
        }
        self.shape[row] = self.before[row];
        placed[row] = 0;
        Some(())
    }

    fn finish(&mut self, value: usize, placed: &mut Vec<i64>) -> Option<()> {
        if value == self.last {
            self.keep();
            return Some(());
        }
        std::mem::swap(&mut self.above, placed);
        let done = self.row_of_boxes(value + 1);
        std::mem::swap(&mut self.above, placed);
        done
    }

    fn keep(&mut self) {
        let labels = self.shape.windows(2).map(|rows| rows[0] - rows[1]);
        *self.terms.at(&L::pack(labels)) += 1;
    }
}
