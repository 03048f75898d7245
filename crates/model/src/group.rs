//! The group of one symmetry: simple, U(1) or Z(N).

use std::fmt;
use std::str::FromStr;

use roots::{Factor, ReductiveAlgebra, SimpleAlgebra};

use crate::Problem;
use crate::suggestion::shortened;

/// The number of elements of a cyclic group, at least 2.
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub struct CyclicOrder(u32);

impl CyclicOrder {
    /// The order `n`, unless it is 0 or 1.
    #[must_use]
    pub const fn new(n: u32) -> Option<Self> {
        if n >= 2 { Some(Self(n)) } else { None }
    }

    /// The order as a number.
    #[must_use]
    pub const fn get(self) -> u32 {
        self.0
    }
}

/// The group of one symmetry.
///
/// ```
/// use model::Group;
/// assert_eq!("su3".parse::<Group>()?.to_string(), "SU(3)");
/// assert_eq!("Z3".parse::<Group>()?, Group::cyclic(3)?);
/// # Ok::<(), model::Problem>(())
/// ```
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub enum Group {
    /// A simple group, by its algebra.
    Simple(SimpleAlgebra),
    /// U(1).
    U1,
    /// Z(N), whose charges are whole numbers mod N.
    Discrete(CyclicOrder),
}

impl Group {
    /// Z(n).
    ///
    /// # Errors
    /// [`Problem::BadCyclicOrder`] for n = 0 and 1.
    pub fn cyclic(n: u32) -> Result<Self, Problem> {
        let order = CyclicOrder::new(n).ok_or_else(|| Problem::BadCyclicOrder {
            written: format!("Z({n})"),
        })?;
        Ok(Self::Discrete(order))
    }

    /// The algebra, where the group is simple.
    #[must_use]
    pub const fn simple(self) -> Option<SimpleAlgebra> {
        match self {
            Self::Simple(algebra) => Some(algebra),
            Self::U1 | Self::Discrete(_) => None,
        }
    }

    /// Whether it is U(1).
    #[must_use]
    pub const fn is_u1(self) -> bool {
        matches!(self, Self::U1)
    }
}

impl From<SimpleAlgebra> for Group {
    fn from(algebra: SimpleAlgebra) -> Self {
        Self::Simple(algebra)
    }
}

impl fmt::Display for Group {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        match self {
            Self::Simple(algebra) => algebra.fmt(f),
            Self::U1 => f.write_str("U(1)"),
            Self::Discrete(order) => write!(f, "Z({})", order.get()),
        }
    }
}

impl FromStr for Group {
    type Err = Problem;

    /// Reads `SU(3)`, `su3`, `U(1)`, `Z(3)`, `Z3`: case and brackets are optional.
    fn from_str(written: &str) -> Result<Self, Problem> {
        if let Some(digits) = cyclic_digits(written.trim()) {
            return digits.parse().map_or_else(
                |_| {
                    Err(Problem::BadCyclicOrder {
                        written: shortened(written),
                    })
                },
                Self::cyclic,
            );
        }
        match written.parse() {
            Ok(Factor::Simple(algebra)) => Ok(Self::Simple(algebra)),
            Ok(Factor::U1) => Ok(Self::U1),
            Err(_) if is_product(written) => Err(Problem::ProductGroup {
                written: shortened(written),
            }),
            Err(roots::Error::UnknownAlgebra { written, .. }) => {
                Err(Problem::Roots(roots::Error::UnknownAlgebra {
                    written: shortened(&written),
                    also: "U(1) or Z(N)",
                }))
            }
            Err(other) => Err(other.into()),
        }
    }
}

/// The digits of `Z(12)` or `z12`.
fn cyclic_digits(written: &str) -> Option<&str> {
    let rest = written.strip_prefix(['Z', 'z'])?.trim();
    let digits = rest
        .strip_prefix('(')
        .map_or(Some(rest), |open| open.strip_suffix(')'))?
        .trim();
    (!digits.is_empty() && digits.bytes().all(|b| b.is_ascii_digit())).then_some(digits)
}

fn is_product(written: &str) -> bool {
    const MOST: usize = 1000;
    let product: Option<ReductiveAlgebra> = (written.len() <= MOST)
        .then(|| written.parse().ok())
        .flatten();
    product.is_some_and(|product| product.factors().len() > 1)
}
