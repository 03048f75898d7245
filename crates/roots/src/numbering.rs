//! The two numberings of the nodes of a Dynkin diagram that are in use.

use std::fmt;
use std::str::FromStr;

use crate::{CartanType, Family};

/// How the nodes of a Dynkin diagram are counted.
///
/// Everything in these crates is in Slansky's numbering; a caller who thinks in the other one
/// translates where values come in and go out. The two differ for E6, E7, E8 and G2 only.
///
/// ```
/// use roots::{Numbering, SimpleAlgebra};
/// let e6: SimpleAlgebra = "E6".parse()?;
/// let adjoint = Numbering::Bourbaki.from_slansky(e6.cartan_type(), &[0, 0, 0, 0, 0, 1]);
/// assert_eq!(adjoint, [0, 1, 0, 0, 0, 0]);
/// # Ok::<(), roots::Error>(())
/// ```
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq, Hash)]
pub enum Numbering {
    /// That of the diagrams of [Slansky 1981].
    #[default]
    Slansky,
    /// [Bourbaki 1968], plates I to IX.
    Bourbaki,
}

impl Numbering {
    /// For each node of this numbering, its place in Slansky's, from 0.
    #[must_use]
    pub fn places(self, cartan_type: CartanType) -> Vec<usize> {
        let n = cartan_type.rank();
        match (self, cartan_type.family()) {
            // Bourbaki's chain is 1 3 4 5 ... n with 2 on 4; Slansky's 1 2 3 ... n-1 with n on 3.
            (Self::Bourbaki, Family::E) => [0, n - 1].into_iter().chain(1..n - 1).collect(),
            (Self::Bourbaki, Family::G) => vec![1, 0],
            _ => (0..n).collect(),
        }
    }

    /// Rearranges one value per node, given in Slansky's order, into this one.
    ///
    /// # Panics
    /// Unless there is one value per node.
    #[must_use]
    pub fn from_slansky<T: Clone>(self, cartan_type: CartanType, values: &[T]) -> Vec<T> {
        assert_eq!(values.len(), cartan_type.rank(), "one value per node");
        let places = self.places(cartan_type).into_iter();
        places.map(|place| values[place].clone()).collect()
    }

    /// Rearranges one value per node, given in this order, into Slansky's.
    ///
    /// # Panics
    /// Unless there is one value per node.
    #[must_use]
    pub fn to_slansky<T: Clone>(self, cartan_type: CartanType, values: &[T]) -> Vec<T> {
        assert_eq!(values.len(), cartan_type.rank(), "one value per node");
        let mut out = values.to_vec();
        for (value, place) in values.iter().zip(self.places(cartan_type)) {
            out[place] = value.clone();
        }
        out
    }
}

impl fmt::Display for Numbering {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        f.write_str(match self {
            Self::Slansky => "slansky",
            Self::Bourbaki => "bourbaki",
        })
    }
}

impl FromStr for Numbering {
    type Err = String;

    fn from_str(written: &str) -> Result<Self, String> {
        match written.to_ascii_lowercase().as_str() {
            "slansky" => Ok(Self::Slansky),
            "bourbaki" => Ok(Self::Bourbaki),
            _ => Err(format!(
                "\"{written}\" is no numbering; write slansky or bourbaki"
            )),
        }
    }
}
