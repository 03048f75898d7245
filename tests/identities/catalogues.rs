//! Catalogues: what they hold, how long they take, where they stop.

use std::collections::BTreeSet;
use std::time::{Duration, Instant};

use roots::{CatalogBound, Error, NameBook};

use crate::support::algebra;

fn within(name: &str, dimension: u64, limit: usize) -> Result<Vec<roots::Irrep>, Error> {
    algebra(name).irreps_within(&CatalogBound::Dimension(dimension.into()), limit)
}

/// Dimensions of E8 below 10^9, from memory of the sequence in print (there are several).
#[test]
fn e8_up_to_a_thousand_million() {
    let started = Instant::now();
    let list = within("E8", 1_000_000_000, 1_000).unwrap();
    let took = started.elapsed();
    println!("E8 up to 10^9: {} irreps in {took:?}", list.len());
    let dimensions: BTreeSet<u64> = list
        .iter()
        .map(|irrep| irrep.dimension().try_into().unwrap())
        .collect();
    let remembered = [
        1,
        248,
        3_875,
        27_000,
        30_380,
        147_250,
        779_247,
        1_763_125,
        2_450_240,
        4_096_000,
        4_881_384,
        6_696_000,
        26_411_008,
        70_680_000,
        76_271_625,
        79_143_000,
        146_325_270,
        203_205_000,
        281_545_875,
        301_694_976,
        344_452_500,
        820_260_000,
    ];
    assert_eq!(dimensions, remembered.into());
    assert_eq!(list.len(), remembered.len());
    // The promise of a release build, kept by others as well.
    assert!(took < Duration::from_millis(50), "{took:?}");
}

#[test]
fn lists_beyond_their_limit_say_so() {
    let error = within("SU(2)", u64::MAX, 10_000).unwrap_err();
    assert!(
        matches!(error, Error::TooMany { limit: 10_000, .. }),
        "{error}"
    );
    let complaint = error.to_string();
    assert!(
        complaint.contains("SU(2)") && complaint.contains("10000"),
        "{complaint}"
    );
    // Exactly as many as the limit is not too many.
    assert_eq!(within("SU(2)", 500, 500).unwrap().len(), 500);
    assert!(within("SU(2)", 501, 500).is_err());
    assert!(within("E8", 0, 500).unwrap().is_empty());
}

/// The slowest names: SU(3), where irreps are densest, just below the last dimension with names.
#[test]
fn slowest_names() {
    let su3 = algebra("SU(3)");
    // (a + 1)(b + 1)(a + b + 2) / 2 just below 10^9.
    for labels in [[1_000, 1_000 - 5], [44_700, 0], [1_230, 722]] {
        let irrep = su3.irrep(&labels).unwrap();
        assert!(irrep.dimension() <= 1_000_000_000u32.into());
        let started = Instant::now();
        let name = NameBook::new(su3).name(&irrep).to_string();
        println!("{irrep:?}, {name}: {:?}", started.elapsed());
        assert_eq!(su3.read_irrep(&name).unwrap(), irrep);
    }
}
