//! The bare verdict, for scans.

use model::Spectrum;

use crate::{Anomaly, Condition, Rule, UnknownCharge};

/// Whether every anomaly that must cancel does.
///
/// # Errors
/// [`UnknownCharge`] where a charge that enters is written `"?"`.
/// # Cost
/// A few whole-number multiplications for each multiplet and anomaly, without allocation; only
/// sums beyond 128 bits are done again in large numbers.
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
        let cancels = match small_sum(anomaly, spectrum) {
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
fn small_sum(anomaly: Anomaly, spectrum: &Spectrum) -> Option<i128> {
    let mut sum = 0i128;
    for multiplet in spectrum.multiplets() {
        sum = sum.checked_add(anomaly.small_share(multiplet)?)?;
    }
    Some(sum)
}
