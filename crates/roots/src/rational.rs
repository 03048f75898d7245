//! Exact fractions as they are written: `-1/6`, `2`.

use num_bigint::BigInt;
use num_rational::BigRational;
use num_traits::Zero;

use crate::Error;
use crate::text::shortened;

/// Digits that a numerator or denominator may have.
const MOST_DIGITS: usize = 60;

/// Reads a whole number or a fraction of two of them.
///
/// # Errors
/// [`Error::BadNumber`] for anything else: decimals, a zero denominator, over 60 digits above or
/// below.
///
/// ```
/// assert_eq!(roots::read_rational("-2/12")?.to_string(), "-1/6");
/// assert!(roots::read_rational("0.5").is_err());
/// assert!(roots::read_rational("1/0").is_err());
/// # Ok::<(), roots::Error>(())
/// ```
pub fn read_rational(written: &str) -> Result<BigRational, Error> {
    let bad = || Error::BadNumber {
        written: shortened(written),
    };
    let (above, below) = match written.trim().split_once('/') {
        Some((above, below)) => (above.trim_end(), Some(below.trim_start())),
        None => (written.trim(), None),
    };
    let unsigned = above.strip_prefix(['-', '+']).unwrap_or(above);
    let numerator: BigInt = digits(unsigned).ok_or_else(bad)?;
    let denominator = below.map_or_else(|| Some(BigInt::from(1)), digits);
    let denominator = denominator.filter(|d| !d.is_zero()).ok_or_else(bad)?;
    let value = BigRational::new(numerator, denominator);
    Ok(if above.starts_with('-') {
        -value
    } else {
        value
    })
}

fn digits(written: &str) -> Option<BigInt> {
    let fits = !written.is_empty() && written.len() <= MOST_DIGITS;
    let digits = fits && written.bytes().all(|b| b.is_ascii_digit());
    digits.then(|| written.parse().ok()).flatten()
}
