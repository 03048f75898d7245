//! Names of irreps by their dimension: bars, primes and the letters of SO(8).
//!
//! The convention is that of [Slansky 1981] and [Yamatsu 2015]:
//! - `bar` marks the conjugate. Within a conjugate pair the plain one has the smaller congruency
//!   class; where the classes tie, SU(N) and E6 take the larger labels read from node 1, and
//!   SO(4k + 2) the larger label on the node of its plain spinor. SU(3)'s 6 is (20), which common
//!   practice takes against the class.
//! - Primes count up with the Dynkin index among irreps of one dimension that are not conjugates.
//!   Where the index ties too, the larger labels come first, read from node 1, or for SO(4k) from
//!   the last node, so that the plain spinor of SO(12) sits where those of SO(8) and SO(10) do.
//! - In SO(8) irreps that triality carries into each other share their primes and carry letters:
//!   v, s, c for nodes 1, 4, 3. One letter names the node whose label differs from two equal
//!   ones; two letters the node of the largest label, then of the middle one.

use std::cmp::Reverse;
use std::collections::HashMap;
use std::fmt;

use num_bigint::BigUint;

use crate::congruency::{Congruency, congruency};
use crate::dimension_search::irreps_of_dimension;
use crate::{CartanType, CatalogBound, Error, Family, Irrep, SimpleAlgebra};

impl SimpleAlgebra {
    /// The dimension up to which irreps have names: 10^9 for the exceptional algebras, 10^6 for
    /// the others, which have far more irreps that small. Beyond it irreps go by their labels.
    #[must_use]
    pub const fn named_up_to(self) -> u32 {
        match self.cartan_type().family() {
            Family::E | Family::F | Family::G => 1_000_000_000,
            Family::A | Family::B | Family::C | Family::D => 1_000_000,
        }
    }
}

/// The name of an irrep, in its parts.
#[derive(Clone, Debug, PartialEq, Eq, Hash)]
pub enum IrrepName {
    /// The dimension and what tells irreps of that dimension apart.
    Dimension {
        /// The dimension.
        dimension: u32,
        /// Number of primes.
        primes: usize,
        /// "", "v", "vc" and the like; SO(8) only.
        letters: &'static str,
        /// Whether it is the conjugate one of a pair.
        bar: bool,
    },
    /// Labels in brackets, beyond [`SimpleAlgebra::named_up_to`].
    Labels(String),
}

impl fmt::Display for IrrepName {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        match self {
            Self::Dimension {
                dimension,
                primes,
                letters,
                bar,
            } => {
                let bar = if *bar { "bar" } else { "" };
                write!(f, "{dimension}{}{letters}{bar}", "'".repeat(*primes))
            }
            Self::Labels(labels) => f.write_str(labels),
        }
    }
}

/// Gives the irreps of one algebra their names, and remembers each dimension it has looked at.
///
/// ```
/// use roots::{NameBook, SimpleAlgebra};
/// let su3: SimpleAlgebra = "SU(3)".parse()?;
/// let mut names = NameBook::new(su3);
/// assert_eq!(names.name(&su3.irrep(&[2, 1])?).to_string(), "15");
/// assert_eq!(names.name(&su3.irrep(&[4, 0])?).to_string(), "15'");
/// # Ok::<(), roots::Error>(())
/// ```
#[derive(Clone, Debug)]
pub struct NameBook {
    algebra: SimpleAlgebra,
    /// Irreps of each dimension looked at, in the order of a listing.
    known: HashMap<BigUint, Vec<Irrep>>,
}

impl NameBook {
    /// An empty book for `algebra`.
    #[must_use]
    pub fn new(algebra: SimpleAlgebra) -> Self {
        Self {
            algebra,
            known: HashMap::new(),
        }
    }

    /// Every irrep up to that dimension, as [`SimpleAlgebra::irreps_within`] lists them; the book
    /// remembers them, so that naming each costs no search.
    ///
    /// # Errors
    /// [`Error::TooMany`] where there are more than `limit`.
    ///
    /// ```
    /// use roots::{NameBook, SimpleAlgebra};
    /// let su5: SimpleAlgebra = "SU(5)".parse()?;
    /// let mut names = NameBook::new(su5);
    /// let all = names.up_to_dimension(&50u32.into(), 100)?;
    /// assert_eq!((all.len(), names.name(&all[1]).to_string()), (16, "5".to_owned()));
    /// # Ok::<(), roots::Error>(())
    /// ```
    pub fn up_to_dimension(&mut self, most: &BigUint, limit: usize) -> Result<Vec<Irrep>, Error> {
        let bound = CatalogBound::Dimension(most.clone());
        let all = self.algebra.irreps_within(&bound, limit)?;
        for equals in all.chunk_by(|left, right| left.dimension() == right.dimension()) {
            self.known.insert(equals[0].dimension(), equals.to_vec());
        }
        Ok(all)
    }

    /// Makes ready to name all of these at once: many irreps are looked up faster in a list of all
    /// up to the largest dimension than one dimension at a time.
    pub fn prepare(&mut self, irreps: &[Irrep]) {
        const MANY: usize = 32;
        const LONGEST_LIST: usize = 50_000;
        let most = BigUint::from(self.algebra.named_up_to());
        let dimensions = irreps.iter().map(Irrep::dimension).filter(|d| *d <= most);
        let dimensions: Vec<BigUint> = dimensions.collect();
        if let Some(largest) = dimensions.iter().max().filter(|_| dimensions.len() > MANY) {
            // A list that is too long is left to single searches, which are fast in rank 1.
            let _ = self.up_to_dimension(largest, LONGEST_LIST);
        }
    }

    /// The name of `irrep`.
    ///
    /// # Panics
    /// Where `irrep` belongs to another algebra than the book.
    #[must_use]
    pub fn name(&mut self, irrep: &Irrep) -> IrrepName {
        let dimension = irrep.dimension();
        let most = self.algebra.named_up_to();
        let Some(small) = u32::try_from(&dimension).ok().filter(|&d| d <= most) else {
            return IrrepName::Labels(irrep.bracketed());
        };
        let equals = self.of_dimension(&dimension);
        let family = Kin::of(irrep);
        let mut elder: Vec<Kin> = Vec::new();
        for other in equals.iter().map(Kin::of) {
            if other == family {
                break;
            }
            if elder.last() != Some(&other) {
                elder.push(other);
            }
        }
        assert!(
            equals.contains(irrep),
            "{irrep:?} is not of the book's algebra"
        );
        IrrepName::Dimension {
            dimension: small,
            primes: elder.len(),
            letters: letters(irrep),
            bar: !is_plain(irrep),
        }
    }

    /// Every irrep of that dimension, by Dynkin index, then in the order of their names.
    ///
    /// # Cost
    /// Less than some milliseconds up to [`SimpleAlgebra::named_up_to`]. It grows with the dimension
    /// without bound, so that far beyond it this may take very long.
    pub fn of_dimension(&mut self, dimension: &BigUint) -> &[Irrep] {
        let algebra = self.algebra;
        self.known.entry(dimension.clone()).or_insert_with(|| {
            let mut found = irreps_of_dimension(algebra, dimension);
            Self::sort(&mut found);
            found
        })
    }

    /// Sorts irreps of one algebra as a listing has them: by dimension, then Dynkin index, then in
    /// the order of their names.
    pub fn sort(irreps: &mut [Irrep]) {
        irreps.sort_by_cached_key(|irrep| {
            let place = (
                Kin::of(irrep),
                Reverse(is_plain(irrep)),
                letter_place(irrep),
            );
            (irrep.dimension(), irrep.dynkin_index(), place)
        });
    }
}

/// What irreps share that one prime tells from others: the labels of the plain one of a conjugate
/// pair, or of a triality orbit with the three outer labels falling; the larger come first.
#[derive(Clone, Debug, PartialEq, Eq, PartialOrd, Ord)]
struct Kin(Vec<Reverse<u32>>);

impl Kin {
    fn of(irrep: &Irrep) -> Self {
        let cartan_type = irrep.algebra().cartan_type();
        let mut labels = if is_plain(irrep) {
            irrep.labels().to_vec()
        } else {
            irrep.conjugate().labels().to_vec()
        };
        if is_so8(cartan_type) {
            let mut outer = [labels[0], labels[2], labels[3]];
            outer.sort_unstable_by_key(|&label| Reverse(label));
            labels = vec![outer[0], labels[1], outer[1], outer[2]];
        } else if cartan_type.family() == Family::D && cartan_type.rank().is_multiple_of(2) {
            labels.reverse();
        }
        Self(labels.into_iter().map(Reverse).collect())
    }
}

/// Whether the irrep goes without a bar: always, unless it is complex.
pub(crate) fn is_plain(irrep: &Irrep) -> bool {
    let cartan_type = irrep.algebra().cartan_type();
    let (own, other) = (irrep.labels(), irrep.conjugate());
    if own == other.labels() || is_sextet_of_su3(cartan_type, own) {
        return true;
    }
    if is_sextet_of_su3(cartan_type, other.labels()) {
        return false;
    }
    let class = |labels: &[u32]| -> Congruency { congruency(cartan_type, labels) };
    class(own)
        .cmp(&class(other.labels()))
        .then_with(|| match cartan_type.family() {
            Family::D => {
                let spinor = plain_spinor_node(cartan_type);
                other.labels()[spinor].cmp(&own[spinor])
            }
            _ => other.labels().cmp(own),
        })
        .is_le()
}

fn is_sextet_of_su3(cartan_type: CartanType, labels: &[u32]) -> bool {
    cartan_type.family() == Family::A && labels == [2, 0]
}

/// The node of the spinor of SO(4k + 2) whose class is 1 modulo 4.
const fn plain_spinor_node(cartan_type: CartanType) -> usize {
    let n = cartan_type.rank();
    if n % 4 == 1 { n - 1 } else { n - 2 }
}

fn is_so8(cartan_type: CartanType) -> bool {
    cartan_type.family() == Family::D && cartan_type.rank() == 4
}

/// Letters of SO(8) irreps in the order of a listing.
const LETTERS: [&str; 10] = ["", "v", "s", "c", "vs", "vc", "sv", "sc", "cv", "cs"];

fn letters(irrep: &Irrep) -> &'static str {
    LETTERS[letter_place(irrep)]
}

fn letter_place(irrep: &Irrep) -> usize {
    if !is_so8(irrep.algebra().cartan_type()) {
        return 0;
    }
    let labels = irrep.labels();
    let (v, s, c) = (labels[0], labels[3], labels[2]);
    match (v == s, s == c, c == v) {
        (true, true, _) => 0,
        (_, true, _) => 1,
        (_, _, true) => 2,
        (true, _, _) => 3,
        _ => {
            let mut falling = [(v, 0), (s, 1), (c, 2)];
            falling.sort_unstable_by_key(|&(label, _)| Reverse(label));
            match (falling[0].1, falling[1].1) {
                (0, 1) => 4,
                (0, _) => 5,
                (1, 0) => 6,
                (1, _) => 7,
                (_, 0) => 8,
                _ => 9,
            }
        }
    }
}
