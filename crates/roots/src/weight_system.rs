//! The weights of an irrep: the dominant ones with their multiplicities, and all of them.

use num_bigint::{BigInt, BigUint};

use crate::count::{Count, in_width};
use crate::decomposition::highest_weight;
use crate::frame::{Frame, label_bound};
use crate::lanes::{Lanes, on_lanes};
use crate::multiplicities::multiplicities;
use crate::weight::{Boxed, boxed, lane_orbit};
use crate::{Error, Irrep, Limits, Weight};

impl Irrep {
    /// The dominant weights with their multiplicities, the highest weight first, each after those
    /// it lies below.
    ///
    /// # Errors
    /// [`Error::BeyondLimit`] where there are more than the limit of [`Limits`].
    /// # Cost
    /// For each dominant weight, one look-up per orbit of roots under the stabiliser of the weight
    /// and step along it.
    /// # Source
    /// [Moody-Patera 1982]; checked against the tables of [Bremner-Moody-Patera 1985].
    ///
    /// ```
    /// let e8: roots::SimpleAlgebra = "E8".parse()?;
    /// let weights = e8.adjoint().dominant_weights()?;
    /// let zero = weights.last().unwrap();
    /// assert_eq!((weights.len(), &zero.1), (2, &8u32.into()));
    /// # Ok::<(), roots::Error>(())
    /// ```
    pub fn dominant_weights(&self) -> Result<Vec<(Weight, BigUint)>, Error> {
        self.dominant_weights_within(&Limits::default())
    }

    /// As [`dominant_weights`](Self::dominant_weights), within limits of one's own.
    ///
    /// # Errors
    /// As [`dominant_weights`](Self::dominant_weights).
    pub fn dominant_weights_within(
        &self,
        limits: &Limits,
    ) -> Result<Vec<(Weight, BigUint)>, Error> {
        let cartan_type = self.algebra().cartan_type();
        let bound = label_bound(cartan_type, std::iter::once(self.labels()));
        Ok(on_lanes!(cartan_type, bound, |held| {
            in_width!(Counts => dominant_list::<_, Counts>(&held, self, limits)?)
        }))
    }

    /// All weights with their multiplicities, one after the other: the orbits of the dominant
    /// weights in their order, each orbit from its dominant weight on.
    ///
    /// # Errors
    /// As [`dominant_weights`](Self::dominant_weights).
    /// # Cost
    /// The dominant weights are held, everything else is made as it is asked for.
    ///
    /// ```
    /// let su3: roots::SimpleAlgebra = "SU(3)".parse()?;
    /// let dimension: num_bigint::BigUint = su3.adjoint().weights()?.map(|(_, times)| times).sum();
    /// assert_eq!(dimension, 8u32.into());
    /// # Ok::<(), roots::Error>(())
    /// ```
    pub fn weights(&self) -> Result<impl Iterator<Item = (Weight, BigUint)> + Send + use<>, Error> {
        let algebra = self.algebra();
        let bound = label_bound(algebra.cartan_type(), std::iter::once(self.labels()));
        let dominant = self.dominant_weights()?;
        Ok(on_lanes!(algebra.cartan_type(), bound, |held| {
            let orbits = dominant.into_iter().flat_map(move |(weight, times)| {
                let orbit = lane_orbit(held.clone(), weight.to_lanes());
                orbit.map(move |weight| (Weight::from_lanes(algebra, &weight), times.clone()))
            });
            let weights: Boxed<(Weight, BigUint)> = boxed(orbits);
            weights
        }))
    }
}

/// The dominant weights of an irrep; `None` where a multiplicity does not fit in `C`.
fn dominant_list<L: Lanes, C: Count>(
    frame: &Frame<L>,
    irrep: &Irrep,
    limits: &Limits,
) -> Result<Option<Vec<(Weight, BigUint)>>, Error> {
    let highest: L = highest_weight(irrep);
    let found = multiplicities::<L, C>(frame, &highest, limits.dominant_weights())?;
    let Some(found) = found else { return Ok(None) };
    let listed = found.iter().map(|(weight, count)| {
        let count = match count.to_u64() {
            Some(small) => BigUint::from(small),
            None => Into::<BigInt>::into(count.clone()).magnitude().clone(),
        };
        (Weight::from_lanes(irrep.algebra(), weight), count)
    });
    Ok(Some(listed.collect()))
}
