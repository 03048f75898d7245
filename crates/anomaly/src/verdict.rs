//! The bare verdict, for scans.

use model::Spectrum;
use num_traits::{CheckedAdd, CheckedMul};

use crate::{Anomaly, Condition, Rule, UnknownCharge};

/// Whether every anomaly that must cancel does.
///
/// # Errors
/// [`UnknownCharge`] where a charge that enters is written `"?"`.
/// # Cost
/// A few whole-number multiplications for each multiplet and anomaly, without allocation; sums
/// beyond 64 bits are done again in 128, and beyond those in large numbers.
///
/// ```
/// use model::{Field, Multiplet, Spectrum, Symmetry};
/// let mut spectrum = Spectrum::new([Symmetry::gauge("weak", "SU(2)".parse()?)])?;
/// spectrum.add(Multiplet::draft("doublet", Field::LeftHandedFermion).under("weak", "2"))?;
/// assert!(!anomaly::is_consistent(&spectrum)?);
/// # Ok::<(), Box<dyn std::error::Error>>(())
/// ```
pub fn is_consistent(spectrum: &Spectrum) -> Result<bool, UnknownCharge> {
    for anomaly in Anomaly::all(spectrum).filter(|anomaly| anomaly.must_cancel(spectrum)) {
        let sum = small_sum::<i64>(anomaly, spectrum).map(i128::from);
        let cancels = match sum.or_else(|| small_sum(anomaly, spectrum)) {
            Some(sum) => Rule::of(anomaly, spectrum).admits_small(sum),
            None => Condition::of(anomaly, spectrum)?.cancels(),
        };
        if !cancels {
            return Ok(false);
        }
    }
    Ok(true)
}

/// The sum with charges times their common denominators, which is zero when the sum is; sums with
/// another rule have no such charge in them.
fn small_sum<T>(anomaly: Anomaly, spectrum: &Spectrum) -> Option<T>
where
    T: From<i64> + CheckedAdd + CheckedMul,
{
    let mut sum = T::from(0);
    for multiplet in spectrum.multiplets() {
        sum = sum.checked_add(&anomaly.small_share(multiplet)?)?;
    }
    Some(sum)
}
