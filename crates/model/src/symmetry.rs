//! Labelled symmetries, gauged or global.

use std::fmt;

use crate::Group;

/// A symmetry of the model: a group under a label, gauged or global.
///
/// The label is checked where the symmetry enters a [`Spectrum`](crate::Spectrum).
///
/// ```
/// use model::{Group, Symmetry};
/// let lepton_number = Symmetry::global("lepton number", Group::U1);
/// assert!(!lepton_number.is_gauged());
/// assert_eq!(lepton_number.to_string(), "lepton number: U(1), global");
/// ```
#[derive(Clone, Debug, PartialEq, Eq, Hash)]
pub struct Symmetry {
    label: String,
    group: Group,
    gauged: bool,
}

impl Symmetry {
    /// A gauged symmetry.
    #[must_use]
    pub fn gauge(label: impl Into<String>, group: Group) -> Self {
        Self {
            label: label.into(),
            group,
            gauged: true,
        }
    }

    /// A global symmetry: its own anomalies need not cancel.
    #[must_use]
    pub fn global(label: impl Into<String>, group: Group) -> Self {
        Self {
            label: label.into(),
            group,
            gauged: false,
        }
    }

    /// The label.
    #[must_use]
    pub fn label(&self) -> &str {
        &self.label
    }

    /// The group.
    #[must_use]
    pub const fn group(&self) -> Group {
        self.group
    }

    /// Whether it is gauged.
    #[must_use]
    pub const fn is_gauged(&self) -> bool {
        self.gauged
    }
}

impl fmt::Display for Symmetry {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        let kind = if self.gauged { "" } else { ", global" };
        write!(f, "{}: {}{kind}", self.label, self.group)
    }
}
