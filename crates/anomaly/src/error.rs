//! What keeps an anomaly from being summed.

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
