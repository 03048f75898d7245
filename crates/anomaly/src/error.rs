//! What keeps anomalies from being summed.

/// A charge that is written `"?"`: the sums that it enters have no value yet.
#[derive(Clone, Debug, PartialEq, Eq, thiserror::Error)]
#[error(
    "the charge of \"{multiplet}\" under \"{symmetry}\" is unknown (\"?\"), so its anomalies have \
     no value; write a number"
)]
pub struct UnknownCharge {
    /// Label of the multiplet.
    pub multiplet: String,
    /// Label of the symmetry.
    pub symmetry: String,
}

/// Why a spectrum has no [`Report`](crate::Report).
#[derive(Clone, Debug, PartialEq, Eq, thiserror::Error)]
pub enum ReportError {
    /// A charge is unknown.
    #[error(transparent)]
    UnknownCharge(#[from] UnknownCharge),
    /// The report would be too long to be of use, or to be held.
    #[error(
        "{conditions} anomaly conditions of {multiplets} multiplets are more than a report of \
         {most} shares holds; leave out U(1)s or multiplets, or ask for the bare verdict"
    )]
    TooLong {
        /// Number of conditions.
        conditions: usize,
        /// Number of multiplets.
        multiplets: usize,
        /// The most shares, one for each condition and multiplet, that a report has.
        most: usize,
    },
}
