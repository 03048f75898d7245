//! Reports: what is said is put together once, as a [`Page`], and printed as text or LaTeX; the
//! same answer serialises to JSON.

mod json;
mod latex;
mod page;
mod phrase;
mod text;

pub use json::{Exact, Whole, to_json_line};
pub use page::{Align, Block, Page, Table, Verdict};
pub use phrase::{Inline, Phrase};
pub use text::Colour;
