//! What a spectrum has worked out of irreps already: a family's multiplets share theirs.

use std::collections::HashMap;

use num_bigint::BigUint;
use num_traits::ToPrimitive;
use roots::{Irrep, SimpleAlgebra};

use crate::Problem;

/// Dimension and indices of an irrep, each within 63 bits.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub(crate) struct IrrepNumbers {
    pub(crate) dimension: u64,
    pub(crate) dynkin_index: u64,
    pub(crate) cubic_index: i64,
}

impl IrrepNumbers {
    /// Those of a singlet, and of what is no irrep.
    pub(crate) const TRIVIAL: Self = Self {
        dimension: 1,
        dynkin_index: 0,
        cubic_index: 0,
    };

    fn of(irrep: &Irrep) -> Result<Self, Problem> {
        let cubic_index = irrep.cubic_index().to_i64().filter(|&a| a != i64::MIN);
        Ok(Self {
            dimension: whole(&irrep.dimension(), "the dimension")?,
            dynkin_index: whole(&irrep.dynkin_index(), "the Dynkin index")?,
            cubic_index: cubic_index.ok_or(Problem::TooLarge {
                quantity: "the cubic index",
            })?,
        })
    }
}

/// The number, unless it has more than 63 bits.
pub(crate) fn whole(value: &BigUint, quantity: &'static str) -> Result<u64, Problem> {
    let small = value.to_u64().filter(|&value| i64::try_from(value).is_ok());
    small.ok_or(Problem::TooLarge { quantity })
}

/// Irreps by their names, and their numbers. Any two are equal: what has been looked up is no part
/// of what a spectrum is.
#[derive(Clone, Debug, Default)]
pub(crate) struct IrrepMemo {
    named: HashMap<SimpleAlgebra, HashMap<String, Irrep>>,
    numbers: HashMap<Irrep, IrrepNumbers>,
}

impl IrrepMemo {
    pub(crate) fn read(&mut self, algebra: SimpleAlgebra, written: &str) -> Result<Irrep, Problem> {
        let named = self.named.entry(algebra).or_default();
        if let Some(irrep) = named.get(written) {
            return Ok(irrep.clone());
        }
        let irrep = algebra.read_irrep(written)?;
        named.insert(written.to_owned(), irrep.clone());
        Ok(irrep)
    }

    pub(crate) fn numbers(&mut self, irrep: &Irrep) -> Result<IrrepNumbers, Problem> {
        if irrep.is_singlet() {
            return Ok(IrrepNumbers::TRIVIAL);
        }
        if let Some(numbers) = self.numbers.get(irrep) {
            return Ok(*numbers);
        }
        let numbers = IrrepNumbers::of(irrep)?;
        self.numbers.insert(irrep.clone(), numbers);
        Ok(numbers)
    }
}

impl PartialEq for IrrepMemo {
    fn eq(&self, _: &Self) -> bool {
        true
    }
}

impl Eq for IrrepMemo {}
