//! Weights as the hot loops hold them: one label per lane of a machine word.
//!
//! A packed weight is the whole number `sum of label_i * 2^(BITS * i)`, so that weights add and
//! scale as numbers do, all lanes at once. It is exact while every label stays below half of what
//! a lane spans; [`Frame`](crate::frame::Frame) is only ever made where a bound on the labels of
//! everything that can turn up has been checked ([`Lanes::holds`]).

use std::cmp::Ordering;
use std::fmt::Debug;
use std::sync::Arc;

use smallvec::SmallVec;

use crate::CartanType;
use crate::frame::{Frame, Held};

/// A weight by its Dynkin labels. The lanes beyond the rank hold what [`pack`](Self::pack) and
/// [`all_ones`](Self::all_ones) put there; no root reaches them.
pub(crate) trait Lanes: Clone + Eq + Debug + Send + Sync + 'static {
    /// Whether all labels are below 2^15 in size and all ranks at most 16, so that squared lengths
    /// are far below 2^63.
    const NARROW: bool;

    /// Whether weights of that rank, all labels at most `bound` in size, can be held.
    fn holds(rank: usize, bound: u64) -> bool;

    /// The frame of that type, held for the life of the program if its rank is small.
    fn frame(cartan_type: CartanType) -> Held<Self>;

    /// The weight with these labels.
    fn pack(labels: impl ExactSizeIterator<Item = i64>) -> Self;

    /// The weight with all labels one, the unused lanes too: added to a dominant weight it leaves
    /// no lane zero.
    fn all_ones(rank: usize) -> Self;

    /// No dominant weight: marks an empty place in a table.
    fn vacant() -> Self;

    fn label(&self, node: usize) -> i64;

    fn plus(&self, other: &Self) -> Self;

    fn minus(&self, other: &Self) -> Self;

    fn times(&self, factor: i64) -> Self;

    /// The first node with a negative label.
    fn first_negative(&self) -> Option<usize>;

    /// Whether a lane is zero, the unused ones counted.
    fn has_zero(&self) -> bool;

    /// The nodes from `start` on and below `end` with a positive label, and the label.
    fn for_positive(&self, start: usize, end: usize, take: impl FnMut(usize, i64));

    /// The labels of a dominant weight. They are known to be within `u32`.
    fn dominant_labels(&self, rank: usize) -> SmallVec<[u32; 8]> {
        // Products and powers are refused where a label of theirs could leave u32.
        let label = |node| u32::try_from(self.label(node)).expect("labels are within the bound");
        (0..rank).map(label).collect()
    }

    /// The labels.
    fn labels(&self, rank: usize) -> SmallVec<[i64; 8]> {
        (0..rank).map(|node| self.label(node)).collect()
    }

    /// A well mixed number, for tables.
    fn mixed(&self) -> u64;

    /// Compares dominant weights by their labels, node 1 first.
    fn compare(&self, other: &Self) -> Ordering;

    fn is_dominant(&self) -> bool {
        self.first_negative().is_none()
    }

    /// The weight reflected at a simple root.
    fn reflected(&self, node: usize, simple_root: &Self) -> Self {
        self.minus(&simple_root.times(self.label(node)))
    }
}

macro_rules! packed {
    ($(#[$doc:meta])* $name:ident, $word:ty, $bits:expr, $lanes:expr) => {
        $(#[$doc])*
        #[derive(Clone, Copy, PartialEq, Eq, Debug)]
        pub(crate) struct $name($word);

        impl $name {
            /// One in every lane.
            const ONES: $word = <$word>::MAX / ((1 << $bits) - 1);
            /// The top bit of every lane: added, it makes each lane positive.
            const BIAS: $word = Self::ONES << ($bits - 1);

            /// The top bits of the lanes that hold a negative label.
            const fn negative(self) -> $word {
                !self.0.wrapping_add(Self::BIAS) & Self::BIAS
            }

            const fn at(biased: $word, node: usize) -> i64 {
                let lane = (biased >> ($bits * node)) & ((1 << $bits) - 1);
                // At most 16 bits are left.
                #[allow(clippy::cast_possible_truncation, clippy::cast_possible_wrap)]
                let lane = lane as i64;
                lane - (1 << ($bits - 1))
            }

            /// `value` in the lowest lane, borrowing from the others if it is negative.
            #[allow(clippy::cast_sign_loss)]
            const fn lowest(value: i64) -> $word {
                value as $word
            }
        }

        impl Lanes for $name {
            const NARROW: bool = true;

            fn holds(rank: usize, bound: u64) -> bool {
                rank <= $lanes && bound < 1 << ($bits - 1)
            }

            fn frame(cartan_type: CartanType) -> Held<Self> {
                static HELD: [std::sync::OnceLock<Frame<$name>>; crate::frame::PLACES] =
                    [const { std::sync::OnceLock::new() }; crate::frame::PLACES];
                Frame::held_in(&HELD, cartan_type)
            }

            fn pack(labels: impl ExactSizeIterator<Item = i64>) -> Self {
                let lanes = labels.enumerate();
                let words = lanes.map(|(i, label)| Self::lowest(label) << ($bits * i));
                Self(words.fold(0, <$word>::wrapping_add))
            }

            fn all_ones(_rank: usize) -> Self {
                Self(Self::ONES)
            }

            fn vacant() -> Self {
                // Label -1 in the first lane.
                Self(<$word>::MAX)
            }

            #[inline]
            fn label(&self, node: usize) -> i64 {
                Self::at(self.0.wrapping_add(Self::BIAS), node)
            }

            #[inline]
            fn plus(&self, other: &Self) -> Self {
                Self(self.0.wrapping_add(other.0))
            }

            #[inline]
            fn minus(&self, other: &Self) -> Self {
                Self(self.0.wrapping_sub(other.0))
            }

            #[inline]
            fn times(&self, factor: i64) -> Self {
                Self(self.0.wrapping_mul(Self::lowest(factor)))
            }

            #[inline]
            fn first_negative(&self) -> Option<usize> {
                let negative = self.negative();
                (negative != 0).then(|| negative.trailing_zeros() as usize / $bits)
            }

            #[inline]
            fn has_zero(&self) -> bool {
                // Zero lanes of a word: the carry-free test of [Warren 2013], 6-1.
                let lanes = self.0.wrapping_add(Self::BIAS) ^ Self::BIAS;
                lanes.wrapping_sub(Self::ONES) & !lanes & Self::BIAS != 0
            }

            #[inline]
            fn for_positive(&self, start: usize, end: usize, mut take: impl FnMut(usize, i64)) {
                let biased = self.0.wrapping_add(Self::BIAS);
                // One less is not negative: positive.
                let positive = biased.wrapping_sub(Self::ONES) & Self::BIAS;
                let mut left = if end < $lanes {
                    positive & ((1 << ($bits * end)) - 1)
                } else {
                    positive
                };
                left &= <$word>::MAX << ($bits * start);
                while left != 0 {
                    let node = left.trailing_zeros() as usize / $bits;
                    take(node, Self::at(biased, node));
                    left &= left - 1;
                }
            }

            #[allow(clippy::cast_possible_truncation, clippy::cast_sign_loss)]
            fn dominant_labels(&self, rank: usize) -> SmallVec<[u32; 8]> {
                let biased = self.0.wrapping_add(Self::BIAS);
                if rank <= 8 {
                    let mut labels = [0; 8];
                    for (node, label) in labels.iter_mut().enumerate().take($lanes) {
                        *label = Self::at(biased, node) as u32;
                    }
                    return SmallVec::from_buf_and_len(labels, rank);
                }
                (0..rank).map(|node| Self::at(biased, node) as u32).collect()
            }

            fn labels(&self, rank: usize) -> SmallVec<[i64; 8]> {
                let biased = self.0.wrapping_add(Self::BIAS);
                if rank <= 8 {
                    let mut labels = [0; 8];
                    for (node, label) in labels.iter_mut().enumerate().take($lanes) {
                        *label = Self::at(biased, node);
                    }
                    return SmallVec::from_buf_and_len(labels, rank);
                }
                (0..rank).map(|node| Self::at(biased, node)).collect()
            }

            #[inline]
            fn mixed(&self) -> u64 {
                // Fibonacci hashing ([Knuth 1998], 6.4): the top bits are the well mixed ones.
                const GOLDEN: u64 = 0x9E37_79B9_7F4A_7C15;
                #[allow(clippy::cast_possible_truncation)]
                let (low, high) = (self.0 as u64, (self.0 >> (<$word>::BITS / 2)) as u64);
                (low ^ high.rotate_left(29)).wrapping_mul(GOLDEN)
            }

            #[inline]
            fn compare(&self, other: &Self) -> Ordering {
                const FLIP: u32 = <$word>::BITS / $bits;
                let turned = |word: $word| {
                    // Bytes swapped, then the bytes of each lane back: node 1 on top.
                    if $bits == 8 {
                        word.swap_bytes()
                    } else {
                        let mut out = 0;
                        for lane in 0..FLIP {
                            out |= ((word >> ($bits * lane)) & ((1 << $bits) - 1))
                                << ($bits * (FLIP - 1 - lane));
                        }
                        out
                    }
                };
                turned(self.0).cmp(&turned(other.0))
            }
        }
    };
}

packed!(
    /// Eight labels of eight bits: nearly everything that anyone asks for.
    Bytes8, u64, 8, 8
);
packed!(
    /// Eight labels of sixteen bits.
    Shorts8, u128, 16, 8
);
packed!(
    /// Sixteen labels of eight bits.
    Bytes16, u128, 8, 16
);

/// Labels of any number and size: slower, for what fits no word.
///
/// Labels come from `u32`s; sums over at most 256 nodes with coefficients of at most six and the
/// factors of a power stay far below 2^63.
#[derive(Clone, PartialEq, Eq, Debug)]
pub(crate) struct Wide(SmallVec<[i64; 8]>);

impl Wide {
    fn zip(&self, other: &Self, combine: impl Fn(i64, i64) -> i64) -> Self {
        let pairs = self.0.iter().zip(&other.0);
        Self(pairs.map(|(&a, &b)| combine(a, b)).collect())
    }
}

impl Lanes for Wide {
    const NARROW: bool = false;

    fn holds(_rank: usize, bound: u64) -> bool {
        bound < 1 << 60
    }

    fn frame(cartan_type: CartanType) -> Held<Self> {
        Held::Own(Arc::new(Frame::new(cartan_type)))
    }

    fn pack(labels: impl ExactSizeIterator<Item = i64>) -> Self {
        Self(labels.collect())
    }

    fn all_ones(rank: usize) -> Self {
        Self(smallvec::smallvec![1; rank])
    }

    fn vacant() -> Self {
        Self(SmallVec::new())
    }

    fn label(&self, node: usize) -> i64 {
        self.0[node]
    }

    fn plus(&self, other: &Self) -> Self {
        self.zip(other, |a, b| a + b)
    }

    fn minus(&self, other: &Self) -> Self {
        self.zip(other, |a, b| a - b)
    }

    fn times(&self, factor: i64) -> Self {
        Self(self.0.iter().map(|label| label * factor).collect())
    }

    fn first_negative(&self) -> Option<usize> {
        self.0.iter().position(|&label| label < 0)
    }

    fn has_zero(&self) -> bool {
        self.0.contains(&0)
    }

    fn for_positive(&self, start: usize, end: usize, mut take: impl FnMut(usize, i64)) {
        for (node, &label) in self.0.iter().enumerate().take(end).skip(start) {
            if label > 0 {
                take(node, label);
            }
        }
    }

    fn mixed(&self) -> u64 {
        let labels = self.0.iter();
        let mixed = labels.fold(0u64, |hash, &label| {
            (hash.rotate_left(5) ^ label.cast_unsigned()).wrapping_mul(0x9E37_79B9_7F4A_7C15)
        });
        mixed ^ (mixed >> 32)
    }

    fn compare(&self, other: &Self) -> Ordering {
        self.0.cmp(&other.0)
    }

    fn reflected(&self, node: usize, simple_root: &Self) -> Self {
        let label = self.0[node];
        self.zip(simple_root, |own, root| own - label * root)
    }
}

/// Runs `$body` with `$held` the frame of `$cartan_type` in the narrowest lanes in which all labels
/// up to `$bound` in size fit.
macro_rules! on_lanes {
    ($cartan_type:expr, $bound:expr, |$held:ident| $body:expr) => {{
        use $crate::lanes::{Bytes8, Bytes16, Lanes, Shorts8, Wide};
        let (cartan_type, bound): ($crate::CartanType, u64) = ($cartan_type, $bound);
        let rank = cartan_type.rank();
        if Bytes8::holds(rank, bound) {
            let $held = Bytes8::frame(cartan_type);
            $body
        } else if Shorts8::holds(rank, bound) {
            let $held = Shorts8::frame(cartan_type);
            $body
        } else if Bytes16::holds(rank, bound) {
            let $held = Bytes16::frame(cartan_type);
            $body
        } else {
            let $held = Wide::frame(cartan_type);
            $body
        }
    }};
}
pub(crate) use on_lanes;
