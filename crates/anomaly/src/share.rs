//! What one multiplet adds to one anomaly.

use model::Multiplet;
use num_bigint::BigInt;
use num_rational::BigRational;
use num_traits::{CheckedMul, Zero};

use crate::Anomaly;

impl Anomaly {
    /// The share of `multiplet`, with charges times the spectrum's common denominators; `None`
    /// where a charge is unknown or the share too large for `T`.
    #[inline]
    pub(crate) fn small_share<T: From<i64> + CheckedMul>(
        &self,
        multiplet: &Multiplet,
    ) -> Option<T> {
        if !multiplet.has_fermions() {
            return Some(T::from(0));
        }
        let whole = self.whole_share(multiplet);
        if whole == 0 {
            return Some(T::from(0));
        }
        let discrete = i64::from(self.discrete_charge(multiplet));
        let mut share = T::from(whole).checked_mul(&T::from(discrete))?;
        for &charge in self.charges() {
            share = share.checked_mul(&T::from(multiplet.scaled_charge(charge)?))?;
        }
        Some(share)
    }

    /// The share of `multiplet`, exact; or the place of the charge that is unknown.
    pub(crate) fn share(&self, multiplet: &Multiplet) -> Result<BigRational, usize> {
        if !multiplet.has_fermions() {
            return Ok(BigRational::zero());
        }
        let whole = self.whole_share(multiplet);
        if whole == 0 {
            return Ok(BigRational::zero());
        }
        let whole = BigInt::from(whole) * self.discrete_charge(multiplet);
        let mut share = BigRational::from(whole);
        for &place in self.charges() {
            share *= multiplet.charge(place).ok_or(place)?;
        }
        Ok(share)
    }

    /// Everything but the charges: an index or the number of states, in the left-handed view. A
    /// multiplet keeps them, all copies counted, below 2^63.
    #[inline]
    fn whole_share(&self, multiplet: &Multiplet) -> i64 {
        // One charge, three charges or a cubic index are odd under conjugation, a parity is not.
        let sign = multiplet.left_handed_sign();
        let index = |gauge| multiplet.total_dynkin_index_under(gauge).cast_signed();
        match *self {
            Self::GaugeCubed(gauge) => sign * multiplet.total_cubic_index_under(gauge),
            Self::GaugeSquaredCharge { gauge, .. } | Self::GaugeSquaredDiscrete { gauge, .. } => {
                sign * index(gauge)
            }
            Self::Charges(_) | Self::GravityCharge(_) | Self::GravityDiscrete(_) => {
                sign * multiplet.states().cast_signed()
            }
            Self::Parity(gauge) => index(gauge),
        }
    }

    /// The charge under the Z(N) that takes part; 1 where none does.
    #[inline]
    fn discrete_charge(&self, multiplet: &Multiplet) -> u32 {
        match *self {
            Self::GaugeSquaredDiscrete { discrete, .. } | Self::GravityDiscrete(discrete) => {
                multiplet.discrete_charge(discrete).unwrap_or(0)
            }
            Self::GaugeCubed(_)
            | Self::GaugeSquaredCharge { .. }
            | Self::Charges(_)
            | Self::GravityCharge(_)
            | Self::Parity(_) => 1,
        }
    }
}
