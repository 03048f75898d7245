//! Exact decimals: a mass in GeV as it is written, `750.5` or `1e12`.

use num_bigint::BigInt;
use num_integer::Integer;
use num_rational::BigRational;
use num_traits::{One, Pow, Signed, Zero};

use crate::Problem;
use crate::suggestion::shortened;

/// Digits that a decimal may have, without its exponent.
const MOST_DIGITS: usize = 60;
/// Largest power of ten, either way.
const MOST_EXPONENT: i32 = 200;

/// Reads a decimal exactly: `750.5`, `1e12`, `-2.5E-3`, `1_000`.
///
/// # Errors
/// [`Problem::BadDecimal`] for anything else, over 60 digits, or a power of ten beyond 200.
///
/// ```
/// assert_eq!(model::read_decimal("750.5")?.to_string(), "1501/2");
/// assert!(model::read_decimal("inf").is_err());
/// # Ok::<(), model::Problem>(())
/// ```
pub fn read_decimal(written: &str) -> Result<BigRational, Problem> {
    read(written.trim()).ok_or_else(|| Problem::BadDecimal {
        written: shortened(written),
    })
}

fn read(written: &str) -> Option<BigRational> {
    let (mantissa, exponent) = match written.split_once(['e', 'E']) {
        Some((mantissa, exponent)) => (mantissa, read_exponent(exponent)?),
        None => (written, 0),
    };
    let unsigned = mantissa.strip_prefix(['-', '+']).unwrap_or(mantissa);
    let (whole, fraction) = unsigned.split_once('.').unwrap_or((unsigned, "0"));
    if !is_digits(whole) || !is_digits(fraction) {
        return None;
    }
    let digits: String = whole
        .chars()
        .chain(fraction.chars())
        .filter(|&c| c != '_')
        .collect();
    let places = i32::try_from(fraction.bytes().filter(|&b| b != b'_').count()).ok()?;
    let size: BigInt = digits.parse().ok()?;
    let size = if mantissa.starts_with('-') {
        -size
    } else {
        size
    };
    let value = BigRational::from(size) * power_of_ten(exponent - places);
    (value.is_zero() || Scientific::of(&value).is_some()).then_some(value)
}

/// Digits, with single underscores between them where TOML allows them.
fn is_digits(written: &str) -> bool {
    written.len() <= 2 * MOST_DIGITS
        && written
            .split('_')
            .all(|part| !part.is_empty() && part.bytes().all(|b| b.is_ascii_digit()))
}

fn read_exponent(written: &str) -> Option<i32> {
    let unsigned = written.strip_prefix(['-', '+']).unwrap_or(written);
    let short = unsigned.len() <= 5 && is_digits(unsigned);
    let size: i32 = short
        .then(|| unsigned.replace('_', "").parse().ok())
        .flatten()?;
    let size = (size <= 2 * MOST_EXPONENT).then_some(size)?;
    Some(if written.starts_with('-') {
        -size
    } else {
        size
    })
}

fn power_of_ten(exponent: i32) -> BigRational {
    let power: BigInt = BigInt::from(10).pow(exponent.unsigned_abs());
    if exponent < 0 {
        BigRational::new(BigInt::one(), power)
    } else {
        power.into()
    }
}

/// A nonzero number as digits times a power of ten, the digits not ending in 0.
struct Scientific {
    digits: BigInt,
    exponent: i32,
}

impl Scientific {
    /// `None` unless the number is a finite decimal within the bounds of this module.
    fn of(value: &BigRational) -> Option<Self> {
        let (ten, limit) = (BigInt::from(10), MOST_EXPONENT);
        let mut digits = value.numer().clone();
        let mut below = value.denom().clone();
        let mut exponent = 0;
        while !below.is_one() && exponent > -2 * limit {
            // Ten times the fraction takes a 2 and a 5 out of what stands below it.
            let common = below.gcd(&ten);
            if common.is_one() {
                return None;
            }
            digits *= &ten / &common;
            below /= common;
            exponent -= 1;
        }
        while digits.is_multiple_of(&ten) && exponent < 2 * limit {
            digits /= &ten;
            exponent += 1;
        }
        let short = digits.magnitude().to_string().len() <= MOST_DIGITS;
        (short && below.is_one() && exponent.abs() <= limit).then_some(Self { digits, exponent })
    }
}

/// A mass as it is handed over: text or an exact number.
#[derive(Clone, Debug, PartialEq, Eq)]
pub enum Mass {
    /// A decimal, `"1e12"`.
    Text(String),
    /// An exact number of GeV.
    Exact(BigRational),
}

impl Mass {
    /// The mass in GeV.
    pub(crate) fn read(self) -> Result<BigRational, Problem> {
        let value = match self {
            Self::Text(written) => read_decimal(&written)?,
            Self::Exact(value) => value,
        };
        if !value.is_positive() {
            return Err(Problem::MassNotPositive {
                written: value.to_string(),
            });
        }
        if Scientific::of(&value).is_none() {
            return Err(Problem::BadDecimal {
                written: shortened(&value.to_string()),
            });
        }
        Ok(value)
    }
}

impl From<&str> for Mass {
    fn from(written: &str) -> Self {
        Self::Text(written.to_owned())
    }
}

impl From<BigRational> for Mass {
    fn from(value: BigRational) -> Self {
        Self::Exact(value)
    }
}

impl From<u32> for Mass {
    fn from(value: u32) -> Self {
        Self::Exact(BigInt::from(value).into())
    }
}

/// The number as [`read_decimal`] reads it back exactly; `None` where no decimal within its
/// bounds is that number.
///
/// ```
/// let mass = model::read_decimal("7505e-1")?;
/// assert_eq!(model::write_decimal(&mass).as_deref(), Some("750.5"));
/// # Ok::<(), model::Problem>(())
/// ```
#[must_use]
pub fn write_decimal(value: &BigRational) -> Option<String> {
    if value.is_zero() {
        return Some("0".into());
    }
    let Scientific { digits, exponent } = Scientific::of(value)?;
    Some(match exponent {
        0..=6 => format!("{digits}{}", "0".repeat(exponent.unsigned_abs() as usize)),
        -6..0 => with_point(&digits, exponent.unsigned_abs() as usize),
        _ => format!("{digits}e{exponent}"),
    })
}

/// The digits with a point before the last `places` of them.
fn with_point(digits: &BigInt, places: usize) -> String {
    let sign = if digits.is_negative() { "-" } else { "" };
    let padded = format!(
        "{:0>width$}",
        digits.magnitude().to_string(),
        width = places + 1
    );
    let (whole, fraction) = padded.split_at(padded.len() - places);
    format!("{sign}{whole}.{fraction}")
}
