//! Products weight by weight: all the weights of the product, divided into irreps from the top.
//!
//! Slower than reflection, and independent of it: no sign and no rho occur.

use num_bigint::BigInt;
use num_integer::Integer;

use crate::dimension::orbit_size;
use crate::{Character, Decomposition, Error, Irrep, Limits};

/// The product of two irreps by their characters.
///
/// # Errors
/// [`Error::MixedAlgebras`], and [`Error::BeyondLimit`] beyond `limits`.
/// # Cost
/// One reflection per dominant weight of the larger and weight of the smaller irrep, then the
/// dominant weights of every irrep in the product.
/// # Source
/// [Slansky 1981], section 4: weights added, highest weights taken off.
///
/// ```
/// use roots::{Limits, SimpleAlgebra, product_by_weight_division};
/// let g2: SimpleAlgebra = "G2".parse()?;
/// let (seven, adjoint) = (g2.read_irrep("7")?, g2.adjoint());
/// let divided = product_by_weight_division(&seven, &adjoint, &Limits::default())?;
/// assert_eq!(divided, seven.product(&adjoint)?);
/// # Ok::<(), roots::Error>(())
/// ```
pub fn product_by_weight_division(
    left: &Irrep,
    right: &Irrep,
    limits: &Limits,
) -> Result<Decomposition, Error> {
    let (left, right) = (
        Character::of_within(left, limits)?,
        Character::of_within(right, limits)?,
    );
    left.product_within(&right, limits)?
        .decompose_within(limits)
}

/// The whole part of `total / orbit size`, the size that of the orbit of these labels.
pub(crate) fn per_weight(cartan_type: crate::CartanType, labels: &[u32], total: &BigInt) -> BigInt {
    let (count, rest) = total.div_rem(&orbit_size(cartan_type, labels).into());
    debug_assert!(
        rest == BigInt::ZERO,
        "the weights of an orbit are equally often there"
    );
    count
}
