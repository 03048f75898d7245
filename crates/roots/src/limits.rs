//! Bounds on the size of what is computed.

use crate::{Error, LimitKind};

/// Bounds on the memory and the time that one product, power or weight system may take.
///
/// What goes beyond them ends in an error that gives an estimate of its size. The bounds are far
/// above anything in print; raise the one that the error names to go further.
///
/// ```
/// use roots::{Limits, SimpleAlgebra};
/// let su3: SimpleAlgebra = "SU(3)".parse()?;
/// let octet = su3.adjoint();
/// let few = Limits::default().with_terms(3);
/// assert!(su3.product_within(&[octet.clone(), octet.clone()], &few).is_err());
/// assert_eq!(su3.product(&[octet.clone(), octet])?.len(), 5);
/// # Ok::<(), roots::Error>(())
/// ```
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub struct Limits {
    terms: usize,
    dominant_weights: usize,
    weights: u64,
}

impl Default for Limits {
    /// Two million terms (about 200 MB), 200 thousand dominant weights, and 20 thousand million
    /// weights (minutes).
    fn default() -> Self {
        Self {
            terms: 2_000_000,
            dominant_weights: 200_000,
            weights: 20_000_000_000,
        }
    }
}

impl Limits {
    /// At most this many different irreps in a result.
    #[must_use]
    pub const fn with_terms(self, terms: usize) -> Self {
        Self { terms, ..self }
    }

    /// At most this many dominant weights in one irrep.
    #[must_use]
    pub const fn with_dominant_weights(self, dominant_weights: usize) -> Self {
        Self {
            dominant_weights,
            ..self
        }
    }

    /// At most this many weights walked through for one product.
    #[must_use]
    pub const fn with_weights(self, weights: u64) -> Self {
        Self { weights, ..self }
    }

    /// The bound on different irreps in a result.
    #[must_use]
    pub const fn terms(&self) -> usize {
        self.terms
    }

    /// The bound on dominant weights in one irrep.
    #[must_use]
    pub const fn dominant_weights(&self) -> usize {
        self.dominant_weights
    }

    /// The bound on weights walked through for one product.
    #[must_use]
    pub const fn weights(&self) -> u64 {
        self.weights
    }

    pub(crate) fn too_many_terms(&self, at_most: impl std::fmt::Display) -> Error {
        Error::BeyondLimit {
            what: "the list of irreps".to_owned(),
            size: format!("up to {} terms", short(&at_most)),
            limit: self.terms as u64,
            raised_by: Some(LimitKind::Terms),
            instead: "take smaller irreps, or raise the limit on terms".to_owned(),
        }
    }

    pub(crate) fn too_many_weights(&self, number: impl std::fmt::Display) -> Error {
        Error::BeyondLimit {
            what: "this product".to_owned(),
            size: format!("a walk through {} weights", short(&number)),
            limit: self.weights,
            raised_by: Some(LimitKind::Weights),
            instead: "take smaller irreps, or raise the limit on weights".to_owned(),
        }
    }
}

/// A number as it is, or its order of magnitude where it has more than twenty digits.
fn short(number: &impl std::fmt::Display) -> String {
    let digits = number.to_string();
    if digits.len() > 20 && digits.bytes().all(|digit| digit.is_ascii_digit()) {
        format!("10^{}", digits.len())
    } else {
        digits
    }
}
