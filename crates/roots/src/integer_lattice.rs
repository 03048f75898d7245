//! Row reduction of whole-number matrices: integer echelon form and finite abelian quotients.

use std::fmt;

use num_bigint::BigInt;
use num_integer::Integer;
use num_traits::{One, Signed, Zero};

/// Brings rows to echelon form by whole-number row operations in the first `columns` columns, and
/// returns the rows that are zero there: a basis of the relations among the first columns, with
/// what the other columns make of them.
///
/// ```
/// use num_bigint::BigInt;
/// let rows = [[4, 1], [6, 0]].map(|row| row.map(BigInt::from).to_vec());
/// // 3 * 4 - 2 * 6 = 0, and the second column then reads 3 (up to sign).
/// let left = roots::rows_without(rows.to_vec(), 1);
/// assert_eq!(left.len(), 1);
/// assert_eq!(left[0][1].magnitude(), &3u32.into());
/// ```
///
/// # Panics
/// Where a row has fewer than `columns` entries.
#[must_use]
pub fn rows_without(mut rows: Vec<Vec<BigInt>>, columns: usize) -> Vec<Vec<BigInt>> {
    let mut done = 0;
    for column in 0..columns {
        if clear_column(&mut rows[done..], column) {
            done += 1;
        }
    }
    rows.split_off(done)
}

/// Euclid's algorithm down a column: afterwards only the first row may be nonzero there, and the
/// answer says whether it is.
fn clear_column(rows: &mut [Vec<BigInt>], column: usize) -> bool {
    loop {
        let nonzero = rows
            .iter()
            .enumerate()
            .filter(|(_, row)| !row[column].is_zero());
        let Some((smallest, _)) = nonzero.min_by_key(|(_, row)| row[column].abs()) else {
            return false;
        };
        rows.swap(0, smallest);
        let (first, rest) = rows.split_at_mut(1);
        let mut cleared = true;
        for row in rest.iter_mut().filter(|row| !row[column].is_zero()) {
            let times = row[column].div_floor(&first[0][column]);
            subtract(row, &first[0], &times);
            cleared &= row[column].is_zero();
        }
        if cleared {
            return true;
        }
    }
}

fn subtract(row: &mut [BigInt], other: &[BigInt], times: &BigInt) {
    for (entry, below) in row.iter_mut().zip(other) {
        *entry -= times * below;
    }
}

/// A finite abelian group as a product of cyclic ones, the order of each dividing the next one's.
///
/// ```
/// let group = roots::FiniteAbelian::quotient(2, &[vec![2, 0], vec![0, 3]]);
/// assert_eq!(group.map(|group| group.to_string()), Some("Z6".to_owned()));
/// ```
#[derive(Clone, Debug, PartialEq, Eq, Hash)]
pub struct FiniteAbelian {
    /// Each above 1, each dividing the next.
    orders: Vec<BigInt>,
}

impl FiniteAbelian {
    /// The whole-number lattice of `rank` dimensions modulo the one spanned by `relations`, where
    /// that is finite.
    ///
    /// # Panics
    /// Where a relation has not `rank` entries.
    /// # Source
    /// Smith's normal form, [Newman 1972], chapter II.
    #[must_use]
    pub fn quotient<T: Clone + Into<BigInt>>(rank: usize, relations: &[Vec<T>]) -> Option<Self> {
        let whole = |row: &Vec<T>| {
            assert_eq!(row.len(), rank, "one entry per dimension");
            row.iter().cloned().map(Into::into).collect()
        };
        let mut rows: Vec<Vec<BigInt>> = relations.iter().map(whole).collect();
        let mut orders = Vec::new();
        for corner in 0..rank {
            orders.push(diagonal_entry(&mut rows, corner)?);
        }
        orders.retain(|order| !order.is_one());
        Some(Self { orders })
    }

    /// Orders of the cyclic factors, each above 1 and dividing the next.
    #[must_use]
    pub fn orders(&self) -> &[BigInt] {
        &self.orders
    }

    /// Whether it has one element only.
    #[must_use]
    pub fn is_trivial(&self) -> bool {
        self.orders.is_empty()
    }
}

/// Makes row and column `corner` zero but for the diagonal entry, which divides all that is left;
/// `None` where nothing nonzero is left.
fn diagonal_entry(rows: &mut [Vec<BigInt>], corner: usize) -> Option<BigInt> {
    loop {
        let rest = rows.iter().enumerate().skip(corner);
        let entries = rest.flat_map(|(i, row)| {
            let columns = row.iter().enumerate().skip(corner);
            columns.map(move |(j, entry)| (entry.abs(), i, j))
        });
        let (smallest, i, j) = entries.filter(|(size, ..)| !size.is_zero()).min()?;
        rows.swap(corner, i);
        rows.iter_mut().for_each(|row| row.swap(corner, j));
        if reduce_cross(rows, corner) && divides_rest(rows, corner, &smallest) {
            return Some(smallest);
        }
    }
}

/// Subtracts the corner's row and column from the others; whether the cross is then zero.
fn reduce_cross(rows: &mut [Vec<BigInt>], corner: usize) -> bool {
    let pivot_row = rows[corner].clone();
    let pivot = pivot_row[corner].clone();
    for row in &mut rows[corner + 1..] {
        let times = row[corner].div_floor(&pivot);
        subtract(row, &pivot_row, &times);
    }
    for j in corner + 1..pivot_row.len() {
        let times = rows[corner][j].div_floor(&pivot);
        for row in &mut rows[corner..] {
            let taken = &times * &row[corner];
            row[j] -= taken;
        }
    }
    let column = rows[corner + 1..].iter().all(|row| row[corner].is_zero());
    column && rows[corner][corner + 1..].iter().all(Zero::is_zero)
}

/// Whether the corner divides every entry left; where it does not, adds the offending row to the
/// corner's, so that the next round finds a smaller one.
fn divides_rest(rows: &mut [Vec<BigInt>], corner: usize, divisor: &BigInt) -> bool {
    let indivisible = |row: &Vec<BigInt>| {
        !row[corner..]
            .iter()
            .all(|entry| entry.is_multiple_of(divisor))
    };
    let Some(offending) = rows
        .iter()
        .skip(corner + 1)
        .find(|row| indivisible(row))
        .cloned()
    else {
        return true;
    };
    for (entry, added) in rows[corner].iter_mut().zip(&offending) {
        *entry += added;
    }
    false
}

impl fmt::Display for FiniteAbelian {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        if self.is_trivial() {
            return f.write_str("trivial");
        }
        let factors: Vec<String> = self
            .orders
            .iter()
            .map(|order| format!("Z{order}"))
            .collect();
        f.write_str(&factors.join(" x "))
    }
}

#[cfg(test)]
mod tests {
    use super::*;
    use crate::SimpleAlgebra;

    /// The weight lattice modulo the root lattice is the centre, whose structure is tabulated
    /// in [Slansky 1981]: the Cartan matrix decides between Z4 and Z2 x Z2.
    #[test]
    fn cartan_matrix_gives_the_centre() {
        for algebra in SimpleAlgebra::up_to_rank(9) {
            let rows: Vec<Vec<i8>> = algebra.cartan_matrix().rows().map(<[i8]>::to_vec).collect();
            let group = FiniteAbelian::quotient(algebra.rank(), &rows).unwrap();
            assert_eq!(group.to_string(), algebra.center().to_string(), "{algebra}");
        }
    }

    #[test]
    fn an_infinite_quotient_is_none() {
        assert_eq!(FiniteAbelian::quotient(2, &[vec![3, 3]]), None);
    }
}
