//! How often one irrep is in a product, without the rest of the product.

use num_bigint::{BigInt, BigUint};
use num_traits::Zero;

use crate::count::{Count, in_width};
use crate::decomposition::highest_weight;
use crate::frame::Frame;
use crate::lanes::{Lanes, on_lanes};
use crate::multiplicities::multiplicities;
use crate::orbit_walk::{dominant, push_children};
use crate::tensor_product::{bound_of, check_factors};
use crate::{Error, Irrep, Limits, SimpleAlgebra};

impl SimpleAlgebra {
    /// How often `irrep` is in the product of `factors`.
    ///
    /// # Errors
    /// As [`product`](Self::product).
    /// # Cost
    /// For two factors, the dominant weights of the smaller one and a look-up for each weight of
    /// the orbit of `irrep + rho` that is no farther from `larger + rho` than the smaller one's
    /// highest weight is long; for more, that for each irrep in the product of all but the
    /// smallest factor.
    /// # Source
    /// [Racah 1964]; [Speiser 1964].
    ///
    /// ```
    /// let e6: roots::SimpleAlgebra = "E6".parse()?;
    /// let (family, adjoint) = (e6.read_irrep("27")?, e6.adjoint());
    /// let factors = [family.clone(), family.conjugate()];
    /// assert_eq!(e6.multiplicity_in_product(&adjoint, &factors)?, 1u32.into());
    /// # Ok::<(), roots::Error>(())
    /// ```
    pub fn multiplicity_in_product(
        self,
        irrep: &Irrep,
        factors: &[Irrep],
    ) -> Result<BigUint, Error> {
        check_factors(self, std::slice::from_ref(irrep))?;
        check_factors(self, factors)?;
        let mut by_size: Vec<&Irrep> = factors.iter().collect();
        by_size.sort_by_cached_key(|irrep| irrep.dimension());
        let (smallest, rest) = match by_size.split_first() {
            None => return Ok(u32::from(irrep.is_singlet()).into()),
            Some((only, [])) => return Ok(u32::from(*only == irrep).into()),
            Some(split) => split,
        };
        let rest: Vec<Irrep> = rest.iter().map(|&irrep| irrep.clone()).collect();
        let larger: Vec<(Irrep, BigUint)> = match &rest[..] {
            [one] => vec![(one.clone(), 1u32.into())],
            several => {
                let product = self.product(several)?;
                product
                    .iter()
                    .map(|(irrep, n)| (irrep.clone(), n))
                    .collect()
            }
        };
        // Both shifted weights have rho in them, and the difference may have it twice.
        let rho = Irrep::from_fn(self, |_| 1);
        let bound = bound_of(self, factors.iter().chain([irrep, &rho]))?;
        on_lanes!(self.cartan_type(), bound, |held| {
            Ok(in_width!(Counts => count::<_, Counts>(&held, irrep, &larger, smallest)?))
        })
    }
}

/// `None` where a number does not fit in `C`.
fn count<L: Lanes, C: Count>(
    frame: &Frame<L>,
    irrep: &Irrep,
    larger: &[(Irrep, BigUint)],
    smallest: &Irrep,
) -> Result<Option<BigUint>, Error> {
    let highest: L = highest_weight(smallest);
    let limit = Limits::default().dominant_weights();
    let Some(known) = multiplicities::<L, C>(frame, &highest, limit)? else {
        return Ok(None);
    };
    let target = highest_weight::<L>(irrep).plus(&frame.rho);
    let reach = frame.scaled_norm(&highest);
    let mut total = BigInt::zero();
    for (large, times) in larger {
        let from = highest_weight::<L>(large).plus(&frame.rho);
        let mut sum = C::zero();
        // Away from the dominant weight, every reflection takes the orbit farther off.
        let mut waiting = vec![(target.clone(), false)];
        let mut children = Vec::new();
        while let Some((weight, odd)) = waiting.pop() {
            let difference = weight.minus(&from);
            if frame.scaled_norm(&difference) > reach {
                continue;
            }
            if let Some(there) = known.get(&dominant(frame, difference)) {
                let signed = if odd { -there.clone() } else { there.clone() };
                match sum.checked_add(&signed) {
                    Some(more) => sum = more,
                    None => return Ok(None),
                }
            }
            push_children(frame, &weight, &mut children);
            waiting.extend(children.drain(..).map(|child| (child, !odd)));
        }
        total += Into::<BigInt>::into(sum) * BigInt::from(times.clone());
    }
    debug_assert!(
        total >= BigInt::zero(),
        "an irrep is there a number of times"
    );
    Ok(Some(total.magnitude().clone()))
}
