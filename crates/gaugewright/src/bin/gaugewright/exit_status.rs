//! The exit statuses, in one place.

use std::process::ExitCode;

/// How a run ended.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub(crate) enum ExitStatus {
    /// Done.
    Done,
    /// Done, and the answer is "not consistent".
    NotConsistent,
    /// Unusable input; nothing was printed on standard output.
    Unusable,
}

impl From<ExitStatus> for ExitCode {
    fn from(status: ExitStatus) -> Self {
        Self::from(match status {
            ExitStatus::Done => 0,
            ExitStatus::NotConsistent => 1,
            ExitStatus::Unusable => 2,
        })
    }
}
