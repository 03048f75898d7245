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

/// Why a filling was given up.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub(crate) enum Stopped {
    /// It takes more steps, or a deeper recursion, than allowed.
    Budget,
    /// There are more terms than allowed.
    Terms,
}

/// How much a filling may take.
#[derive(Clone, Copy, Debug)]
pub(crate) struct Budget {
    pub(crate) steps: u64,
    pub(crate) terms: usize,
}

/// Rows of both diagrams multiplied, at most: the depth of the recursion, kept well within the
/// smallest stack that a thread is given.
const DEEPEST: usize = 3000;

/// The product of two irreps by their diagrams, the one with fewer rows put on the other, by
/// highest weights.
///
/// The boxes of one diagram are put on the other, those of its first row first, no two of one row
/// in one column, so that read from the right, row by row from the top, each row's boxes never
/// outnumber those of the row above.
///
/// # Errors
/// [`Stopped`] where it takes more than `budget`.
/// # Cost
/// At most N steps per row of the smaller diagram for each tableau, of which there are as many as
/// the multiplicities add up to, and those of tableaux that cannot be finished.
/// # Source
/// [Littlewood-Richardson 1934]; [Fulton 1997], 5.2.
pub(crate) fn product<L: Lanes>(
    left: &[i64],
    right: &[i64],
    budget: Budget,
) -> Result<LaneTable<L, u64>, Stopped> {
    let height = |rows: &[i64]| rows.iter().filter(|&&row| row > 0).count();
    let (base, added) = if height(left) < height(right) {
        (right, left)
    } else {
        (left, right)
    };
    let height = height(added);
    if height * base.len() > DEEPEST {
        return Err(Stopped::Budget);
    }
    let mut filling = Filling {
        shape: base.to_vec(),
        before: base.to_vec(),
        added,
        last: height.saturating_sub(1),
        above: vec![0; base.len()],
        steps_left: budget.steps,
        most_terms: budget.terms,
        terms: LaneTable::for_entries(16),
    };
    if height == 0 {
        filling.keep()?;
    } else {
        filling.row_of_boxes(0)?;
    }
    Ok(filling.terms)
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
    fn row_of_boxes(&mut self, value: usize) -> Result<(), Stopped> {
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
    ) -> Result<(), Stopped> {
        self.steps_left = self.steps_left.checked_sub(1).ok_or(Stopped::Budget)?;
        if left == 0 {
            return self.finish(value, placed);
        }
        if row == self.shape.len() {
            return Ok(());
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
        Ok(())
    }

    fn finish(&mut self, value: usize, placed: &mut Vec<i64>) -> Result<(), Stopped> {
        if value == self.last {
            return self.keep();
        }
        std::mem::swap(&mut self.above, placed);
        let done = self.row_of_boxes(value + 1);
        std::mem::swap(&mut self.above, placed);
        done
    }

    fn keep(&mut self) -> Result<(), Stopped> {
        let labels = self.shape.windows(2).map(|rows| rows[0] - rows[1]);
        *self.terms.at(&L::pack(labels)) += 1;
        if self.terms.len() > self.most_terms {
            return Err(Stopped::Terms);
        }
        Ok(())
    }
}
