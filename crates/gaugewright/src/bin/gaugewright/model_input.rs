//! Model files: found, read and handed to the library.

use std::fs::File;
use std::io::{self, ErrorKind, Read};
use std::path::Path;

use gaugewright::Failure;
use gaugewright::request::ModelText;
use model::{MOST_FILE_BYTES, Model};

/// Reads a model file; - is standard input.
pub(crate) fn read(path: &Path) -> Result<ModelText, Failure> {
    let unreadable = |why: &dyn ToString| Failure::UnreadableModel {
        path: path.to_owned(),
        why: why.to_string(),
    };
    let bytes = read_bounded(path).map_err(|error| unreadable(&error))?;
    if bytes.len() > MOST_FILE_BYTES {
        return Err(unreadable(&format!(
            "it is larger than {} MiB",
            MOST_FILE_BYTES >> 20
        )));
    }
    let text = String::from_utf8(bytes).map_err(|_| unreadable(&"it is not UTF-8 text"))?;
    let model = Model::from_toml(&text).map_err(|error| Failure::ModelFile {
        path: path.to_owned(),
        error,
    })?;
    Ok(ModelText::Read(Box::new(model)))
}

/// The bytes of the file, but no more than one above the most that a model may have.
fn read_bounded(path: &Path) -> io::Result<Vec<u8>> {
    let mut bytes = Vec::new();
    let most = MOST_FILE_BYTES as u64 + 1;
    if path == Path::new("-") {
        io::stdin().lock().take(most).read_to_end(&mut bytes)?;
        return Ok(bytes);
    }
    let file = File::open(path)?;
    if file.metadata()?.is_dir() {
        return Err(ErrorKind::IsADirectory.into());
    }
    file.take(most).read_to_end(&mut bytes)?;
    Ok(bytes)
}
