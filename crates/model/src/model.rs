//! A model: a spectrum with its title, supersymmetry and electric charge.

use crate::suggestion::shortened;
use crate::{
    ElectricCharge, ElectricChargeDraft, Error, Field, Owner, Part, Problem, Spectrum, Symmetry,
};

/// Characters that a title may have.
pub const MOST_TITLE_CHARACTERS: usize = 300;

/// A spectrum with a title, and what is said of it as a whole.
///
/// In a supersymmetric model every multiplet is a chiral superfield, in others none is.
///
/// ```
/// use model::{Field, Group, Model, Multiplet, Spectrum, Symmetry};
/// let mut spectrum = Spectrum::new([
///     Symmetry::gauge("weak", "SU(2)".parse()?),
///     Symmetry::gauge("hypercharge", Group::U1),
/// ])?;
/// let lepton = Multiplet::draft("lepton doublet", Field::LeftHandedFermion);
/// spectrum.add(lepton.under("weak", "2").under("hypercharge", "-1/2"))?;
/// let model = Model::new("leptons", spectrum)?;
/// let charge = model.electric_charge().expect("Q = T3 + Y by default");
/// assert_eq!(charge.of_weight(0, &[1]).to_string(), "1/2");
/// # Ok::<(), model::Error>(())
/// ```
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Model {
    title: String,
    supersymmetric: bool,
    spectrum: Spectrum,
    hypercharge: Option<usize>,
    electric_charge: Option<ElectricCharge>,
    source: Option<String>,
    notes: Option<String>,
}

impl Model {
    /// A model that is not supersymmetric. Its hypercharge is the gauged U(1) labelled
    /// `hypercharge`, and its electric charge Q = T3 + Y with the gauged SU(2) labelled `weak`,
    /// where these exist.
    ///
    /// # Errors
    /// [`Problem::SuperfieldOutsideSupersymmetry`]; [`Problem::BadTitle`] for a title that is no
    /// line of text.
    pub fn new(title: impl Into<String>, spectrum: Spectrum) -> Result<Self, Error> {
        Self::build(title.into(), false, spectrum)
    }

    /// A supersymmetric model, of chiral superfields only; otherwise as [`new`](Self::new).
    ///
    /// # Errors
    /// [`Problem::NotSuperfield`], [`Problem::BadTitle`].
    pub fn supersymmetric(title: impl Into<String>, spectrum: Spectrum) -> Result<Self, Error> {
        Self::build(title.into(), true, spectrum)
    }

    fn build(title: String, supersymmetric: bool, spectrum: Spectrum) -> Result<Self, Error> {
        check_title(&title)?;
        for multiplet in spectrum.multiplets() {
            check_field(supersymmetric, multiplet.field()).map_err(|problem| {
                let owner = Owner::Multiplet(multiplet.label().to_owned());
                Error::new(owner, Part::Field, problem)
            })?;
        }
        let hypercharge = spectrum
            .symmetry_index("hypercharge")
            .filter(|&i| is_gauged_u1(&spectrum.symmetries()[i]));
        Ok(Self {
            electric_charge: ElectricCharge::isospin_and_hypercharge(&spectrum, hypercharge),
            title,
            supersymmetric,
            spectrum,
            hypercharge,
            source: None,
            notes: None,
        })
    }

    /// Makes the gauged U(1) of that label the hypercharge of the Standard Model. The default
    /// electric charge follows it; one given by
    /// [`with_electric_charge`](Self::with_electric_charge) stays.
    ///
    /// # Errors
    /// [`Problem::UnknownSymmetry`], [`Problem::NotHypercharge`].
    pub fn with_hypercharge(mut self, label: &str) -> Result<Self, Error> {
        let wrong = |problem| Error::new(Owner::Model, Part::Hypercharge, problem);
        let found = self.spectrum.symmetry_index(label).ok_or_else(|| {
            let choice = self.spectrum.symmetry_choice(label, is_gauged_u1);
            wrong(Problem::UnknownSymmetry { choice })
        })?;
        if !is_gauged_u1(&self.spectrum.symmetries()[found]) {
            let symmetry = label.to_owned();
            return Err(wrong(Problem::NotHypercharge { symmetry }));
        }
        let follows = self.electric_charge == self.default_electric_charge();
        self.hypercharge = Some(found);
        if follows {
            self.electric_charge = self.default_electric_charge();
        }
        Ok(self)
    }

    /// Gives the model an electric charge other than T3 + Y.
    ///
    /// # Errors
    /// An unknown, discrete or global symmetry; a wrong number of coefficients; one that is no
    /// fraction.
    pub fn with_electric_charge(mut self, charge: ElectricChargeDraft) -> Result<Self, Error> {
        self.electric_charge = Some(ElectricCharge::new(charge, &self.spectrum)?);
        Ok(self)
    }

    /// Says where the model was published.
    #[must_use]
    pub fn with_source(mut self, source: impl Into<String>) -> Self {
        self.source = Some(source.into());
        self
    }

    /// Adds free text.
    #[must_use]
    pub fn with_notes(mut self, notes: impl Into<String>) -> Self {
        self.notes = Some(notes.into());
        self
    }

    /// The title, one line.
    #[must_use]
    pub fn title(&self) -> &str {
        &self.title
    }

    /// Whether the multiplets are chiral superfields.
    #[must_use]
    pub const fn is_supersymmetric(&self) -> bool {
        self.supersymmetric
    }

    /// The symmetries and multiplets.
    #[must_use]
    pub const fn spectrum(&self) -> &Spectrum {
        &self.spectrum
    }

    /// The number of the symmetry that is the Standard Model's hypercharge.
    #[must_use]
    pub const fn hypercharge(&self) -> Option<usize> {
        self.hypercharge
    }

    /// The electric charge, given or T3 + Y.
    #[must_use]
    pub const fn electric_charge(&self) -> Option<&ElectricCharge> {
        self.electric_charge.as_ref()
    }

    pub(crate) fn default_electric_charge(&self) -> Option<ElectricCharge> {
        ElectricCharge::isospin_and_hypercharge(&self.spectrum, self.hypercharge)
    }

    /// Where the model was published.
    #[must_use]
    pub fn source(&self) -> Option<&str> {
        self.source.as_deref()
    }

    /// Free text.
    #[must_use]
    pub fn notes(&self) -> Option<&str> {
        self.notes.as_deref()
    }
}

fn is_gauged_u1(symmetry: &Symmetry) -> bool {
    symmetry.is_gauged() && symmetry.group().is_u1()
}

/// A supersymmetric model has chiral superfields only, another one none.
pub(crate) fn check_field(supersymmetric: bool, field: Field) -> Result<(), Problem> {
    match (supersymmetric, field == Field::ChiralSuperfield) {
        (true, false) => Err(Problem::NotSuperfield),
        (false, true) => Err(Problem::SuperfieldOutsideSupersymmetry),
        _ => Ok(()),
    }
}

fn check_title(title: &str) -> Result<(), Error> {
    let why = if title.trim().is_empty() {
        "is empty"
    } else if title.chars().any(char::is_control) {
        "is more than one line, or has a control character"
    } else if title.chars().count() > MOST_TITLE_CHARACTERS {
        "has more than 300 characters"
    } else {
        return Ok(());
    };
    let title = shortened(title);
    Err(Error::new(
        Owner::Model,
        Part::Title,
        Problem::BadTitle { title, why },
    ))
}
