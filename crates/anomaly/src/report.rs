//! Every condition of a spectrum.

use model::Spectrum;

use crate::{Anomaly, Condition, ReportError};

/// Every anomaly condition of a spectrum with its value.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Report {
    conditions: Vec<Condition>,
}

impl Report {
    /// The most shares, one for each condition and multiplet, that a report has.
    pub const MOST_SHARES: usize = 2_000_000;

    /// Sums every anomaly of `spectrum`.
    ///
    /// # Errors
    /// [`ReportError::TooLong`] beyond [`MOST_SHARES`](Self::MOST_SHARES);
    /// [`ReportError::UnknownCharge`] where a charge is written `"?"`.
    pub fn of(spectrum: &Spectrum) -> Result<Self, ReportError> {
        let (conditions, multiplets) =
            (Anomaly::all(spectrum).count(), spectrum.multiplets().len());
        if conditions.saturating_mul(multiplets) > Self::MOST_SHARES {
            return Err(ReportError::TooLong {
                conditions,
                multiplets,
                most: Self::MOST_SHARES,
            });
        }
        let conditions = Anomaly::all(spectrum).map(|anomaly| Condition::of(anomaly, spectrum));
        Ok(Self {
            conditions: conditions.collect::<Result<_, _>>()?,
        })
    }

    /// The conditions, in the order of [`Anomaly::all`].
    #[must_use]
    pub fn conditions(&self) -> &[Condition] {
        &self.conditions
    }

    /// The conditions that must hold and do not.
    pub fn violated(&self) -> impl Iterator<Item = &Condition> {
        self.conditions
            .iter()
            .filter(|condition| condition.is_violated())
    }

    /// Whether every condition that must hold does.
    #[must_use]
    pub fn is_consistent(&self) -> bool {
        self.violated().next().is_none()
    }
}
