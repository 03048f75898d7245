//! What can be wrong with one part of a model, and what to write instead.

use roots::Reality;

use crate::suggestion::Choice;
use crate::{MOST_COPIES, MOST_MULTIPLETS, MOST_SYMMETRIES};

/// What is wrong, and what to write instead; `Display` is both, with a semicolon between.
///
/// [`Error`](crate::Error) says of which symmetry or multiplet.
#[derive(Clone, Debug, PartialEq, Eq)]
#[non_exhaustive]
pub enum Problem {
    /// The name of an algebra or irrep, or a fraction, that cannot be read.
    Roots(roots::Error),
    /// Several groups where one belongs.
    ProductGroup {
        /// What was written.
        written: String,
    },
    /// Z(N) with N below 2 or beyond 32 bits.
    BadCyclicOrder {
        /// What was written.
        written: String,
    },
    /// No kind of field.
    UnknownField {
        /// What was written and the kinds there are.
        choice: Choice,
    },
    /// A chiral superfield in a model that is not supersymmetric.
    SuperfieldOutsideSupersymmetry,
    /// Anything but a chiral superfield in a supersymmetric model.
    NotSuperfield,
    /// A label that cannot stand in a report.
    BadLabel {
        /// The label.
        label: String,
        /// What is wrong with it.
        why: &'static str,
    },
    /// A title that cannot stand in a report.
    BadTitle {
        /// The title.
        title: String,
        /// What is wrong with it.
        why: &'static str,
    },
    /// "gravity" as the label of a symmetry.
    ReservedLabel {
        /// The label.
        label: String,
    },
    /// Two symmetries or two multiplets of one label.
    DuplicateLabel {
        /// The label.
        label: String,
    },
    /// A spectrum without symmetry.
    NoSymmetry,
    /// More symmetries than [`MOST_SYMMETRIES`].
    TooManySymmetries,
    /// More multiplets than [`MOST_MULTIPLETS`].
    TooManyMultiplets,
    /// No symmetry has that label.
    UnknownSymmetry {
        /// What was written and the labels there are.
        choice: Choice,
    },
    /// One symmetry named twice.
    Repeated {
        /// Its label.
        symmetry: String,
    },
    /// An irrep of another algebra, or a charge where an irrep belongs, or the reverse.
    WrongKind {
        /// What was given.
        found: String,
        /// The group it was given for.
        group: String,
        /// What belongs there.
        expected: String,
    },
    /// A decimal as a charge.
    DecimalCharge {
        /// What was written.
        written: String,
        /// The fraction it is.
        fraction: String,
    },
    /// A fraction with more than 60 digits above or below.
    TooManyDigits,
    /// A charge under Z(N) that is not whole.
    BadDiscreteCharge {
        /// What was written.
        written: String,
        /// Z(N).
        group: String,
    },
    /// Copies 0 or beyond [`MOST_COPIES`].
    BadCopies {
        /// What was written.
        written: String,
    },
    /// `family_dependent` where no charge is unknown.
    NoUnknownCharge,
    /// A real scalar in a representation that is not real.
    NotReal {
        /// What it is under the symmetry that makes it so.
        found: String,
        /// Label of that symmetry.
        symmetry: String,
        /// Complex or pseudoreal.
        reality: Reality,
    },
    /// A real scalar with a charge.
    ChargedRealScalar {
        /// Its charge.
        found: String,
        /// Label of the U(1) or Z(N).
        symmetry: String,
    },
    /// A dimension or index beyond 63 bits.
    TooLarge {
        /// Which number.
        quantity: &'static str,
    },
    /// Not a decimal, or one out of bounds.
    BadDecimal {
        /// What was written.
        written: String,
    },
    /// A mass that is 0 or negative.
    MassNotPositive {
        /// What was written.
        written: String,
    },
    /// A symmetry to which the electric charge cannot belong.
    NotForElectricCharge {
        /// Its label.
        symmetry: String,
        /// What it is instead of a gauged U(1) or simple group.
        what: &'static str,
    },
    /// Not one coefficient for each Dynkin label, or for the one charge.
    CoefficientCount {
        /// The group.
        group: String,
        /// How many it takes.
        expected: usize,
        /// How many there were.
        found: usize,
    },
    /// A symmetry named as hypercharge that is no gauged U(1).
    NotHypercharge {
        /// Its label.
        symmetry: String,
    },
}

impl From<roots::Error> for Problem {
    fn from(error: roots::Error) -> Self {
        Self::Roots(error)
    }
}

impl Problem {
    /// What is wrong, without what to write instead.
    #[must_use]
    pub fn message(&self) -> String {
        match self {
            Self::Roots(error) => split(error).0,
            Self::ProductGroup { written } => format!("\"{written}\" is a product of groups"),
            Self::BadCyclicOrder { written } => format!("there is no Z(N) \"{written}\""),
            Self::UnknownField { choice } => {
                format!("\"{}\" is no kind of field", choice.written())
            }
            Self::SuperfieldOutsideSupersymmetry => {
                "a chiral superfield stands in a model that is not supersymmetric".into()
            }
            Self::NotSuperfield => {
                "every multiplet of a supersymmetric model is a chiral superfield".into()
            }
            Self::BadLabel { label, why } => format!("the label \"{label}\" {why}"),
            Self::BadTitle { title, why } => format!("the title \"{title}\" {why}"),
            Self::ReservedLabel { label } => {
                format!("\"{label}\" as a label stands for gravity itself in anomaly conditions")
            }
            Self::DuplicateLabel { label } => format!("the label \"{label}\" is used twice"),
            Self::NoSymmetry => "there is no symmetry".into(),
            Self::TooManySymmetries => format!("there are more than {MOST_SYMMETRIES} symmetries"),
            Self::TooManyMultiplets => format!("there are more than {MOST_MULTIPLETS} multiplets"),
            Self::UnknownSymmetry { choice } => {
                format!("no symmetry has the label \"{}\"", choice.written())
            }
            Self::Repeated { symmetry } => format!("\"{symmetry}\" is given twice"),
            Self::WrongKind { found, group, .. } => format!("{found} does not belong to {group}"),
            Self::DecimalCharge { written, .. } => {
                format!("the decimal {written} is no exact charge")
            }
            Self::TooManyDigits => "a fraction has more than 60 digits above or below".into(),
            Self::BadDiscreteCharge { written, group } => {
                format!("\"{written}\" is no charge under {group}")
            }
            Self::BadCopies { written } => format!("{written} is no number of copies"),
            Self::NoUnknownCharge => {
                "family_dependent says nothing where no charge is unknown".into()
            }
            Self::NotReal {
                found,
                symmetry,
                reality,
            } => format!("a real scalar cannot be the {reality} {found} of \"{symmetry}\""),
            Self::ChargedRealScalar { found, symmetry } => {
                format!("a real scalar cannot have the charge {found} under \"{symmetry}\"")
            }
            Self::TooLarge { quantity } => format!("{quantity} does not fit in 63 bits"),
            Self::BadDecimal { written } => format!("\"{written}\" is no decimal within bounds"),
            Self::MassNotPositive { written } => format!("the mass {written} is not positive"),
            Self::NotForElectricCharge { symmetry, what } => {
                format!("\"{symmetry}\" is {what}, to which no electric charge belongs")
            }
            Self::CoefficientCount {
                group,
                expected,
                found,
            } => {
                let plural = if *expected == 1 { "" } else { "s" };
                format!(
                    "{group} takes {expected} coefficient{plural} of the electric charge, not {found}"
                )
            }
            Self::NotHypercharge { symmetry } => format!("\"{symmetry}\" is no gauged U(1)"),
        }
    }

    /// What to write instead.
    #[must_use]
    pub fn help(&self) -> String {
        match self {
            Self::Roots(roots::Error::LabelCount { expected, .. }) => {
                format!("write {expected} in brackets, or a dimension")
            }
            Self::Roots(error) => as_symmetries(error).map_or_else(|| split(error).1, Into::into),
            Self::ProductGroup { .. } => "write one symmetry for each factor".into(),
            Self::BadCyclicOrder { .. } => {
                format!("write Z(2) or larger, at most Z({})", u32::MAX)
            }
            Self::UnknownField { choice } | Self::UnknownSymmetry { choice } => choice.to_string(),
            Self::SuperfieldOutsideSupersymmetry => {
                "declare the model supersymmetric, or write a fermion or scalar".into()
            }
            Self::NotSuperfield => {
                "write \"chiral superfield\", or leave the field out".into()
            }
            Self::BadLabel { .. } => "write a name of one line, such as \"quark doublet\"".into(),
            Self::BadTitle { .. } => "write one line, such as \"Standard Model\"".into(),
            Self::ReservedLabel { .. } => "choose another label".into(),
            Self::DuplicateLabel { .. } => "give each one a label of its own".into(),
            Self::NoSymmetry => "declare at least one, such as \"SU(3)\" with the label \"colour\"".into(),
            Self::TooManySymmetries | Self::TooManyMultiplets => {
                "that is the largest number supported; use copies, or split the model".into()
            }
            Self::Repeated { .. } => "give each symmetry once".into(),
            Self::WrongKind { expected, .. } => format!("write {expected}"),
            Self::DecimalCharge { fraction, .. } => format!("write \"{fraction}\""),
            Self::TooManyDigits => "write it in other units, with fewer digits".into(),
            Self::BadDiscreteCharge { .. } => "write a whole number, such as 1 or -1".into(),
            Self::BadCopies { .. } => format!("write a whole number from 1 to {MOST_COPIES}"),
            Self::NoUnknownCharge => "leave it out, or write \"?\" as a charge".into(),
            Self::NotReal { .. } => "write \"complex scalar\", or a real representation".into(),
            Self::ChargedRealScalar { .. } => "write \"complex scalar\", or leave the charge out".into(),
            Self::TooLarge { .. } => {
                "that is the largest supported; write smaller irreps or fewer copies".into()
            }
            Self::BadDecimal { .. } => {
                "write a number such as 750.5 or 1e12: at most 60 digits, powers of ten from -200 to 200".into()
            }
            Self::MassNotPositive { .. } => "write a mass above 0 GeV, or leave it out".into(),
            Self::NotForElectricCharge { .. } => {
                "write the label of a gauged U(1) or simple group".into()
            }
            Self::CoefficientCount { group, expected, .. } => match expected {
                1 => format!("write one fraction, such as \"1/2\", for {group}"),
                n => format!("write {n} fractions, one for each Dynkin label of a weight of {group}"),
            },
            Self::NotHypercharge { .. } => "write the label of a gauged U(1)".into(),
        }
    }
}

impl std::fmt::Display for Problem {
    fn fmt(&self, f: &mut std::fmt::Formatter<'_>) -> std::fmt::Result {
        match self.help() {
            help if help.is_empty() => f.write_str(&self.message()),
            help => write!(f, "{}; {help}", self.message()),
        }
    }
}

impl std::error::Error for Problem {}

/// What to write for a group that is not simple: a symmetry may be U(1), but no product.
fn as_symmetries(error: &roots::Error) -> Option<&'static str> {
    let roots::Error::NotSimple { what, .. } = error else {
        return None;
    };
    match *what {
        "SU(2) x SU(2)" => Some("write two symmetries, each SU(2)"),
        "abelian" => Some("write U(1)"),
        "a product with U(1)" => {
            Some("write two symmetries, U(1) and SU(N) with the N that is meant")
        }
        _ => None,
    }
}

/// What is wrong and what to write instead: an error of `roots` is one sentence with a semicolon
/// between, the first after the text it repeats, which may hold others.
fn split(error: &roots::Error) -> (String, String) {
    let sentence = error.to_string();
    let repeated = repeated(error).map(|written| format!("\"{written}\""));
    let start = repeated.and_then(|repeated| Some(sentence.find(&repeated)? + repeated.len()));
    let start = start.unwrap_or(0);
    match sentence[start..].split_once(';') {
        Some((message, help)) => (
            format!("{}{message}", &sentence[..start]),
            help.trim_start().to_owned(),
        ),
        None => (sentence, String::new()),
    }
}

fn repeated(error: &roots::Error) -> Option<&str> {
    use roots::Error as E;
    match error {
        E::RankTooLarge { written }
        | E::NotSimple { written, .. }
        | E::UnknownAlgebra { written, .. }
        | E::EmptyFactor { written }
        | E::BadLabel { written, .. }
        | E::BadIrrep { written, .. }
        | E::UnknownIrrep { written, .. }
        | E::AmbiguousIrrep { written, .. }
        | E::BeyondNames { written, .. }
        | E::BadNumber { written } => Some(written),
        _ => None,
    }
}
