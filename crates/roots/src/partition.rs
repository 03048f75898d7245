//! Partitions, and the characters of the symmetric groups.

use std::fmt;
use std::str::FromStr;

use num_bigint::BigInt;

use crate::Error;

/// A partition of a whole number: parts that do not rise, none of them zero. It stands for an
/// irrep of the symmetric group on that many things, or for a class of permutations by the
/// lengths of their cycles.
///
/// ```
/// use roots::Partition;
/// let mixed: Partition = "2,1".parse()?;
/// assert_eq!(mixed.size(), 3);
/// assert_eq!(mixed.symmetric_group_character(&Partition::row(3)?), (-1).into());
/// # Ok::<(), roots::Error>(())
/// ```
#[derive(Clone, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub struct Partition {
    /// Descending, positive, with sum at most [`Partition::MOST`].
    parts: Vec<u32>,
}

impl Partition {
    /// The largest number that is partitioned.
    pub const MOST: u32 = 40;

    /// The partition with these parts; zeros at the end are left out.
    ///
    /// # Errors
    /// [`Error::BadPartition`] where the parts rise or their sum is beyond [`MOST`](Self::MOST).
    pub fn new(parts: &[u32]) -> Result<Self, Error> {
        let sum = parts
            .iter()
            .try_fold(0u32, |sum, &part| sum.checked_add(part));
        let falling = parts.windows(2).all(|pair| pair[0] >= pair[1]);
        if !falling || sum.is_none_or(|sum| sum > Self::MOST) {
            let written: Vec<String> = parts.iter().map(u32::to_string).collect();
            return Err(Self::bad(&written.join(",")));
        }
        let parts = parts.iter().copied().filter(|&part| part > 0).collect();
        Ok(Self { parts })
    }

    fn bad(written: &str) -> Error {
        Error::BadPartition {
            written: written.chars().take(60).collect(),
            most: Self::MOST,
        }
    }

    fn check_size(size: u32) -> Result<(), Error> {
        if size <= Self::MOST {
            return Ok(());
        }
        Err(Error::DegreeTooLarge {
            degree: size,
            most: Self::MOST,
        })
    }

    /// One part: the trivial irrep, and as a class of permutations the one long cycle.
    ///
    /// # Errors
    /// [`Error::DegreeTooLarge`] beyond [`MOST`](Self::MOST).
    pub fn row(size: u32) -> Result<Self, Error> {
        Self::check_size(size)?;
        Self::new(&[size])
    }

    /// All parts 1: the sign, and as a class of permutations the identity.
    ///
    /// # Errors
    /// [`Error::DegreeTooLarge`] beyond [`MOST`](Self::MOST).
    pub fn column(size: u32) -> Result<Self, Error> {
        Self::check_size(size)?;
        Self::new(&vec![1; size as usize])
    }

    /// The parts, the largest first.
    #[must_use]
    pub fn parts(&self) -> &[u32] {
        &self.parts
    }

    /// The number that is partitioned.
    #[must_use]
    pub fn size(&self) -> u32 {
        self.parts.iter().sum()
    }

    /// All partitions of `size`, the single row first.
    ///
    /// # Errors
    /// [`Error::DegreeTooLarge`] beyond [`MOST`](Self::MOST).
    pub fn all(size: u32) -> Result<Vec<Self>, Error> {
        Self::check_size(size)?;
        let mut found = Vec::new();
        extend(&mut Vec::new(), size, size, &mut found);
        Ok(found)
    }

    /// The character of the irrep of the symmetric group that belongs to this partition, at
    /// permutations whose cycles have these lengths; zero where the sizes differ.
    ///
    /// # Cost
    /// At most one step per way to take the cycles off as border strips.
    /// # Source
    /// Murnaghan-Nakayama rule: [Macdonald 1995], I.7, example 5.
    #[must_use]
    pub fn symmetric_group_character(&self, cycles: &Self) -> BigInt {
        if self.size() != cycles.size() {
            return BigInt::ZERO;
        }
        let count = u32::try_from(self.parts.len()).expect("parts are few");
        // Beta numbers: a border strip is taken off by moving one of them down.
        let betas = (0..).zip(&self.parts);
        let betas: Vec<u32> = betas.map(|(row, part)| part + count - 1 - row).collect();
        strips(&betas, &cycles.parts)
    }

    /// The order of the centraliser of a permutation with cycles of these lengths.
    #[must_use]
    pub fn centralizer_order(&self) -> BigInt {
        let mut order = BigInt::from(1);
        let mut equal = 0u32;
        for (i, &part) in self.parts.iter().enumerate() {
            equal = if i > 0 && self.parts[i - 1] == part {
                equal + 1
            } else {
                1
            };
            order *= part * equal;
        }
        order
    }
}

fn extend(parts: &mut Vec<u32>, left: u32, most: u32, found: &mut Vec<Partition>) {
    if left == 0 {
        found.push(Partition {
            parts: parts.clone(),
        });
        return;
    }
    for part in (1..=most.min(left)).rev() {
        parts.push(part);
        extend(parts, left - part, part, found);
        parts.pop();
    }
}

/// Sum over border strips of the first length, with sign by the rows they cross.
fn strips(betas: &[u32], cycles: &[u32]) -> BigInt {
    let Some((&length, rest)) = cycles.split_first() else {
        return 1.into();
    };
    let mut sum = BigInt::ZERO;
    for (place, &beta) in betas.iter().enumerate() {
        let Some(lower) = beta.checked_sub(length) else {
            continue;
        };
        if betas.contains(&lower) {
            continue;
        }
        let crossed = betas
            .iter()
            .filter(|&&other| other > lower && other < beta)
            .count();
        let mut moved = betas.to_vec();
        moved[place] = lower;
        let value = strips(&moved, rest);
        sum += if crossed % 2 == 0 { value } else { -value };
    }
    sum
}

impl fmt::Display for Partition {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        let parts: Vec<String> = self.parts.iter().map(u32::to_string).collect();
        f.write_str(&parts.join(","))
    }
}

impl FromStr for Partition {
    type Err = Error;

    /// Reads parts with commas between them: `2,1`.
    fn from_str(written: &str) -> Result<Self, Error> {
        let parts = written.split(',').map(|part| part.trim().parse());
        let parts: Result<Vec<u32>, _> = parts.collect();
        let parts = parts.map_err(|_| Self::bad(written))?;
        Self::new(&parts).map_err(|_| Self::bad(written))
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    /// Characters of S4, [Fulton-Harris 1991], 2.3: classes 1^4, 2 1^2, 3 1, 4, 2^2.
    #[test]
    fn characters_of_s4() {
        let table = [
            ("4", [1, 1, 1, 1, 1]),
            ("1,1,1,1", [1, -1, 1, -1, 1]),
            ("3,1", [3, 1, 0, -1, -1]),
            ("2,1,1", [3, -1, 0, 1, -1]),
            ("2,2", [2, 0, -1, 0, 2]),
        ];
        let classes = ["1,1,1,1", "2,1,1", "3,1", "4", "2,2"];
        for (irrep, row) in table {
            let irrep: Partition = irrep.parse().unwrap();
            for (class, value) in classes.iter().zip(row) {
                let class = class.parse().unwrap();
                assert_eq!(irrep.symmetric_group_character(&class), value.into());
            }
        }
    }

    /// Rows of the character table are orthonormal, for sizes up to 8.
    #[test]
    fn characters_are_orthonormal() {
        for size in 0..=8u32 {
            let all = Partition::all(size).unwrap();
            let group: BigInt = (1..=size).map(BigInt::from).product();
            for left in &all {
                for right in &all {
                    let sum: BigInt = all
                        .iter()
                        .map(|class| {
                            left.symmetric_group_character(class)
                                * right.symmetric_group_character(class)
                                * (&group / class.centralizer_order())
                        })
                        .sum();
                    let expected = if left == right {
                        group.clone()
                    } else {
                        0.into()
                    };
                    assert_eq!(sum, expected, "{left} and {right}");
                }
            }
        }
    }

    #[test]
    fn degrees_too_large() {
        let says = "degree 41 is beyond 40, the largest power that is taken";
        assert_eq!(Partition::row(41).unwrap_err().to_string(), says);
        assert_eq!(Partition::column(41).unwrap_err().to_string(), says);
        assert_eq!(Partition::all(41).unwrap_err().to_string(), says);
        assert_eq!(Partition::row(40).unwrap().size(), 40);
        assert_eq!(Partition::column(40).unwrap().size(), 40);
    }

    #[test]
    fn bad_partitions() {
        for written in ["1,2", "", "2,-1", "x", "41", "4294967295,4294967295"] {
            let error = written.parse::<Partition>().unwrap_err().to_string();
            assert!(error.contains("as in 2,1"), "{written}: {error}");
        }
    }
}
