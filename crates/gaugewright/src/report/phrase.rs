//! Running text with the things that each format writes in its own way.

use num_bigint::{BigInt, BigUint};
use num_rational::BigRational;
use roots::IrrepName;

/// One piece of a sentence or of a table cell.
#[derive(Clone, Debug, PartialEq, Eq)]
pub enum Inline {
    /// Plain words.
    Words(String),
    /// Words that carry the message, such as a verdict.
    Strong(String),
    /// The name of an irrep.
    Irrep(IrrepName),
    /// An exact number.
    Number(BigRational),
    /// The name of an algebra or of a product of them, such as `SU(3) x U(1)`.
    Algebra(String),
    /// Dynkin labels in brackets.
    Labels(String),
    /// A symbol with a meaning in formulas, such as `Y` or `C2`, as text and as LaTeX.
    Symbol(&'static str, &'static str),
}

/// Pieces in a row.
#[derive(Clone, Debug, Default, PartialEq, Eq)]
pub struct Phrase(Vec<Inline>);

impl Phrase {
    /// Nothing yet.
    #[must_use]
    pub const fn new() -> Self {
        Self(Vec::new())
    }

    /// The pieces.
    #[must_use]
    pub fn pieces(&self) -> &[Inline] {
        &self.0
    }

    /// The same with one more piece.
    #[must_use]
    pub fn then(mut self, piece: impl Into<Self>) -> Self {
        self.0.extend(piece.into().0);
        self
    }

    /// Words that carry the message.
    #[must_use]
    pub fn strong(words: impl Into<String>) -> Self {
        Self(vec![Inline::Strong(words.into())])
    }

    /// The name of an algebra.
    #[must_use]
    pub fn algebra(name: impl ToString) -> Self {
        Self(vec![Inline::Algebra(name.to_string())])
    }

    /// Dynkin labels in brackets.
    #[must_use]
    pub fn labels(bracketed: impl Into<String>) -> Self {
        Self(vec![Inline::Labels(bracketed.into())])
    }

    /// A symbol as text and as LaTeX.
    #[must_use]
    pub fn symbol(text: &'static str, latex: &'static str) -> Self {
        Self(vec![Inline::Symbol(text, latex)])
    }

    /// Phrases with a separator between them.
    #[must_use]
    pub fn join(phrases: impl IntoIterator<Item = Self>, separator: &str) -> Self {
        Self::between(phrases, &separator.into())
    }

    /// Phrases with times signs between them.
    #[must_use]
    pub fn product(phrases: impl IntoIterator<Item = Self>) -> Self {
        Self::between(phrases, &Self::symbol(" x ", " \\times "))
    }

    fn between(phrases: impl IntoIterator<Item = Self>, separator: &Self) -> Self {
        let mut joined = Self::new();
        for (place, phrase) in phrases.into_iter().enumerate() {
            if place > 0 {
                joined = joined.then(separator.clone());
            }
            joined = joined.then(phrase);
        }
        joined
    }
}

impl From<&str> for Phrase {
    fn from(words: &str) -> Self {
        Self(vec![Inline::Words(words.to_owned())])
    }
}

impl From<String> for Phrase {
    fn from(words: String) -> Self {
        Self(vec![Inline::Words(words)])
    }
}

impl From<IrrepName> for Phrase {
    fn from(name: IrrepName) -> Self {
        Self(vec![Inline::Irrep(name)])
    }
}

impl From<BigRational> for Phrase {
    fn from(number: BigRational) -> Self {
        Self(vec![Inline::Number(number)])
    }
}

impl From<BigInt> for Phrase {
    fn from(number: BigInt) -> Self {
        BigRational::from_integer(number).into()
    }
}

impl From<BigUint> for Phrase {
    fn from(number: BigUint) -> Self {
        BigInt::from(number).into()
    }
}

impl From<usize> for Phrase {
    fn from(number: usize) -> Self {
        BigInt::from(number).into()
    }
}
