//! The `gaugewright` command: what was typed becomes a request, its answer is printed.

mod arguments;
mod batch;
mod complaint;
mod exit_status;
mod model_input;
mod output;

use std::process::ExitCode;

use clap::Parser;

use arguments::{Arguments, Command};
use exit_status::ExitStatus;
use gaugewright::Failure;
use output::Output;

fn main() -> ExitCode {
    let arguments = Arguments::parse();
    let output = Output::new(arguments.format);
    match run(arguments, &output) {
        Ok(status) => status.into(),
        Err(failure) => output.refuse(&failure).into(),
    }
}

fn run(arguments: Arguments, output: &Output) -> Result<ExitStatus, Failure> {
    let numbering = arguments.numbering;
    match arguments.command {
        Command::Batch { file } => batch::run(&file, numbering),
        other => {
            let answer = other.request()?.answer(numbering)?;
            output.print(answer.as_ref())?;
            Ok(if answer.is_refusal() {
                ExitStatus::NotConsistent
            } else {
                ExitStatus::Done
            })
        }
    }
}
