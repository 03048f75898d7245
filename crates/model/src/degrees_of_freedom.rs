//! How many states a model has.

use crate::{Field, Group, Model};

/// Helicity states of massless particles and antiparticles, gauge bosons (and their superpartners)
/// included.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq)]
pub struct DegreesOfFreedom {
    /// States of fermions: two for each Weyl fermion.
    pub fermionic: u128,
    /// States of scalars: two for a complex one, one for a real one; two for each gauge boson.
    pub bosonic: u128,
}

impl Model {
    /// The degrees of freedom of the model with every symmetry unbroken.
    ///
    /// ```
    /// use model::{Field, Group, Model, Multiplet, Spectrum, Symmetry};
    /// let mut spectrum = Spectrum::new([Symmetry::gauge("weak", "SU(2)".parse()?)])?;
    /// spectrum.add(Multiplet::draft("lepton", Field::LeftHandedFermion).copies(2).under("weak", "2"))?;
    /// let states = Model::new("Doublets", spectrum)?.degrees_of_freedom();
    /// assert_eq!((states.fermionic, states.bosonic), (8, 6));
    /// # Ok::<(), model::Error>(())
    /// ```
    #[must_use]
    pub fn degrees_of_freedom(&self) -> DegreesOfFreedom {
        let mut states = DegreesOfFreedom::default();
        for symmetry in self
            .spectrum()
            .symmetries()
            .iter()
            .filter(|one| one.is_gauged())
        {
            let generators: u128 = match symmetry.group() {
                Group::Simple(algebra) => algebra.dimension() as u128,
                Group::U1 => 1,
                Group::Discrete(_) => 0,
            };
            states.bosonic += 2 * generators;
            if self.is_supersymmetric() {
                states.fermionic += 2 * generators;
            }
        }
        for multiplet in self.spectrum().multiplets() {
            let components = u128::from(multiplet.states());
            match multiplet.field() {
                Field::LeftHandedFermion | Field::RightHandedFermion => {
                    states.fermionic += 2 * components;
                }
                Field::ComplexScalar => states.bosonic += 2 * components,
                Field::RealScalar => states.bosonic += components,
                Field::ChiralSuperfield => {
                    states.fermionic += 2 * components;
                    states.bosonic += 2 * components;
                }
            }
        }
        states
    }
}
