//! The Cartan matrix and its inverse, as whole numbers.

use std::ops::Index;

use num_integer::Integer;

use crate::{CartanType, DynkinDiagram};

/// The Cartan matrix `A[i][j] = 2 (alpha_i, alpha_j) / (alpha_j, alpha_j)`: row i holds the
/// Dynkin labels of simple root i ([Slansky 1981]).
///
/// ```
/// let g2: roots::SimpleAlgebra = "G2".parse()?;
/// assert_eq!(g2.cartan_matrix().rows().collect::<Vec<_>>(), [[2, -3], [-1, 2]]);
/// # Ok::<(), roots::Error>(())
/// ```
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct CartanMatrix {
    rank: usize,
    entries: Vec<i8>,
}

impl CartanMatrix {
    /// The matrix of `cartan_type`, read off its Dynkin diagram.
    #[must_use]
    pub fn of(cartan_type: CartanType) -> Self {
        let diagram = DynkinDiagram::of(cartan_type);
        let rank = cartan_type.rank();
        let mut entries = vec![0; rank * rank];
        for i in 0..rank {
            entries[i * rank + i] = 2;
        }
        let lengths = diagram.length_ratios();
        for &(i, j) in diagram.bonds() {
            // 2 (i,j)/(j,j): the longer of two joined roots has -ratio in its row.
            entries[i * rank + j] = bond(lengths[i], lengths[j]);
            entries[j * rank + i] = bond(lengths[j], lengths[i]);
        }
        Self { rank, entries }
    }

    /// Number of rows and of columns.
    #[must_use]
    pub const fn rank(&self) -> usize {
        self.rank
    }

    /// The rows from node 1 on; row i holds the Dynkin labels of simple root i.
    pub fn rows(&self) -> impl ExactSizeIterator<Item = &[i8]> {
        self.entries.chunks(self.rank)
    }

    /// The determinant, which is the number of elements of the centre.
    #[must_use]
    pub fn determinant(&self) -> u32 {
        self.inverse().denominator()
    }

    /// The inverse, over one common denominator.
    ///
    /// # Cost
    /// `rank` cubed multiplications (Bareiss' fraction-free elimination).
    #[must_use]
    pub fn inverse(&self) -> InverseCartanMatrix {
        InverseCartanMatrix::of(self)
    }
}

impl Index<(usize, usize)> for CartanMatrix {
    type Output = i8;

    fn index(&self, (row, column): (usize, usize)) -> &i8 {
        &self.entries[row * self.rank + column]
    }
}

const fn bond(this: u8, other: u8) -> i8 {
    if this > other {
        -((this / other).cast_signed())
    } else {
        -1
    }
}

/// The inverse of a Cartan matrix: whole numerators over its determinant.
///
/// Row i holds fundamental weight i in units of simple roots.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct InverseCartanMatrix {
    rank: usize,
    denominator: u32,
    numerators: Vec<u32>,
}

impl InverseCartanMatrix {
    /// The common denominator: the determinant of the Cartan matrix.
    #[must_use]
    pub const fn denominator(&self) -> u32 {
        self.denominator
    }

    /// Rows of numerators; every one is positive.
    pub fn rows(&self) -> impl ExactSizeIterator<Item = &[u32]> {
        self.numerators.chunks(self.rank)
    }

    /// Gauss-Jordan elimination without fractions on `[A | 1]` ([Bareiss 1968]). No pivot is
    /// zero, since the leading minors of a Cartan matrix are positive; entries on the way are minors
    /// of `[A | 1]`, which grow as the square of the rank at most (SU(N)'s), far inside `i64`.
    fn of(matrix: &CartanMatrix) -> Self {
        let n = matrix.rank;
        let width = 2 * n;
        let mut work = vec![0i64; n * width];
        for (i, row) in matrix.rows().enumerate() {
            for (j, &entry) in row.iter().enumerate() {
                work[i * width + j] = entry.into();
            }
            work[i * width + n + i] = 1;
        }
        let mut previous = 1;
        for k in 0..n {
            let pivot_row = work[k * width..(k + 1) * width].to_vec();
            let pivot = pivot_row[k];
            for (i, row) in work.chunks_mut(width).enumerate() {
                if i == k {
                    continue;
                }
                let factor = row[k];
                for (entry, above) in row.iter_mut().zip(&pivot_row) {
                    let (quotient, rest) = (pivot * *entry - factor * above).div_rem(&previous);
                    debug_assert_eq!(rest, 0, "Bareiss divisions are exact");
                    *entry = quotient;
                }
            }
            previous = pivot;
        }
        let positive = |entry: i64| u32::try_from(entry).expect("inverse entries are positive");
        Self {
            rank: n,
            denominator: positive(previous),
            numerators: work
                .chunks(width)
                .flat_map(|row| row[n..].iter().copied().map(positive))
                .collect(),
        }
    }
}

impl Index<(usize, usize)> for InverseCartanMatrix {
    type Output = u32;

    fn index(&self, (row, column): (usize, usize)) -> &u32 {
        &self.numerators[row * self.rank + column]
    }
}

#[cfg(test)]
mod tests {
    use crate::SimpleAlgebra;

    /// A times its inverse is the determinant times one, for every type up to rank 9 and a few
    /// large ones.
    #[test]
    fn inverse_times_matrix_is_one() {
        let names = ["A200", "B77", "C64", "D131"].map(|name| name.parse().unwrap());
        for algebra in SimpleAlgebra::up_to_rank(9).chain(names) {
            let (matrix, inverse) = (algebra.cartan_matrix(), algebra.cartan_matrix().inverse());
            let n = algebra.rank();
            for i in 0..n {
                for j in 0..n {
                    let sum: i64 = (0..n)
                        .map(|k| i64::from(inverse[(i, k)]) * i64::from(matrix[(k, j)]))
                        .sum();
                    let one = if i == j { inverse.denominator() } else { 0 };
                    assert_eq!(sum, i64::from(one), "{algebra} at ({i}, {j})");
                }
            }
        }
    }
}
