//! Which fermions are chiral under the gauge symmetries, and which pair up.

use std::collections::BTreeMap;

use num_rational::BigRational;
use roots::{Irrep, Reality};

use crate::{Group, Multiplet, Spectrum, Transformation};

/// The left-handed fermions of one irrep of the gauge symmetries and of its conjugate.
///
/// What pairs up may have a mass that the gauge symmetries allow; what is chiral may not.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct FermionClass {
    reality: Reality,
    members: Vec<usize>,
    conjugate_members: Vec<usize>,
    copies: u64,
    conjugate_copies: u64,
}

impl FermionClass {
    /// Whether the irrep is real, pseudoreal or complex.
    #[must_use]
    pub const fn reality(&self) -> Reality {
        self.reality
    }

    /// Places of the multiplets whose left-handed fermions are in the irrep.
    #[must_use]
    pub fn members(&self) -> &[usize] {
        &self.members
    }

    /// Places of the multiplets whose left-handed fermions are in the conjugate of a complex
    /// irrep.
    #[must_use]
    pub fn conjugate_members(&self) -> &[usize] {
        &self.conjugate_members
    }

    /// How many copies there are in the irrep.
    #[must_use]
    pub const fn copies(&self) -> u64 {
        self.copies
    }

    /// How many copies there are in the conjugate of a complex irrep.
    #[must_use]
    pub const fn conjugate_copies(&self) -> u64 {
        self.conjugate_copies
    }

    /// How many copies may have masses among themselves: pairs of opposite copies of a complex
    /// irrep count once, pairs of a pseudoreal one too, and each copy of a real irrep.
    #[must_use]
    pub fn massive(&self) -> u64 {
        match self.reality {
            Reality::Complex => self.copies.min(self.conjugate_copies),
            Reality::Pseudoreal => self.copies / 2,
            Reality::Real => self.copies,
        }
    }

    /// How many copies are left without a partner.
    #[must_use]
    pub fn chiral(&self) -> u64 {
        match self.reality {
            Reality::Complex => self.copies.abs_diff(self.conjugate_copies),
            Reality::Pseudoreal => self.copies % 2,
            Reality::Real => 0,
        }
    }
}

impl Spectrum {
    /// The fermions by their irrep under the gauge symmetries, conjugates together, in the order
    /// of the multiplets; `None` while a gauge charge is unknown.
    ///
    /// ```
    /// use model::{Field, Group, Multiplet, Spectrum, Symmetry};
    /// let mut spectrum = Spectrum::new([Symmetry::gauge("charge", Group::U1)])?;
    /// spectrum.add(Multiplet::draft("left", Field::LeftHandedFermion).under("charge", -1))?;
    /// spectrum.add(Multiplet::draft("right", Field::RightHandedFermion).under("charge", -1))?;
    /// let classes = spectrum.fermion_classes().unwrap();
    /// assert_eq!((classes[0].massive(), classes[0].chiral()), (1, 0));
    /// # Ok::<(), model::Error>(())
    /// ```
    #[must_use]
    pub fn fermion_classes(&self) -> Option<Vec<FermionClass>> {
        let mut places: BTreeMap<GaugeIrrep, usize> = BTreeMap::new();
        let mut classes: Vec<FermionClass> = Vec::new();
        for (place, multiplet) in self.multiplets().iter().enumerate() {
            if !multiplet.has_fermions() {
                continue;
            }
            let irrep = GaugeIrrep::of(self, multiplet)?;
            let conjugate = irrep.conjugate();
            if let Some(&known) = places.get(&conjugate).filter(|_| conjugate != irrep) {
                classes[known].conjugate_members.push(place);
                classes[known].conjugate_copies += u64::from(multiplet.copies());
                continue;
            }
            let known = *places.entry(irrep).or_insert_with_key(|irrep| {
                classes.push(FermionClass {
                    reality: irrep.reality(),
                    members: Vec::new(),
                    conjugate_members: Vec::new(),
                    copies: 0,
                    conjugate_copies: 0,
                });
                classes.len() - 1
            });
            classes[known].members.push(place);
            classes[known].copies += u64::from(multiplet.copies());
        }
        Some(classes)
    }
}

/// What left-handed fermions are under the gauge symmetries.
#[derive(Clone, Debug, PartialEq, Eq, PartialOrd, Ord)]
struct GaugeIrrep(Vec<GaugePart>);

#[derive(Clone, Debug, PartialEq, Eq, PartialOrd, Ord)]
enum GaugePart {
    Irrep(Irrep),
    Charge(BigRational),
    Discrete { charge: u32, order: u32 },
}

impl GaugeIrrep {
    fn of(spectrum: &Spectrum, multiplet: &Multiplet) -> Option<Self> {
        let gauged = spectrum
            .symmetries()
            .iter()
            .zip(multiplet.transformations());
        let parts = gauged.filter(|(symmetry, _)| symmetry.is_gauged());
        let parts = parts.map(|(symmetry, part)| GaugePart::of(symmetry.group(), part));
        let own = Self(parts.collect::<Option<_>>()?);
        Some(match multiplet.left_handed_sign() {
            1 => own,
            _ => own.conjugate(),
        })
    }

    fn conjugate(&self) -> Self {
        Self(self.0.iter().map(GaugePart::conjugate).collect())
    }

    fn reality(&self) -> Reality {
        if *self != self.conjugate() {
            return Reality::Complex;
        }
        let pseudoreal = self.0.iter().filter(|part| match part {
            GaugePart::Irrep(irrep) => irrep.reality() == Reality::Pseudoreal,
            GaugePart::Charge(_) | GaugePart::Discrete { .. } => false,
        });
        // Two antisymmetric forms make a symmetric one.
        match pseudoreal.count() % 2 {
            0 => Reality::Real,
            _ => Reality::Pseudoreal,
        }
    }
}

impl GaugePart {
    fn of(group: Group, part: &Transformation) -> Option<Self> {
        match (part, group) {
            (Transformation::Irrep(irrep), _) => Some(Self::Irrep(irrep.clone())),
            (Transformation::Charge(charge), _) => Some(Self::Charge(charge.clone())),
            (Transformation::Discrete(charge), Group::Discrete(order)) => Some(Self::Discrete {
                charge: *charge,
                order: order.get(),
            }),
            (Transformation::Discrete(_) | Transformation::UnknownCharge, _) => None,
        }
    }

    fn conjugate(&self) -> Self {
        match self {
            Self::Irrep(irrep) => Self::Irrep(irrep.conjugate()),
            Self::Charge(charge) => Self::Charge(-charge),
            Self::Discrete { charge, order } => Self::Discrete {
                charge: (order - charge) % order,
                order: *order,
            },
        }
    }
}
