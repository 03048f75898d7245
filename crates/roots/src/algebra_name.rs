//! Names of simple algebras: reading and writing them.

use std::fmt;
use std::str::FromStr;

use crate::text::shortened;
use crate::{CartanType, Error, Family, SimpleAlgebra};

impl fmt::Display for SimpleAlgebra {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        let n = self.rank();
        match self.cartan_type().family() {
            Family::A => write!(f, "SU({})", n + 1),
            Family::B => write!(f, "SO({})", 2 * n + 1),
            Family::C => write!(f, "Sp({})", 2 * n),
            Family::D => write!(f, "SO({})", 2 * n),
            Family::E | Family::F | Family::G => write!(f, "{}", self.cartan_type()),
        }
    }
}

impl FromStr for SimpleAlgebra {
    type Err = Error;

    /// Reads `SU(5)`, `so10`, `USp(4)`, `E6`, `D5`: case and brackets are optional.
    fn from_str(written: &str) -> Result<Self, Error> {
        let (series, number) = split(written).ok_or_else(|| unknown(written))?;
        match number {
            Some(number) => Written { written, number }.read(&series),
            None if SERIES.contains(&series.as_str()) => Err(Error::RankTooLarge {
                written: shortened(written),
            }),
            None => Err(unknown(written)),
        }
    }
}

/// What may stand before the number.
const SERIES: [&str; 12] = [
    "su", "so", "sp", "usp", "u", "a", "b", "c", "d", "e", "f", "g",
];

fn unknown(written: &str) -> Error {
    Error::UnknownAlgebra {
        written: shortened(written),
        also: "",
    }
}

/// Letters in lower case and the number after them; `None` for a number too large to count with.
fn split(written: &str) -> Option<(String, Option<usize>)> {
    let trimmed = written.trim();
    let letters = trimmed.find(|c: char| !c.is_ascii_alphabetic())?;
    let (series, rest) = trimmed.split_at(letters);
    let rest = rest.trim();
    let inner = rest
        .strip_prefix('(')
        .map_or(Some(rest), |open| open.strip_suffix(')'))?;
    let digits = inner.trim();
    if digits.is_empty() || !digits.bytes().all(|b| b.is_ascii_digit()) {
        return None;
    }
    Some((series.to_ascii_lowercase(), digits.parse().ok()))
}

/// The text and the number in it.
struct Written<'a> {
    written: &'a str,
    number: usize,
}

impl Written<'_> {
    fn read(&self, series: &str) -> Result<SimpleAlgebra, Error> {
        match series {
            "su" => self.special_unitary(),
            "so" => self.orthogonal(),
            "sp" | "usp" => self.symplectic(),
            "u" => Err(self.unitary()),
            "a" => self.of_type(Family::A),
            "b" => self.of_type(Family::B),
            "c" => self.of_type(Family::C),
            "d" => self.of_type(Family::D),
            "e" => self.of_type(Family::E),
            "f" => self.of_type(Family::F),
            "g" => self.of_type(Family::G),
            _ => Err(unknown(self.written)),
        }
    }

    fn special_unitary(&self) -> Result<SimpleAlgebra, Error> {
        match self.number {
            0 | 1 => Err(self.not_simple("trivial, of rank 0", "SU(2) or larger")),
            n => self.ranked(Family::A, n - 1),
        }
    }

    fn orthogonal(&self) -> Result<SimpleAlgebra, Error> {
        match self.number {
            0 | 1 => Err(self.not_simple("trivial, of rank 0", "SO(5) or larger")),
            2 => Err(self.not_simple("abelian", "\"U(1)\" as a factor of a product")),
            3 => self.ranked(Family::A, 1),
            4 => Err(self.not_simple("SU(2) x SU(2)", "\"SU(2) x SU(2)\"")),
            n if n % 2 == 1 => self.ranked(Family::B, n / 2),
            n => self.ranked(Family::D, n / 2),
        }
    }

    fn symplectic(&self) -> Result<SimpleAlgebra, Error> {
        match self.number {
            0 => Err(self.not_simple("trivial, of rank 0", "Sp(4) or larger")),
            2 => self.ranked(Family::A, 1),
            n if n % 2 == 1 => Err(self.not_simple(
                "of odd size, and the rank of Sp(2N) is N",
                "an even number, as in Sp(4)",
            )),
            n => self.ranked(Family::C, n / 2),
        }
    }

    fn unitary(&self) -> Error {
        match self.number {
            1 => self.not_simple("abelian", "\"U(1)\" as a factor of a product"),
            _ => self.not_simple(
                "a product with U(1)",
                "\"SU(N) x U(1)\" with the N that is meant",
            ),
        }
    }

    fn of_type(&self, family: Family) -> Result<SimpleAlgebra, Error> {
        match (family, self.number) {
            (Family::B | Family::C, 1) => self.ranked(Family::A, 1),
            (Family::D, 2) => Err(self.not_simple("SU(2) x SU(2)", "\"SU(2) x SU(2)\"")),
            (Family::D, 1) => Err(self.not_simple("abelian", "\"U(1)\" as a factor of a product")),
            (Family::A | Family::B | Family::C | Family::D, 0) => {
                Err(self.not_simple("trivial, of rank 0", "A1 or larger"))
            }
            (_, rank) => self.ranked(family, rank),
        }
    }

    fn ranked(&self, family: Family, rank: usize) -> Result<SimpleAlgebra, Error> {
        CartanType::new(family, rank)
            .map(SimpleAlgebra::new)
            .map_err(|error| match error {
                Error::RankTooLarge { .. } => Error::RankTooLarge {
                    written: shortened(self.written),
                },
                other => other,
            })
    }

    fn not_simple(&self, what: &'static str, instead: &'static str) -> Error {
        Error::NotSimple {
            written: shortened(self.written),
            what,
            instead,
        }
    }
}
