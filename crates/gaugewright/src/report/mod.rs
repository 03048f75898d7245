//! Reports: what is said is put together once, as a [`Page`], and printed as text or LaTeX; the
//! same answer serialises to JSON.

mod harmless;
mod json;
mod latex;
mod latex_words;
mod page;
mod phrase;
mod text;

pub use harmless::{acts_on_terminals, brief, harmless};
pub use json::{Exact, Whole, to_json_line};
pub use page::{Align, Block, Page, Table, Verdict};
pub use phrase::{Inline, Phrase};
pub use text::Colour;
