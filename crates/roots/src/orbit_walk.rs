//! Weyl orbits, walked without keeping what has been seen.

use crate::frame::Frame;
use crate::lanes::Lanes;

/// Every weight of the orbit of a dominant weight, once, in an order of its own.
///
/// A weight that is not dominant has one parent, its reflection at its first negative label, so
/// the orbit is a tree. What waits to be visited is at most `rank` weights per step of the way
/// down, and no way is longer than the number of positive roots.
///
/// # Source
/// [Snow 1990].
#[derive(Clone, Debug)]
pub(crate) struct OrbitWalk<L> {
    waiting: Vec<L>,
}

impl<L: Lanes> OrbitWalk<L> {
    pub(crate) const fn new() -> Self {
        Self {
            waiting: Vec::new(),
        }
    }

    /// Starts over from another dominant weight.
    pub(crate) fn restart(&mut self, dominant: L) {
        self.waiting.clear();
        self.waiting.push(dominant);
    }

    /// Hands over one or two weights that have not been there yet; `false` when all have.
    #[inline]
    pub(crate) fn step(&mut self, frame: &Frame<L>, mut take: impl FnMut(&L)) -> bool {
        let Some(weight) = self.waiting.pop() else {
            return false;
        };
        take(&weight);
        // What waits has no negative label at the first node: its child there, half of all
        // weights, needs no waiting, and has children only where it is joined.
        let label = weight.label(0);
        if label > 0 {
            let child = weight.minus(&frame.simple_roots[0].times(label));
            take(&child);
            push_behind(frame, &child, 0, &mut self.waiting);
        }
        let first = weight.first_negative();
        let end = first.unwrap_or_else(|| frame.rank());
        weight.for_positive(1, end, |node, label| {
            let child = weight.minus(&frame.simple_roots[node].times(label));
            self.waiting.push(child);
        });
        if let Some(first) = first {
            push_behind(frame, &weight, first, &mut self.waiting);
        }
        true
    }
}

/// The weights whose parent in the tree is `weight`.
pub(crate) fn push_children<L: Lanes>(frame: &Frame<L>, weight: &L, into: &mut Vec<L>) {
    let first = weight.first_negative();
    // Nothing before the first negative label is negative, nor becomes so.
    weight.for_positive(0, first.unwrap_or_else(|| frame.rank()), |node, label| {
        into.push(weight.minus(&frame.simple_roots[node].times(label)));
    });
    if let Some(first) = first {
        push_behind(frame, weight, first, into);
    }
}

/// The children behind the first negative label: only a joined node can lift it.
#[inline]
fn push_behind<L: Lanes>(frame: &Frame<L>, weight: &L, first: usize, into: &mut Vec<L>) {
    for &node in frame.later_neighbours(first) {
        let child = weight.reflected(node, &frame.simple_roots[node]);
        // Its label there is negative only if the weight's is positive.
        if child.first_negative() == Some(node) {
            into.push(child);
        }
    }
}

/// Reflects a weight into the dominant chamber.
#[inline]
pub(crate) fn dominant<L: Lanes>(frame: &Frame<L>, mut weight: L) -> L {
    while let Some(node) = weight.first_negative() {
        weight = weight.reflected(node, &frame.simple_roots[node]);
    }
    weight
}

/// As [`dominant`], and whether an odd number of reflections did it.
pub(crate) fn dominant_with_parity<L: Lanes>(frame: &Frame<L>, mut weight: L) -> (L, bool) {
    let mut odd = false;
    while let Some(node) = weight.first_negative() {
        weight = weight.reflected(node, &frame.simple_roots[node]);
        odd = !odd;
    }
    (weight, odd)
}

/// Reflects a weight that has rho added, unused lanes too, into the open dominant chamber;
/// whether an odd number of reflections did it. `None` on a wall.
#[inline]
pub(crate) fn strictly_dominant<L: Lanes>(frame: &Frame<L>, mut weight: L) -> Option<(L, bool)> {
    let mut odd = false;
    loop {
        if weight.has_zero() {
            return None;
        }
        let Some(node) = weight.first_negative() else {
            return Some((weight, odd));
        };
        weight = weight.reflected(node, &frame.simple_roots[node]);
        odd = !odd;
    }
}
