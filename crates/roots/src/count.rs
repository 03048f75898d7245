//! The whole numbers that multiplicities are counted in: as wide as the answer needs.

use std::fmt::Debug;
use std::ops::{AddAssign, Neg};

use num_bigint::BigInt;
use num_integer::Integer;
use num_traits::{CheckedAdd, CheckedMul, CheckedSub, FromPrimitive, ToPrimitive};

/// `i64`, `i128` or [`BigInt`]: a count starts narrow and goes one wider where a checked
/// operation says that it must.
pub(crate) trait Count:
    Clone
    + Debug
    + Integer
    + CheckedAdd
    + CheckedSub
    + CheckedMul
    + FromPrimitive
    + ToPrimitive
    + Default
    + Send
    + Sync
    + 'static
    + AddAssign
    + Neg<Output = Self>
    + Into<BigInt>
{
    /// From a machine integer, which every width holds.
    fn of(value: i64) -> Self;

    /// From an exact number; `None` where it does not fit.
    fn read(value: &BigInt) -> Option<Self>;

    /// `self + left * right`; `None` where it does not fit.
    fn plus_product(&self, left: &Self, right: &Self) -> Option<Self> {
        self.checked_add(&left.checked_mul(right)?)
    }
}

impl Count for i64 {
    fn of(value: i64) -> Self {
        value
    }

    fn read(value: &BigInt) -> Option<Self> {
        value.try_into().ok()
    }
}

impl Count for i128 {
    fn of(value: i64) -> Self {
        value.into()
    }

    fn read(value: &BigInt) -> Option<Self> {
        value.try_into().ok()
    }
}

impl Count for BigInt {
    fn of(value: i64) -> Self {
        value.into()
    }

    fn read(value: &BigInt) -> Option<Self> {
        Some(value.clone())
    }
}

/// The value of `$run`, an `Option` computed with `$count` as the type that counts, in the
/// narrowest type for which it is not `None`.
macro_rules! in_width {
    ($count:ident => $run:expr) => {{
        let narrow = {
            type $count = i64;
            $run
        };
        let wide = match narrow {
            Some(done) => Some(done),
            None => {
                type $count = i128;
                $run
            }
        };
        match wide {
            Some(done) => done,
            None => {
                type $count = num_bigint::BigInt;
                $run.expect("nothing overflows in numbers of any size")
            }
        }
    }};
}
pub(crate) use in_width;
