//! Reading an irrep as it is written: labels in brackets, or a name.

use num_bigint::BigUint;

use crate::dimension::{dimension, dimension_at_most};
use crate::text::shortened;
use crate::{CatalogBound, Error, Irrep, IrrepName, NameBook, Numbering, SimpleAlgebra};

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
        if let Some(inner) = written.strip_prefix('(') {
            let closed = inner.strip_suffix(')');
            let inner = closed.ok_or_else(|| self.bad_irrep(numbering, written))?;
            let labels = read_labels(self, written, inner.trim())?;
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
        if name.dimension > BigUint::from(self.named_up_to()) {
            return Err(Error::BeyondNames {
                algebra: self.to_string(),
                most: self.named_up_to(),
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
        if plain && !candidates.is_empty() {
            return Err(Error::AmbiguousIrrep {
                algebra,
                written,
                candidates,
            });
        }
        let candidates = if candidates.is_empty() {
            self.nearest(numbering, &name.dimension, &mut book)
        } else {
            candidates
        };
        Err(Error::UnknownIrrep {
            algebra,
            written,
            candidates,
        })
    }

    /// The irreps of the nearest dimensions below and above one that has none; empty where there
    /// are too many irreps below it to go through.
    fn nearest(
        self,
        numbering: Numbering,
        dimension: &BigUint,
        book: &mut NameBook,
    ) -> Vec<String> {
        const ENOUGH: usize = 20_000;
        let bound = CatalogBound::Dimension(dimension.clone());
        let Ok(below) = self.irreps_within(&bound, ENOUGH) else {
            return Vec::new();
        };
        let low = below.last().map(Irrep::dimension);
        let high = self.smallest_above(&below);
        let mut candidates = Vec::new();
        for dimension in [low, high].into_iter().flatten() {
            candidates.extend(book.of_dimension(&dimension).to_vec());
        }
        candidates
            .iter()
            .map(|irrep| match book.name(irrep) {
                IrrepName::Labels(_) => irrep.bracketed_in(numbering),
                name => format!("{name} = {}", irrep.bracketed_in(numbering)),
            })
            .collect()
    }

    /// The smallest dimension of an irrep that is not in a list of all irreps up to some other:
    /// it has one label more than one of these.
    fn smallest_above(self, below: &[Irrep]) -> Option<BigUint> {
        let largest = below.last().map(Irrep::dimension);
        let mut smallest: Option<BigUint> = None;
        for irrep in below {
            let mut labels = irrep.labels().to_vec();
            for node in 0..self.rank() {
                labels[node] = labels[node].saturating_add(1);
                let found = match &smallest {
                    None => Some(dimension(self.cartan_type(), &labels)),
                    Some(most) => dimension_at_most(self.cartan_type(), &labels, most),
                };
                labels[node] = irrep.labels()[node];
                smallest = found
                    .filter(|found| Some(found) > largest.as_ref())
                    .or(smallest);
            }
        }
        smallest
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

/// The labels between brackets: with commas or spaces between them, or one digit each.
fn read_labels(algebra: SimpleAlgebra, written: &str, inner: &str) -> Result<Vec<u32>, Error> {
    let bad = |label: &str| Error::BadLabel {
        written: shortened(written),
        label: shortened(label),
    };
    let read = |label: &str| {
        let digits = !label.is_empty() && label.bytes().all(|b| b.is_ascii_digit());
        let value = digits.then(|| label.parse().ok()).flatten();
        value.ok_or_else(|| bad(label))
    };
    if inner.contains(',') {
        inner.split(',').map(|label| read(label.trim())).collect()
    } else if inner.contains(char::is_whitespace) {
        inner.split_whitespace().map(read).collect()
    } else if algebra.rank() == 1 && !inner.is_empty() {
        Ok(vec![read(inner)?])
    } else if inner.bytes().all(|b| b.is_ascii_digit()) {
        Ok(inner.bytes().map(|b| u32::from(b - b'0')).collect())
    } else {
        Err(bad(inner))
    }
}
