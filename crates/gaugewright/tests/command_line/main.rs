//! The `gaugewright` command as its users and their scripts meet it: the built program is run, and
//! held to what it promises about streams, exit status, JSON, bad input, batches, LaTeX and
//! screens, and to every example that the documentation prints.

mod audits;
mod bad_input;
mod bad_models;
mod batch;
mod conventions;
mod documentation;
mod json_keys;
mod latex;
mod numbering;
mod run;
mod screens;
mod streams;
