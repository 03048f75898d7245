//! Published tables, as files under `data/`.

use std::path::PathBuf;

use serde::Deserialize;
use serde::de::DeserializeOwned;

/// A published table of irreps of one algebra.
#[derive(Clone, Debug, Deserialize)]
#[serde(deny_unknown_fields)]
pub struct IrrepTable {
    /// Name of the algebra.
    pub algebra: String,
    /// Its Cartan type, such as "A4".
    pub cartan_type: String,
    /// The publication.
    pub source: String,
    /// How the entries were had: "from memory" or a copy of the publication.
    pub had: String,
    /// The irreps in the table's order.
    pub irreps: Vec<IrrepEntry>,
}

/// One line of a table of irreps.
#[derive(Clone, Debug, Deserialize)]
#[serde(deny_unknown_fields)]
pub struct IrrepEntry {
    /// Dynkin labels of the highest weight.
    pub labels: Vec<u32>,
    /// Its name.
    pub name: String,
    /// Its dimension.
    pub dimension: u64,
    /// Its Dynkin index; absent where it is not remembered.
    pub index: Option<u64>,
    /// Its congruency class; absent where it is not remembered.
    pub class: Option<String>,
}

fn data() -> PathBuf {
    PathBuf::from(env!("CARGO_MANIFEST_DIR")).join("data")
}

/// Reads one table.
///
/// # Panics
/// Where the file is missing or is not a table of that shape: a check without its table must
/// fail.
#[must_use]
pub fn read<T: DeserializeOwned>(file: &str) -> T {
    let path = data().join(file);
    let text = std::fs::read_to_string(&path)
        .unwrap_or_else(|error| panic!("{}: {error}", path.display()));
    toml::from_str(&text).unwrap_or_else(|error| panic!("{}: {error}", path.display()))
}

/// Names of the files under `data/` that begin so.
///
/// # Panics
/// Where the folder cannot be read.
#[must_use]
pub fn files(prefix: &str) -> Vec<String> {
    let entries = std::fs::read_dir(data()).expect("the data folder is there");
    let mut names: Vec<String> = entries
        .map(|entry| {
            entry
                .expect("readable")
                .file_name()
                .to_string_lossy()
                .into_owned()
        })
        .filter(|name| name.starts_with(prefix))
        .collect();
    names.sort();
    names
}

/// Electric charges of quarks and leptons, as the Review of Particle Physics has them.
#[derive(Clone, Debug, Deserialize)]
#[serde(deny_unknown_fields)]
pub struct ChargeTable {
    /// The publication and its edition.
    pub source: String,
    /// The packages that carry it, with their versions.
    pub packages: Vec<String>,
    /// Quarks and leptons.
    pub particles: Vec<ChargeEntry>,
}

/// One quark or lepton.
#[derive(Clone, Debug, Deserialize)]
#[serde(deny_unknown_fields)]
pub struct ChargeEntry {
    /// Its name in the Review.
    pub name: String,
    /// Its number in the Review's numbering scheme.
    pub number: i32,
    /// "up-type quark", "down-type quark", "neutrino" or "charged lepton".
    pub kind: String,
    /// Its charge in units of the positron's, as a fraction.
    pub charge: String,
}
