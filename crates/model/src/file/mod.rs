//! The model file: TOML, or JSON of the same shape, read by one set of rules.
//!
//! Text becomes a tree of [`node`]s that remember where they stood; [`read`] turns the tree into
//! a model by way of the same checks that a model built in code passes.

mod diagnostic;
mod fields;
mod node;
mod read;
mod toml_syntax;
mod write;

pub use diagnostic::ModelFileError;

use crate::Model;
use node::Node;

/// Bytes that a model file may have: 4 MiB.
pub const MOST_FILE_BYTES: usize = 4 << 20;

impl Model {
    /// Reads the text of a model file.
    ///
    /// # Errors
    /// The first thing wrong with it: what, on which line and column, and what to write instead.
    /// More than [`MOST_FILE_BYTES`] are refused.
    ///
    /// ```
    /// let text = r#"
    /// [[symmetry]]
    /// label = "colour"
    /// algebra = "SU(3)"
    ///
    /// [[multiplet]]
    /// label = "quark"
    /// field = "left-handed fermion"
    /// transforms = { color = "3" }
    /// "#;
    /// assert_eq!(
    ///     model::Model::from_toml(text).unwrap_err().to_string(),
    ///     "line 9, column 16: no symmetry has the label \"color\"; \
    ///      did you mean \"colour\"? write \"colour\"",
    /// );
    /// ```
    pub fn from_toml(text: &str) -> Result<Self, ModelFileError> {
        let root = toml_syntax::parse(text)?;
        read::model(&root).map_err(|fault| fault.in_text(&root, text))
    }

    /// Reads a model from JSON of the model file's shape.
    ///
    /// # Errors
    /// As [`from_toml`](Self::from_toml), with the path of the value instead of a line.
    ///
    /// ```
    /// let value = serde_json::json!({
    ///     "symmetry": [{"label": "colour", "algebra": "SU(3)"}],
    ///     "multiplet": [{
    ///         "label": "quark",
    ///         "field": "left-handed fermion",
    ///         "transforms": {"colour": "7"},
    ///     }],
    /// });
    /// let error = model::Model::from_json(&value).unwrap_err();
    /// assert_eq!(error.path(), "multiplet[0].transforms.colour");
    /// ```
    pub fn from_json(value: &serde_json::Value) -> Result<Self, ModelFileError> {
        let root = Node::from_json(value)?;
        read::model(&root).map_err(|fault| fault.in_json(&root))
    }

    /// The model as the text of a model file, which reads back as the same model.
    ///
    /// # Cost
    /// Finds the name of each irrep.
    #[must_use]
    pub fn to_toml(&self) -> String {
        write::model(self)
    }
}
