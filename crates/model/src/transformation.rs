//! What a multiplet is under one symmetry.

use std::fmt;

use num_bigint::BigInt;
use num_integer::Integer;
use num_rational::BigRational;
use num_traits::{ToPrimitive, Zero};
use roots::Irrep;

use crate::irrep_memo::IrrepMemo;
use crate::suggestion::shortened;
use crate::{CyclicOrder, Group, Problem, read_decimal};

/// What a multiplet is under one symmetry.
#[derive(Clone, Debug, PartialEq, Eq, Hash)]
pub enum Transformation {
    /// An irrep of a simple group.
    Irrep(Irrep),
    /// A charge under a U(1).
    Charge(BigRational),
    /// A charge under a U(1) that is to be found, `"?"`.
    UnknownCharge,
    /// A charge under Z(N), from 0 to N - 1.
    Discrete(u32),
}

impl Transformation {
    /// The one that changes nothing: singlet, or charge 0.
    #[must_use]
    pub fn trivial(group: Group) -> Self {
        match group {
            Group::Simple(algebra) => Self::Irrep(algebra.singlet()),
            Group::U1 => Self::Charge(BigRational::zero()),
            Group::Discrete(_) => Self::Discrete(0),
        }
    }

    /// Whether it changes nothing. An unknown charge is not trivial.
    #[must_use]
    pub fn is_trivial(&self) -> bool {
        match self {
            Self::Irrep(irrep) => irrep.is_singlet(),
            Self::Charge(charge) => charge.is_zero(),
            Self::UnknownCharge => false,
            Self::Discrete(charge) => *charge == 0,
        }
    }
}

/// The name of the irrep, or the charge; `?` where it is unknown.
///
/// # Cost
/// For an irrep that of [`Irrep::name`].
impl fmt::Display for Transformation {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        match self {
            Self::Irrep(irrep) => f.write_str(&irrep.name()),
            Self::Charge(charge) => charge.fmt(f),
            Self::UnknownCharge => f.write_str("?"),
            Self::Discrete(charge) => charge.fmt(f),
        }
    }
}

/// A transformation as it is handed over, before it is known under which group.
#[derive(Clone, Debug, PartialEq, Eq)]
pub enum Written {
    /// The name or labels of an irrep, a charge, or `?`.
    Text(String),
    /// A whole number as a charge.
    Whole(BigInt),
    /// An irrep.
    Irrep(Irrep),
    /// A charge under a U(1).
    Charge(BigRational),
}

impl Written {
    /// What it is under `group`.
    pub(crate) fn read(
        self,
        group: Group,
        memo: &mut IrrepMemo,
    ) -> Result<Transformation, Problem> {
        match group {
            Group::Simple(algebra) => match self {
                Self::Text(written) => memo.read(algebra, &written).map(Transformation::Irrep),
                Self::Irrep(irrep) if irrep.algebra() == algebra => {
                    Ok(Transformation::Irrep(irrep))
                }
                other => Err(other.wrong_kind(group)),
            },
            Group::U1 => match self {
                Self::Text(written) => read_charge(&written),
                Self::Whole(charge) => bounded(charge.into()).map(Transformation::Charge),
                Self::Charge(charge) => bounded(charge).map(Transformation::Charge),
                Self::Irrep(_) => Err(self.wrong_kind(group)),
            },
            Group::Discrete(order) => match self {
                Self::Text(written) => read_discrete(&written, group, order),
                Self::Whole(charge) => Ok(reduced(&charge, order)),
                Self::Charge(charge) if charge.is_integer() => Ok(reduced(charge.numer(), order)),
                other => Err(other.wrong_kind(group)),
            },
        }
    }

    fn wrong_kind(&self, group: Group) -> Problem {
        let found = match self {
            Self::Text(written) => format!("\"{}\"", shortened(written)),
            Self::Whole(whole) => format!("the number {}", shortened(&whole.to_string())),
            Self::Irrep(irrep) => format!("the irrep {} of {}", irrep.bracketed(), irrep.algebra()),
            Self::Charge(charge) => format!("the charge {}", shortened(&charge.to_string())),
        };
        let expected = match (group, self) {
            (Group::Simple(_), Self::Whole(whole)) => format!(
                "an irrep in quotation marks, \"{}\" or labels in brackets",
                shortened(&whole.to_string())
            ),
            (Group::Simple(algebra), _) => format!("an irrep of {algebra}"),
            (Group::U1, _) => "a charge such as \"1/6\"".into(),
            (Group::Discrete(_), _) => "a whole number".into(),
        };
        Problem::WrongKind {
            found,
            group: group.to_string(),
            expected,
        }
    }
}

fn read_charge(written: &str) -> Result<Transformation, Problem> {
    if written.trim() == "?" {
        return Ok(Transformation::UnknownCharge);
    }
    read_fraction(written).map(Transformation::Charge)
}

/// A whole number or fraction; a decimal is an error that says which fraction it is.
pub(crate) fn read_fraction(written: &str) -> Result<BigRational, Problem> {
    roots::read_rational(written).map_err(|error| match read_decimal(written) {
        Ok(value) => Problem::DecimalCharge {
            written: shortened(written.trim()),
            fraction: value.to_string(),
        },
        Err(_) => error.into(),
    })
}

/// The number, unless it has more digits than a model file can hold.
pub(crate) fn bounded(value: BigRational) -> Result<BigRational, Problem> {
    // Sixty digits take no more than 200 bits; what has far more is not spelt out.
    let bits = value.numer().bits().max(value.denom().bits());
    let short = bits <= 256 && roots::read_rational(&value.to_string()).is_ok();
    if short {
        return Ok(value);
    }
    Err(Problem::TooManyDigits)
}

fn read_discrete(
    written: &str,
    group: Group,
    order: CyclicOrder,
) -> Result<Transformation, Problem> {
    let charge = roots::read_rational(written).ok();
    let whole = charge.filter(BigRational::is_integer);
    whole.map_or_else(
        || {
            Err(Problem::BadDiscreteCharge {
                written: shortened(written),
                group: group.to_string(),
            })
        },
        |charge| Ok(reduced(charge.numer(), order)),
    )
}

fn reduced(charge: &BigInt, order: CyclicOrder) -> Transformation {
    let rest = charge.mod_floor(&BigInt::from(order.get()));
    Transformation::Discrete(rest.to_u32().expect("a remainder is below its modulus"))
}

impl From<&str> for Written {
    fn from(written: &str) -> Self {
        Self::Text(written.to_owned())
    }
}

impl From<String> for Written {
    fn from(written: String) -> Self {
        Self::Text(written)
    }
}

impl From<i32> for Written {
    fn from(charge: i32) -> Self {
        Self::Whole(charge.into())
    }
}

impl From<i64> for Written {
    fn from(charge: i64) -> Self {
        Self::Whole(charge.into())
    }
}

impl From<u32> for Written {
    fn from(charge: u32) -> Self {
        Self::Whole(charge.into())
    }
}

impl From<BigInt> for Written {
    fn from(charge: BigInt) -> Self {
        Self::Whole(charge)
    }
}

impl From<Irrep> for Written {
    fn from(irrep: Irrep) -> Self {
        Self::Irrep(irrep)
    }
}

impl From<BigRational> for Written {
    fn from(charge: BigRational) -> Self {
        Self::Charge(charge)
    }
}

impl From<Transformation> for Written {
    fn from(transformation: Transformation) -> Self {
        match transformation {
            Transformation::Irrep(irrep) => Self::Irrep(irrep),
            Transformation::Charge(charge) => Self::Charge(charge),
            Transformation::UnknownCharge => Self::Text("?".into()),
            Transformation::Discrete(charge) => Self::Whole(charge.into()),
        }
    }
}
