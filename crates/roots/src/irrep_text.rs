//! Reading an irrep as it is written: labels in brackets, or a name.

use num_bigint::BigUint;

use crate::irrep_name::NAMED_UP_TO;
use crate::{CatalogBound, Error, Irrep, NameBook, Numbering, SimpleAlgebra};

impl SimpleAlgebra {
    /// Reads an irrep of this algebra: `(1,0,0,0)`, `(1000)` while every label is one digit,
    /// `16`, `16bar`, `10'`, `210''`, or `8v`, `8s`, `8c` for SO(8). In rank 1, `(12)` is the one
    /// label 12.
    ///
    /// # Errors
    /// Says what is wrong with the text, and lists the irreps that may have been meant.
    ///
    /// ```
    /// let so8: roots::SimpleAlgebra = "SO(8)".parse()?;
    /// assert_eq!(so8.read_irrep("8s")?.labels(), [0, 0, 0, 1]);
    /// let error = so8.read_irrep("8").unwrap_err().to_string();
    /// assert!(error.contains("8v = (1000), 8s = (0001), 8c = (0010)"));
    /// # Ok::<(), roots::Error>(())
    /// ```
    pub fn read_irrep(self, written: &str) -> Result<Irrep, Error> {
        self.read_irrep_in(Numbering::Slansky, written)
    }

    /// As [`read_irrep`](Self::read_irrep), with labels in another numbering of the nodes.
    ///
    /// # Errors
    /// As [`read_irrep`](Self::read_irrep).
    pub fn read_irrep_in(self, numbering: Numbering, written: &str) -> Result<Irrep, Error> {
        let written = written.trim();
        if written.starts_with('(') {
            let labels = read_labels(self, written)?;
            // The count is checked before nodes are rearranged.
            let irrep = self.irrep(&labels)?;
            let labels = numbering.to_slansky(self.cartan_type(), irrep.labels());
            return self.irrep(&labels);
        }
        let name = WrittenName::read(written).ok_or_else(|| self.bad_irrep(numbering, written))?;
        self.find(numbering, written, &name)
    }

    fn bad_irrep(self, numbering: Numbering, written: &str) -> Error {
        let example = Irrep::from_fn(self, |node| u32::from(node == 0));
        Error::BadIrrep {
            algebra: self.to_string(),
            written: shortened(written),
            labels: example.bracketed_in(numbering),
            dimension: example.dimension().to_string(),
        }
    }

    fn find(self, numbering: Numbering, written: &str, name: &WrittenName) -> Result<Irrep, Error> {
        if name.dimension > BigUint::from(NAMED_UP_TO) {
            return Err(Error::BeyondNames {
                written: shortened(written),
            });
        }
        let mut book = NameBook::new(self);
        let equals = book.of_dimension(&name.dimension).to_vec();
        let named: Vec<(String, &Irrep)> = equals
            .iter()
            .map(|irrep| (book.name(irrep).to_string(), irrep))
            .collect();
        if let Some((_, irrep)) = named.iter().find(|(other, _)| *other == name.canonical()) {
            return Ok((*irrep).clone());
        }
        let plain = name.primes == 0 && name.letters.is_empty() && !name.bar;
        let candidates: Vec<String> = named
            .iter()
            .map(|(name, irrep)| format!("{name} = {}", irrep.bracketed_in(numbering)))
            .collect();
        let (algebra, written) = (self.to_string(), shortened(written));
        Err(if plain && !candidates.is_empty() {
            Error::AmbiguousIrrep {
                algebra,
                written,
                candidates,
            }
        } else if candidates.is_empty() {
            let candidates = self.nearest(numbering, &name.dimension, &mut book);
            Error::UnknownIrrep {
                algebra,
                written,
                candidates,
            }
        } else {
            Error::UnknownIrrep {
                algebra,
                written,
                candidates,
            }
        })
    }

    /// The irreps of the nearest dimensions below and above one that has none.
    fn nearest(
        self,
        numbering: Numbering,
        dimension: &BigUint,
        book: &mut NameBook,
    ) -> Vec<String> {
        const ENOUGH: usize = 20_000;
        let bound = CatalogBound::Dimension(dimension * 4u32);
        let Ok(all) = self.irreps_within(&bound, ENOUGH) else {
            return Vec::new();
        };
        let split = all.partition_point(|irrep| irrep.dimension() < *dimension);
        let (below, above) = all.split_at(split);
        let near = |irrep: Option<&Irrep>| irrep.map(Irrep::dimension);
        let (low, high) = (near(below.last()), near(above.first()));
        let wanted = all.iter().filter(|irrep| {
            let found = Some(irrep.dimension());
            found == low || found == high
        });
        wanted
            .map(|irrep| format!("{} = {}", book.name(irrep), irrep.bracketed_in(numbering)))
            .collect()
    }
}

/// A name as written, in its parts.
struct WrittenName {
    dimension: BigUint,
    primes: usize,
    letters: String,
    bar: bool,
}

impl WrittenName {
    /// Digits, then primes, letters and `bar` in any order.
    fn read(written: &str) -> Option<Self> {
        const MOST_DIGITS: usize = 40;
        let end = written
            .find(|c: char| !c.is_ascii_digit())
            .unwrap_or(written.len());
        let (digits, rest) = written.split_at(end);
        if digits.len() > MOST_DIGITS || rest.len() > MOST_DIGITS {
            return None;
        }
        let rest = rest.to_ascii_lowercase();
        let (rest, bar) = match rest.split_once("bar") {
            Some((before, after)) => (format!("{before}{after}"), true),
            None => (rest, false),
        };
        let letters: String = rest.chars().filter(|c| "vsc".contains(*c)).collect();
        let primes = rest.chars().filter(|&c| is_prime_mark(c)).count();
        (letters.chars().count() + primes == rest.chars().count()).then_some(())?;
        Some(Self {
            dimension: digits.parse().ok()?,
            primes,
            letters,
            bar,
        })
    }

    fn canonical(&self) -> String {
        let bar = if self.bar { "bar" } else { "" };
        let primes = "'".repeat(self.primes);
        format!("{}{primes}{}{bar}", self.dimension, self.letters)
    }
}

const fn is_prime_mark(c: char) -> bool {
    matches!(c, '\'' | '\u{2032}' | '\u{2019}')
}

/// Labels in brackets: with commas or spaces between them, or one digit each.
fn read_labels(algebra: SimpleAlgebra, written: &str) -> Result<Vec<u32>, Error> {
    let bad = |label: &str| Error::BadLabel {
        written: shortened(written),
        label: shortened(label),
    };
    let inner = written
        .strip_prefix('(')
        .and_then(|open| open.strip_suffix(')'))
        .ok_or_else(|| bad(written))?
        .trim();
    let read = |label: &str| {
        let digits = !label.is_empty() && label.bytes().all(|b| b.is_ascii_digit());
        let value = digits.then(|| label.parse().ok()).flatten();
        value.ok_or_else(|| bad(label))
    };
    if inner.contains(',') {
        inner.split(',').map(|label| read(label.trim())).collect()
    } else if inner.contains(char::is_whitespace) {
        inner.split_whitespace().map(read).collect()
    } else if algebra.rank() == 1 {
        Ok(vec![read(inner)?])
    } else if inner.bytes().all(|b| b.is_ascii_digit()) && !inner.is_empty() {
        Ok(inner.bytes().map(|b| u32::from(b - b'0')).collect())
    } else {
        Err(bad(inner))
    }
}

/// The text, cut where it is too long to repeat in a message.
fn shortened(written: &str) -> String {
    const MOST: usize = 60;
    if written.chars().count() <= MOST {
        return written.to_owned();
    }
    let start: String = written.chars().take(MOST).collect();
    format!("{start}...")
}
