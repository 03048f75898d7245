//! One condition with its value: what each multiplet adds, and whether the sum cancels.

use model::{Group, Spectrum};
use num_bigint::BigInt;
use num_integer::Integer;
use num_rational::BigRational;
use num_traits::Zero;

use crate::{Anomaly, Kind, UnknownCharge};

/// When a sum counts as cancelled.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum Rule {
    /// The sum is zero.
    Zero,
    /// The sum is a multiple of this number: 2 for a parity, N or N/2 for a Z(N).
    MultipleOf(u32),
}

impl Rule {
    /// The rule of `anomaly`.
    ///
    /// # Source
    /// A parity: [Witten 1982]. Z(N) with a gauge group and with gravity, where for even N heavy
    /// Majorana fermions of charge N/2 leave only N/2: [Ibanez-Ross 1991].
    #[must_use]
    pub fn of(anomaly: Anomaly, spectrum: &Spectrum) -> Self {
        let order = |place: usize| match spectrum.symmetries()[place].group() {
            Group::Discrete(order) => order.get(),
            Group::Simple(_) | Group::U1 => 0,
        };
        match anomaly {
            Anomaly::Parity(_) => Self::MultipleOf(2),
            Anomaly::GaugeSquaredDiscrete { discrete, .. } => Self::MultipleOf(order(discrete)),
            Anomaly::GravityDiscrete(discrete) => match order(discrete) {
                even if even.is_multiple_of(2) => Self::MultipleOf(even / 2),
                odd => Self::MultipleOf(odd),
            },
            Anomaly::GaugeCubed(_)
            | Anomaly::GaugeSquaredCharge { .. }
            | Anomaly::Charges(_)
            | Anomaly::GravityCharge(_) => Self::Zero,
        }
    }

    pub(crate) fn admits_small(self, sum: i128) -> bool {
        match self {
            Self::Zero => sum == 0,
            Self::MultipleOf(modulus) => sum % i128::from(modulus) == 0,
        }
    }

    pub(crate) fn admits(self, sum: &BigRational) -> bool {
        match self {
            Self::Zero => sum.is_zero(),
            Self::MultipleOf(modulus) => {
                sum.is_integer() && sum.numer().is_multiple_of(&BigInt::from(modulus))
            }
        }
    }
}

/// One anomaly of a spectrum, summed.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Condition {
    anomaly: Anomaly,
    name: String,
    factors: Vec<String>,
    value: BigRational,
    /// One per multiplet of the spectrum, in its order.
    contributions: Vec<BigRational>,
    rule: Rule,
    must_cancel: bool,
}

impl Condition {
    /// Sums `anomaly` over `spectrum`.
    ///
    /// # Errors
    /// [`UnknownCharge`] where a charge that enters is written `"?"`.
    pub fn of(anomaly: Anomaly, spectrum: &Spectrum) -> Result<Self, UnknownCharge> {
        let mut contributions = Vec::with_capacity(spectrum.multiplets().len());
        for multiplet in spectrum.multiplets() {
            let share = anomaly.share(multiplet).map_err(|place| UnknownCharge {
                multiplet: multiplet.label().to_owned(),
                symmetry: spectrum.symmetries()[place].label().to_owned(),
            })?;
            contributions.push(share);
        }
        Ok(Self {
            anomaly,
            name: anomaly.name(spectrum),
            factors: anomaly.factors(spectrum),
            value: contributions.iter().sum(),
            contributions,
            rule: Rule::of(anomaly, spectrum),
            must_cancel: anomaly.must_cancel(spectrum),
        })
    }

    /// Which anomaly it is.
    #[must_use]
    pub const fn anomaly(&self) -> Anomaly {
        self.anomaly
    }

    /// Its name, e.g. `colour^2 hypercharge`.
    #[must_use]
    pub fn name(&self) -> &str {
        &self.name
    }

    /// Its kind.
    #[must_use]
    pub const fn kind(&self) -> Kind {
        self.anomaly.kind()
    }

    /// Labels of the symmetries in it, with repetition, and "gravity".
    #[must_use]
    pub fn factors(&self) -> &[String] {
        &self.factors
    }

    /// The symmetries in it as a product of powers: labels, in brackets where they are not one
    /// word, with their exponents.
    #[must_use]
    pub fn powers(&self) -> Vec<(String, usize)> {
        crate::anomaly::powers(&self.factors)
    }

    /// The sum.
    #[must_use]
    pub const fn value(&self) -> &BigRational {
        &self.value
    }

    /// What each multiplet of the spectrum adds, in its order; scalars add 0.
    #[must_use]
    pub fn contributions(&self) -> &[BigRational] {
        &self.contributions
    }

    /// When the sum counts as cancelled.
    #[must_use]
    pub const fn rule(&self) -> Rule {
        self.rule
    }

    /// Whether the sum cancels.
    #[must_use]
    pub fn cancels(&self) -> bool {
        self.rule.admits(&self.value)
    }

    /// Whether it must: every symmetry in it is gauged. Where a global one takes part the sum is
    /// a 't Hooft anomaly, or tells which gauge group breaks it.
    #[must_use]
    pub const fn must_cancel(&self) -> bool {
        self.must_cancel
    }

    /// Whether it stands against the model.
    #[must_use]
    pub fn is_violated(&self) -> bool {
        self.must_cancel && !self.cancels()
    }
}
