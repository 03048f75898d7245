//! Where answers and refusals are printed.

use std::io::{self, ErrorKind, Write};

use anstream::ColorChoice;
use gaugewright::Failure;
use gaugewright::answer::Answer;
use gaugewright::report::Colour;

use crate::arguments::Format;
use crate::complaint::complaint;
use crate::exit_status::ExitStatus;

/// Prints in one format.
#[derive(Clone, Copy, Debug)]
pub(crate) struct Output {
    format: Format,
}

impl Output {
    pub(crate) const fn new(format: Format) -> Self {
        Self { format }
    }

    /// Prints an answer on standard output.
    pub(crate) fn print(self, answer: &dyn Answer) -> Result<(), Failure> {
        let stdout = io::stdout();
        let written = match self.format {
            Format::Json => answer.json() + "\n",
            Format::Latex => answer.page().to_latex(),
            Format::Text => answer.page().to_text(colour_of(&stdout)),
        };
        write_all(stdout.lock(), &written)
    }

    /// Says on standard error what was wrong.
    pub(crate) fn refuse(self, failure: &Failure) -> ExitStatus {
        // A standard error that is closed leaves nowhere to say it; the exit status still does.
        let stderr = io::stderr();
        let colour = anstream::AutoStream::choice(&stderr) != ColorChoice::Never;
        let _ = writeln!(stderr.lock(), "{}", complaint(failure, colour));
        ExitStatus::Unusable
    }
}

/// Colour only for a terminal, and only where `NO_COLOR` and the like do not forbid it.
fn colour_of(stream: &io::Stdout) -> Colour {
    match anstream::AutoStream::choice(stream) {
        ColorChoice::Never => Colour::Plain,
        _ => Colour::Ansi,
    }
}

/// Writes everything; a reader who has had enough, such as `head`, is no failure.
pub(crate) fn write_all(mut out: impl Write, written: &str) -> Result<(), Failure> {
    match out.write_all(written.as_bytes()).and_then(|()| out.flush()) {
        Err(error) if error.kind() != ErrorKind::BrokenPipe => Err(Failure::Output(error)),
        _ => Ok(()),
    }
}
