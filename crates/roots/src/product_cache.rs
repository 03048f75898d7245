//! Products remembered by a caller who asks for many.

use std::collections::HashMap;
use std::collections::hash_map::Entry;

use crate::{Decomposition, Error, Irrep, Limits};

/// Products of two irreps, remembered for as long as the caller holds this.
///
/// Factors may come in either order, and from several algebras. What is held is bounded: once the
/// irreps of all remembered products together are more than the capacity, all are forgotten.
///
/// ```
/// use roots::{ProductCache, SimpleAlgebra};
/// let su5: SimpleAlgebra = "SU(5)".parse()?;
/// let (five, ten) = (su5.read_irrep("5bar")?, su5.read_irrep("10")?);
/// let mut products = ProductCache::new();
/// let again = products.product(&five, &ten)?.clone();
/// assert_eq!(*products.product(&ten, &five)?, again);
/// assert_eq!(products.len(), 1);
/// # Ok::<(), roots::Error>(())
/// ```
#[derive(Clone, Debug)]
pub struct ProductCache {
    /// By the factors, the larger in the order of irreps first.
    known: HashMap<Irrep, HashMap<Irrep, Decomposition>>,
    products: usize,
    terms: usize,
    capacity: usize,
    limits: Limits,
}

impl Default for ProductCache {
    fn default() -> Self {
        Self::new()
    }
}

impl ProductCache {
    /// Terms remembered unless said otherwise: about 100 MB.
    const CAPACITY: usize = 1_000_000;

    /// Empty, with room for a million terms.
    #[must_use]
    pub fn new() -> Self {
        Self::with_capacity(Self::CAPACITY)
    }

    /// Empty, with room for that many terms of products.
    #[must_use]
    pub fn with_capacity(capacity: usize) -> Self {
        Self {
            known: HashMap::new(),
            products: 0,
            terms: 0,
            capacity,
            limits: Limits::default(),
        }
    }

    /// The same, with limits of one's own on each product.
    #[must_use]
    pub const fn with_limits(mut self, limits: Limits) -> Self {
        self.limits = limits;
        self
    }

    /// Number of products remembered.
    #[must_use]
    pub const fn len(&self) -> usize {
        self.products
    }

    /// Whether none is remembered.
    #[must_use]
    pub const fn is_empty(&self) -> bool {
        self.products == 0
    }

    /// The tensor product of two irreps.
    ///
    /// # Errors
    /// As [`Irrep::product`].
    /// # Cost
    /// Two look-ups where it is remembered.
    pub fn product(&mut self, left: &Irrep, right: &Irrep) -> Result<&Decomposition, Error> {
        let (first, second) = if left < right {
            (right, left)
        } else {
            (left, right)
        };
        if self.terms > self.capacity {
            self.known.clear();
            (self.products, self.terms) = (0, 0);
        }
        if !self.known.contains_key(first) {
            self.known.insert(first.clone(), HashMap::new());
        }
        let with_first = self.known.entry(first.clone()).or_default();
        match with_first.entry(second.clone()) {
            Entry::Occupied(known) => Ok(known.into_mut()),
            Entry::Vacant(place) => {
                let product = first.product_within(second, &self.limits)?;
                self.products += 1;
                self.terms += product.len();
                Ok(place.insert(product))
            }
        }
    }
}
