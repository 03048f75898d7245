//! Verdicts of the example models, and statements in print about what cancels.

mod charges;
mod discrete;
mod parity;
mod statements;
mod verdicts;

use std::path::PathBuf;

use anomaly::{Condition, Report};
use model::{Field, Model, Multiplet, MultipletDraft, Spectrum, Symmetry};

/// The example of that name, `broken/...` among them.
pub(crate) fn example(name: &str) -> Model {
    let directory = PathBuf::from(env!("CARGO_MANIFEST_DIR")).join("../docs/models");
    let path = directory.join(format!("{name}.toml"));
    let text = std::fs::read_to_string(&path).unwrap_or_else(|error| panic!("{name}: {error}"));
    Model::from_toml(&text).unwrap_or_else(|error| panic!("{name}: {error}"))
}

/// Names of all examples in a subdirectory, in order.
pub(crate) fn examples(subdirectory: &str) -> Vec<String> {
    let directory = PathBuf::from(env!("CARGO_MANIFEST_DIR")).join("../docs/models");
    let entries = std::fs::read_dir(directory.join(subdirectory)).unwrap();
    let names = entries.filter_map(|entry| {
        let name = entry.unwrap().file_name().into_string().unwrap();
        Some(format!("{subdirectory}{}", name.strip_suffix(".toml")?))
    });
    let mut names: Vec<String> = names.collect();
    names.sort();
    names
}

/// A spectrum under gauged symmetries, by label and group.
pub(crate) fn gauged(symmetries: &[(&str, &str)]) -> Spectrum {
    let symmetries = symmetries.iter();
    let symmetries =
        symmetries.map(|(label, group)| Symmetry::gauge(*label, group.parse().unwrap()));
    Spectrum::new(symmetries).unwrap()
}

/// A left-handed fermion.
pub(crate) fn left(label: impl Into<String>) -> MultipletDraft {
    Multiplet::draft(label, Field::LeftHandedFermion)
}

/// The condition of that name.
pub(crate) fn condition(report: &Report, name: &str) -> Condition {
    let found = report.conditions().iter().find(|one| one.name() == name);
    found
        .unwrap_or_else(|| panic!("no condition {name}"))
        .clone()
}

/// The value of the condition of that name.
pub(crate) fn value(spectrum: &Spectrum, name: &str) -> String {
    let report = Report::of(spectrum).unwrap();
    condition(&report, name).value().to_string()
}

/// Whether everything cancels; the report and the bare verdict must agree.
pub(crate) fn consistent(spectrum: &Spectrum) -> bool {
    let report = Report::of(spectrum).unwrap();
    assert_eq!(anomaly::is_consistent(spectrum), Ok(report.is_consistent()));
    report.is_consistent()
}
