//! [Slansky 1981], tables of irreps: name, dimension, Dynkin index and congruency class.
//!
//! The entries are from memory, so each is derived a second way as well, as sums over its weights
//! or, where there are too many of these, over its dominant ones.

use outside_checks::slow::{Character, SlowAlgebra, Weight};
use outside_checks::table::{self, IrrepEntry, IrrepTable};
use roots::{Congruency, Reality, SimpleAlgebra};

use crate::support::{algebra, big, signed, slow};

/// Beyond it the weights are not all listed.
const LISTED_UP_TO: u64 = 31_000;

/// Weyl groups up to this order are gone through for the Frobenius-Schur indicator.
const ELEMENTS_UP_TO: u32 = 60_000;

fn tables() -> Vec<IrrepTable> {
    let files = table::files("slansky_");
    files.iter().map(|file| table::read(file)).collect()
}

#[test]
fn tables_are_as_many_and_as_long_as_they_were() {
    let tables = tables();
    assert_eq!(tables.len(), 17);
    for table in tables {
        assert!(table.irreps.len() >= 12, "{}", table.algebra);
        assert_eq!(
            (table.source.as_str(), table.had.as_str()),
            ("Slansky 1981", "from memory")
        );
        let cartan_type = algebra(&table.algebra).cartan_type().to_string();
        assert_eq!(cartan_type, table.cartan_type);
    }
}

#[test]
fn library_agrees_with_every_entry() {
    let mut wrong = Vec::new();
    for table in tables() {
        let algebra = algebra(&table.algebra);
        for entry in table.irreps {
            let irrep = algebra.irrep(&entry.labels).unwrap();
            let class = irrep.congruency().to_string();
            let agrees = irrep.name() == entry.name
                && algebra.read_irrep(&entry.name).as_ref() == Ok(&irrep)
                && irrep.dimension() == entry.dimension.into()
                && entry
                    .index
                    .is_none_or(|index| irrep.dynkin_index() == index.into())
                && entry.class.as_ref().is_none_or(|other| class == *other);
            if !agrees {
                let found = (irrep.name(), irrep.dimension(), irrep.dynkin_index(), class);
                wrong.push(format!("{irrep:?}: {found:?}, in the table {entry:?}"));
            }
        }
    }
    assert!(wrong.is_empty(), "{}", wrong.join("\n"));
}

#[test]
fn weights_agree_with_every_entry() {
    for table in tables() {
        let (algebra, slow) = (algebra(&table.algebra), slow(algebra(&table.algebra)));
        let differences = (algebra.weyl_group_order() < ELEMENTS_UP_TO.into())
            .then(|| slow.halved_rho_differences());
        for entry in &table.irreps {
            if entry.dimension <= LISTED_UP_TO {
                let character = slow.character(&signed(&entry.labels));
                check_weights(algebra, &slow, entry, &character, differences.as_deref());
            } else {
                check_orbits(algebra, &slow, entry);
            }
        }
    }
}

fn check_orbits(algebra: SimpleAlgebra, slow: &SlowAlgebra, entry: &IrrepEntry) {
    let (dimension, index) = slow.dimension_and_index_by_orbits(&signed(&entry.labels));
    let irrep = algebra.irrep(&entry.labels).unwrap();
    assert_eq!(big(dimension), entry.dimension.into(), "{irrep:?}");
    assert_eq!(big(index), irrep.dynkin_index(), "{irrep:?}");
    assert!(
        entry.index.is_none_or(|other| big(index) == other.into()),
        "{irrep:?}"
    );
}

fn check_weights(
    algebra: SimpleAlgebra,
    slow: &SlowAlgebra,
    entry: &IrrepEntry,
    character: &Character,
    differences: Option<&[(Weight, i64)]>,
) {
    let labels = signed(&entry.labels);
    let irrep = algebra.irrep(&entry.labels).unwrap();
    assert_eq!(
        character.dimension(),
        i64::try_from(entry.dimension).unwrap(),
        "{irrep:?}"
    );

    let index = slow.index(character);
    assert_eq!(big(index.into()), irrep.dynkin_index(), "{irrep:?}");
    assert!(
        entry
            .index
            .is_none_or(|other| i64::try_from(other) == Ok(index)),
        "{irrep:?}"
    );
    let (above, below) = slow.index_from_lengths(character);
    assert_eq!(
        above,
        below * i128::from(index),
        "{irrep:?}: two ways to the index"
    );
    let by_orbits = slow.dimension_and_index_by_orbits(&labels);
    assert_eq!(
        by_orbits,
        (character.dimension().into(), index.into()),
        "{irrep:?}"
    );

    for w in character.weights.keys() {
        let class = class_of_weight(&entry_type(algebra), &w[..slow.rank()]);
        assert_eq!(class, irrep.congruency(), "{irrep:?} at weight {w:?}");
    }

    let reality = match (
        SlowAlgebra::is_self_conjugate(character),
        slow.steps(&labels) % 2,
    ) {
        (false, _) => Reality::Complex,
        (true, 0) => Reality::Real,
        (true, _) => Reality::Pseudoreal,
    };
    assert_eq!(irrep.reality(), reality, "{irrep:?}");
    if let Some(differences) = differences {
        let expected = match reality {
            Reality::Real => 1,
            Reality::Pseudoreal => -1,
            Reality::Complex => 0,
        };
        let indicator = SlowAlgebra::frobenius_schur(character, differences);
        assert_eq!(indicator, expected, "{irrep:?}: Frobenius-Schur indicator");
    }
    if slow.letter == 'A' && slow.rank() >= 2 {
        assert_eq!(
            irrep.cubic_index(),
            slow.cubic_index(character).into(),
            "{irrep:?}"
        );
    }
}

fn entry_type(algebra: SimpleAlgebra) -> (char, usize) {
    let name = algebra.cartan_type().to_string();
    (name.chars().next().unwrap(), algebra.rank())
}

/// Slansky's classes, written down once more from memory, at any weight of an irrep.
fn class_of_weight(&(letter, n): &(char, usize), w: &[i16]) -> Congruency {
    let sum = |times: &[i16]| -> i16 { times.iter().zip(w).map(|(t, a)| t * a).sum() };
    let cyclic =
        |value: i16, order: i16| Congruency::Cyclic(value.rem_euclid(order).try_into().unwrap());
    let size = i16::try_from(n).unwrap();
    let pair = |i: usize, j: usize| w[i] + w[j];
    match (letter, n) {
        ('A', _) => cyclic(sum(&(1..=size).collect::<Vec<_>>()), size + 1),
        ('B', _) => cyclic(w[n - 1], 2),
        ('C', _) => cyclic(w.iter().step_by(2).sum(), 2),
        ('D', 4) => Congruency::Pair(
            pair(2, 3).rem_euclid(2).try_into().unwrap(),
            (2 * w[0] + 2 * w[2]).rem_euclid(4).try_into().unwrap(),
        ),
        ('D', 5) => cyclic(2 * pair(0, 2) - w[3] + w[4], 4),
        ('E', 6) => cyclic(w[0] - w[1] + w[3] - w[4], 3),
        ('E', 7) => cyclic(w[3] + w[5] + w[6], 2),
        ('E', 8) | ('F', _) | ('G', _) => cyclic(0, 1),
        _ => panic!("no table of {letter}{n} is read"),
    }
}
