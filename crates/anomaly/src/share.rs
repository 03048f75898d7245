//! What one multiplet adds to one anomaly.

use model::Multiplet;
use num_bigint::BigInt;
use num_rational::BigRational;
use num_traits::Zero;

use crate::Anomaly;

impl Anomaly {
    /// The share of `multiplet`, with charges times the spectrum's common denominators; `None`
    /// where a charge is unknown or the share is beyond 128 bits.
    pub(crate) fn small_share(&self, multiplet: &Multiplet) -> Option<i128> {
        if !multiplet.has_fermions() {
            return Some(0);
        }
        let mut share = self.whole_share(multiplet);
        if share == 0 {
            return Some(0);
        }
        for &charge in self.charges() {
            share = times(share, multiplet.scaled_charge(charge)?)?;
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
        let mut share = BigRational::from(BigInt::from(whole));
        for &place in self.charges() {
            share *= multiplet.charge(place).ok_or(place)?;
        }
        Ok(share)
    }

    /// Everything but the charges under U(1)s. A multiplet keeps its states and indices, all copies
    /// counted, below 2^63, and a charge under Z(N) is below 2^32: the product is far inside 128
    /// bits.
    fn whole_share(&self, multiplet: &Multiplet) -> i128 {
        // One charge, three charges or a cubic index are odd under conjugation, a parity is not.
        let sign = i128::from(multiplet.left_handed_sign());
        let index = |gauge| i128::from(multiplet.total_dynkin_index_under(gauge));
        let states = || i128::from(multiplet.states());
        let charge = |place| i128::from(multiplet.discrete_charge(place).unwrap_or(0));
        match *self {
            Self::GaugeCubed(gauge) => sign * i128::from(multiplet.total_cubic_index_under(gauge)),
            Self::GaugeSquaredCharge { gauge, .. } => sign * index(gauge),
            Self::Charges(_) | Self::GravityCharge(_) => sign * states(),
            Self::Parity(gauge) => index(gauge),
            Self::GaugeSquaredDiscrete { gauge, discrete } => {
                sign * index(gauge) * charge(discrete)
            }
            Self::GravityDiscrete(discrete) => sign * states() * charge(discrete),
        }
    }
}

/// The product, where 128 bits hold it. Factors of 64 bits, as they mostly are, need no check.
fn times(share: i128, charge: i64) -> Option<i128> {
    match i64::try_from(share) {
        Ok(share) => Some(i128::from(share) * i128::from(charge)),
        Err(_) => share.checked_mul(charge.into()),
    }
}
