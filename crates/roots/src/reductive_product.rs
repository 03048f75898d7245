//! Tensor products of irreps of a product of algebras: factor by factor, charges added.

use std::collections::BTreeMap;

use num_bigint::BigUint;
use num_rational::BigRational;
use num_traits::{One, Zero};

use crate::{Error, Factor, Irrep, Limits, Part, ReductiveAlgebra, ReductiveIrrep};

/// A representation of a reductive algebra as a sum of irreps with multiplicities, in the order
/// of [`ReductiveIrrep`].
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct ReductiveDecomposition {
    terms: BTreeMap<ReductiveIrrep, BigUint>,
}

impl ReductiveDecomposition {
    /// Number of different irreps.
    #[must_use]
    pub fn len(&self) -> usize {
        self.terms.len()
    }

    /// Whether it is the sum of nothing.
    #[must_use]
    pub fn is_empty(&self) -> bool {
        self.terms.is_empty()
    }

    /// The irreps with their multiplicities, in order.
    pub fn iter(&self) -> impl ExactSizeIterator<Item = (&ReductiveIrrep, &BigUint)> {
        self.terms.iter()
    }

    /// How often `irrep` is in it.
    #[must_use]
    pub fn multiplicity(&self, irrep: &ReductiveIrrep) -> BigUint {
        self.terms.get(irrep).cloned().unwrap_or_default()
    }

    /// The dimension of the whole.
    #[must_use]
    pub fn dimension(&self) -> BigUint {
        self.terms
            .iter()
            .map(|(irrep, n)| irrep.dimension() * n)
            .sum()
    }
}

impl ReductiveAlgebra {
    /// The tensor product of any number of irreps of this algebra; of none, the singlet.
    ///
    /// # Errors
    /// [`Error::FactorCount`] or [`Error::FactorMismatch`] where an irrep is not of this algebra;
    /// as [`SimpleAlgebra::product`](crate::SimpleAlgebra::product).
    /// # Cost
    /// The products of the simple factors, and one step per term of the answer.
    ///
    /// ```
    /// let standard_model: roots::ReductiveAlgebra = "SU(3) x SU(2) x U(1)".parse()?;
    /// let quark = standard_model.read_irrep(&["3", "2", "1/6"])?;
    /// let up = standard_model.read_irrep(&["3bar", "1", "-2/3"])?;
    /// let higgs = standard_model.read_irrep(&["1", "2", "1/2"])?;
    /// let singlet = standard_model.read_irrep(&["1", "1", "0"])?;
    /// let coupling = standard_model.product(&[quark, up, higgs])?;
    /// assert_eq!(coupling.multiplicity(&singlet), 1u32.into());
    /// # Ok::<(), roots::Error>(())
    /// ```
    pub fn product(&self, factors: &[ReductiveIrrep]) -> Result<ReductiveDecomposition, Error> {
        self.product_within(factors, &Limits::default())
    }

    /// As [`product`](Self::product), within limits of one's own.
    ///
    /// # Errors
    /// As [`product`](Self::product).
    pub fn product_within(
        &self,
        factors: &[ReductiveIrrep],
        limits: &Limits,
    ) -> Result<ReductiveDecomposition, Error> {
        for factor in factors {
            self.irrep(factor.parts().to_vec())?;
        }
        let mut whole: Vec<(Vec<Part>, BigUint)> = vec![(Vec::new(), BigUint::one())];
        for (place, factor) in self.factors().iter().enumerate() {
            let parts = factors.iter().map(|irrep| &irrep.parts()[place]);
            let choices = product_of_parts(*factor, parts, limits)?;
            let size = whole.len().saturating_mul(choices.len());
            if size > limits.terms() {
                return Err(limits.too_many_terms(size));
            }
            let pairs = whole.iter().flat_map(|(parts, n)| {
                choices.iter().map(move |(part, times)| {
                    let mut parts = parts.clone();
                    parts.push(part.clone());
                    (parts, n * times)
                })
            });
            whole = pairs.collect();
        }
        let terms = whole
            .into_iter()
            .map(|(parts, n)| Ok((self.irrep(parts)?, n)));
        Ok(ReductiveDecomposition {
            terms: terms.collect::<Result<_, Error>>()?,
        })
    }
}

/// What the irreps are together under one factor.
fn product_of_parts<'a>(
    factor: Factor,
    parts: impl Iterator<Item = &'a Part>,
    limits: &Limits,
) -> Result<Vec<(Part, BigUint)>, Error> {
    let mut irreps: Vec<Irrep> = Vec::new();
    let mut charge = BigRational::zero();
    for part in parts {
        match part {
            Part::Irrep(irrep) => irreps.push(irrep.clone()),
            Part::Charge(own) => charge += own,
        }
    }
    match factor {
        Factor::U1 => Ok(vec![(Part::Charge(charge), BigUint::one())]),
        Factor::Simple(algebra) => {
            let product = algebra.product_within(&irreps, limits)?;
            let terms = product.iter();
            Ok(terms
                .map(|(irrep, n)| (Part::Irrep(irrep.clone()), n))
                .collect())
        }
    }
}
