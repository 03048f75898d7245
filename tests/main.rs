//! One binary for all checks: what it holds the library to is told by the module's name.

mod gap;
mod identities;
mod published;
mod support;
