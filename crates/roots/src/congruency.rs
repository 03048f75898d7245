//! The centre of the group, and the class of an irrep under it.

use std::fmt;

use crate::{CartanType, Family};

/// The centre of the simply connected group of a simple algebra.
///
/// ```
/// let so8: roots::SimpleAlgebra = "SO(8)".parse()?;
/// assert_eq!(so8.center().to_string(), "Z2 x Z2");
/// # Ok::<(), roots::Error>(())
/// ```
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum Center {
    /// Z(N); N = 1 where the centre is trivial.
    Cyclic(u32),
    /// Z2 x Z2, which SO(4k) alone has.
    FourGroup,
}

impl Center {
    pub(crate) const fn of(cartan_type: CartanType) -> Self {
        let rank = cartan_type.rank_u16() as u32;
        match cartan_type.family() {
            Family::A => Self::Cyclic(rank + 1),
            Family::B | Family::C => Self::Cyclic(2),
            Family::D if rank.is_multiple_of(2) => Self::FourGroup,
            Family::D => Self::Cyclic(4),
            Family::E => Self::Cyclic(9 - rank),
            Family::F | Family::G => Self::Cyclic(1),
        }
    }

    /// Number of elements, which is the determinant of the Cartan matrix.
    #[must_use]
    pub const fn order(self) -> u32 {
        match self {
            Self::Cyclic(order) => order,
            Self::FourGroup => 4,
        }
    }
}

impl fmt::Display for Center {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        match self {
            Self::Cyclic(1) => write!(f, "trivial"),
            Self::Cyclic(order) => write!(f, "Z{order}"),
            Self::FourGroup => write!(f, "Z2 x Z2"),
        }
    }
}

/// The congruency class of an irrep, [Slansky 1981].
///
/// Classes add up under products. For a centre Z(N) the class is a number modulo N; for SO(4k)
/// it is Slansky's pair, the first modulo 2, the second even and modulo 4.
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub enum Congruency {
    /// Modulo the order of a cyclic centre.
    Cyclic(u32),
    /// Slansky's pair for SO(4k).
    Pair(u32, u32),
}

impl fmt::Display for Congruency {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        match self {
            Self::Cyclic(class) => write!(f, "{class}"),
            Self::Pair(first, second) => write!(f, "({first},{second})"),
        }
    }
}

/// The class of the irrep with these labels.
pub(crate) fn congruency(cartan_type: CartanType, labels: &[u32]) -> Congruency {
    let modulo = |modulus: u32, terms: &mut dyn Iterator<Item = (u64, u32)>| {
        let modulus = u64::from(modulus);
        let class = terms.fold(0, |sum, (times, label)| {
            (sum + times % modulus * (u64::from(label) % modulus)) % modulus
        });
        u32::try_from(class).expect("a class is below its modulus")
    };
    let mut counted = (1u64..).zip(labels.iter().copied());
    let n = labels.len();
    match cartan_type.family() {
        Family::A => {
            Congruency::Cyclic(modulo(u32::from(cartan_type.rank_u16()) + 1, &mut counted))
        }
        Family::B => Congruency::Cyclic(labels[n - 1] % 2),
        Family::C => Congruency::Cyclic(modulo(2, &mut counted)),
        Family::D => {
            // 2 a_1 + 2 a_3 + ... over the chain, (n - 2) a_{n-1} + n a_n at its end.
            let chain = labels[..n - 2].iter().step_by(2).map(|&label| (2, label));
            let ends = [(n as u64 - 2, labels[n - 2]), (n as u64, labels[n - 1])];
            let second = modulo(4, &mut chain.chain(ends));
            if n % 2 == 1 {
                Congruency::Cyclic(second)
            } else {
                let ends = labels[n - 2..].iter().map(|&label| (1, label));
                Congruency::Pair(modulo(2, &mut ends.into_iter()), second)
            }
        }
        Family::E if n == 6 => {
            let times = [1, 2, 0, 1, 2, 0];
            Congruency::Cyclic(modulo(
                3,
                &mut times.into_iter().zip(labels.iter().copied()),
            ))
        }
        Family::E if n == 7 => {
            let times = [0, 0, 0, 1, 0, 1, 1];
            Congruency::Cyclic(modulo(
                2,
                &mut times.into_iter().zip(labels.iter().copied()),
            ))
        }
        Family::E | Family::F | Family::G => Congruency::Cyclic(0),
    }
}
