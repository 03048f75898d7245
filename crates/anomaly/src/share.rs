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
        for &charge in self.charges() {
            share = share.checked_mul(multiplet.scaled_charge(charge)?.into())?;
        }
        Some(share)
    }

    /// The share of `multiplet`, exact; or the place of the charge that is unknown.
    pub(crate) fn share(&self, multiplet: &Multiplet) -> Result<BigRational, usize> {
        if !multiplet.has_fermions() {
            return Ok(BigRational::zero());
        }
        let mut share = BigRational::from(BigInt::from(self.whole_share(multiplet)));
        for &place in self.charges() {
            share *= multiplet.charge(place).ok_or(place)?;
        }
        Ok(share)
    }

    /// Everything but the charges under U(1)s. A multiplet keeps its indices and dimension, with
    /// copies, below 2^63, and a charge under Z(N) is below 2^32: the product is far inside 128
    /// bits.
    fn whole_share(&self, multiplet: &Multiplet) -> i128 {
        // One charge, three charges or a cubic index are odd under conjugation, a parity is not.
        let sign = i128::from(multiplet.left_handed_sign());
        let charge = |place| i128::from(multiplet.discrete_charge(place).unwrap_or(0));
        match *self {
            Self::GaugeCubed(gauge) => {
                let cubic = i128::from(multiplet.cubic_index_under(gauge));
                sign * cubic * others(multiplet, gauge)
            }
            Self::GaugeSquaredCharge { gauge, .. } => sign * index(multiplet, gauge),
            Self::Charges(_) | Self::GravityCharge(_) => sign * states(multiplet),
            Self::Parity(gauge) => index(multiplet, gauge),
            Self::GaugeSquaredDiscrete { gauge, discrete } => {
                sign * index(multiplet, gauge) * charge(discrete)
            }
            Self::GravityDiscrete(discrete) => sign * states(multiplet) * charge(discrete),
        }
    }
}

/// Dimension times copies.
fn states(multiplet: &Multiplet) -> i128 {
    i128::from(multiplet.dimension()) * i128::from(multiplet.copies())
}

/// Dimension under all symmetries but one, times copies.
fn others(multiplet: &Multiplet, gauge: usize) -> i128 {
    states(multiplet) / i128::from(multiplet.dimension_under(gauge))
}

/// Dynkin index under `gauge` of everything in the multiplet.
fn index(multiplet: &Multiplet, gauge: usize) -> i128 {
    i128::from(multiplet.dynkin_index_under(gauge)) * others(multiplet, gauge)
}
