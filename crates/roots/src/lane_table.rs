//! A table from weights to values: open addressing with linear probing ([Knuth 1998], 6.4).
//!
//! The keys are short words that hash by one multiplication, and nothing is ever removed, so a
//! few lines do what a general map does at several times the cost.

use crate::lanes::Lanes;

/// Values by dominant weight.
#[derive(Clone, Debug)]
pub(crate) struct LaneTable<L, V> {
    /// Vacant places hold [`Lanes::vacant`]; the number of places is a power of two.
    places: Vec<(L, V)>,
    shift: u32,
    held: usize,
}

impl<L: Lanes, V: Clone + Default> LaneTable<L, V> {
    /// A table that holds `expected` entries before it grows.
    pub(crate) fn for_entries(expected: usize) -> Self {
        Self::with_places((2 * expected).next_power_of_two().max(16))
    }

    fn with_places(places: usize) -> Self {
        Self {
            places: vec![(L::vacant(), V::default()); places],
            shift: 64 - places.trailing_zeros(),
            held: 0,
        }
    }

    pub(crate) const fn len(&self) -> usize {
        self.held
    }

    /// The place of `key`, or the vacant one where it belongs.
    #[inline]
    fn place(&self, key: &L) -> usize {
        let last = self.places.len() - 1;
        // The shift leaves as many bits as there are places.
        #[allow(clippy::cast_possible_truncation)]
        let mut place = (key.mixed() >> self.shift) as usize & last;
        let vacant = L::vacant();
        while self.places[place].0 != *key && self.places[place].0 != vacant {
            place = (place + 1) & last;
        }
        place
    }

    #[inline]
    pub(crate) fn get(&self, key: &L) -> Option<&V> {
        let (found, value) = &self.places[self.place(key)];
        (found == key).then_some(value)
    }

    /// The value of `key`, the default one where it is new.
    #[inline]
    pub(crate) fn at(&mut self, key: &L) -> &mut V {
        let mut place = self.place(key);
        if self.places[place].0 != *key {
            if 2 * self.held >= self.places.len() {
                self.grow();
                place = self.place(key);
            }
            self.places[place].0 = key.clone();
            self.held += 1;
        }
        &mut self.places[place].1
    }

    #[cold]
    fn grow(&mut self) {
        // Large tables are paid for by the page.
        let factor = if self.places.len() < 4096 { 4 } else { 2 };
        let mut larger = Self::with_places(factor * self.places.len());
        let vacant = L::vacant();
        for (key, value) in self.places.drain(..).filter(|(key, _)| *key != vacant) {
            *larger.at(&key) = value;
        }
        *self = larger;
    }

    /// The entries in no particular order.
    pub(crate) fn into_entries(self) -> impl Iterator<Item = (L, V)> {
        let vacant = L::vacant();
        self.places
            .into_iter()
            .filter(move |(key, _)| *key != vacant)
    }

    /// The entries that `keep` makes something of, in no particular order.
    pub(crate) fn collect<T>(&self, keep: impl Fn(&L, &V) -> Option<T>) -> Vec<T> {
        let vacant = L::vacant();
        let mut kept = Vec::with_capacity(self.held);
        for (key, value) in &self.places {
            if *key != vacant {
                kept.extend(keep(key, value));
            }
        }
        kept
    }
}
