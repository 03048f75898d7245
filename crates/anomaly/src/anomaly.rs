//! Which anomalies a spectrum can have.

use model::{Group, Spectrum};
use roots::{Family, SimpleAlgebra};

/// One anomaly, by the places of its symmetries in the spectrum, as [`Anomaly::all`] lists them.
///
/// What takes an anomaly together with a spectrum panics where the spectrum has no symmetry of
/// such a place; where there is one of another group, the answer means nothing.
#[derive(Clone, Copy, Debug, PartialEq, Eq, Hash)]
pub enum Anomaly {
    /// `G^3` of SU(N) from N = 3 on, or SO(6).
    GaugeCubed(usize),
    /// `G^2 U(1)`.
    GaugeSquaredCharge {
        /// The simple group.
        gauge: usize,
        /// The U(1).
        charge: usize,
    },
    /// Three U(1)s, alike or not, in rising order.
    Charges([usize; 3]),
    /// `gravity^2 U(1)`.
    GravityCharge(usize),
    /// The parity of the Dynkin index sum of SU(2) or Sp(2N).
    Parity(usize),
    /// `G^2 Z(N)`.
    GaugeSquaredDiscrete {
        /// The simple group.
        gauge: usize,
        /// The Z(N).
        discrete: usize,
    },
    /// `gravity^2 Z(N)`.
    GravityDiscrete(usize),
}

/// The kinds of anomaly.
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub enum Kind {
    /// One group three times.
    Cubic,
    /// Two groups or three.
    Mixed,
    /// With gravity.
    Gravitational,
    /// A parity, not a triangle.
    Global,
    /// Of a Z(N).
    Discrete,
}

impl Kind {
    /// The word for it in output.
    #[must_use]
    pub const fn name(self) -> &'static str {
        match self {
            Self::Cubic => "cubic",
            Self::Mixed => "mixed",
            Self::Gravitational => "gravitational",
            Self::Global => "global",
            Self::Discrete => "discrete",
        }
    }
}

impl Anomaly {
    /// Every anomaly that the symmetries of `spectrum` can have, in the order of a report.
    ///
    /// # Source
    /// `G^3`, `G^2 U(1)` and `U(1)^3`: [Bouchiat-Iliopoulos-Meyer 1972], [Gross-Jackiw 1972],
    /// [Georgi-Glashow 1972]; with gravity: [Delbourgo-Salam 1972],
    /// [Alvarez-Gaume-Witten 1984]; parity: [Witten 1982]; Z(N): [Ibanez-Ross 1991], of which only
    /// the conditions linear in the Z(N) charge are here: those on its cube and on its products
    /// with U(1)s depend on what is heavy ([Banks-Dine 1992]).
    pub fn all(spectrum: &Spectrum) -> impl Iterator<Item = Self> + '_ {
        let cubic = simple(spectrum).filter(|&(_, algebra)| has_cubic_index(algebra));
        let mixed = simple(spectrum).flat_map(move |(gauge, _)| {
            abelian(spectrum).map(move |charge| Self::GaugeSquaredCharge { gauge, charge })
        });
        let parity = simple(spectrum).filter(|&(_, algebra)| has_parity(algebra));
        let discrete = discrete(spectrum).flat_map(move |discrete| {
            let gauge = simple(spectrum);
            let mixed = gauge.map(move |(gauge, _)| Self::GaugeSquaredDiscrete { gauge, discrete });
            // Any sum will do for a Z(2): a Majorana fermion of charge 1 may be heavy.
            let group = spectrum.symmetries()[discrete].group();
            let any_will_do = matches!(group, Group::Discrete(order) if order.get() == 2);
            mixed.chain((!any_will_do).then_some(Self::GravityDiscrete(discrete)))
        });
        cubic
            .map(|(gauge, _)| Self::GaugeCubed(gauge))
            .chain(mixed)
            .chain(triples(spectrum).map(Self::Charges))
            .chain(abelian(spectrum).map(Self::GravityCharge))
            .chain(parity.map(|(gauge, _)| Self::Parity(gauge)))
            .chain(discrete)
    }

    /// The kind.
    #[must_use]
    pub const fn kind(self) -> Kind {
        match self {
            Self::GaugeCubed(_) => Kind::Cubic,
            Self::Charges([a, _, c]) if a == c => Kind::Cubic,
            Self::GaugeSquaredCharge { .. } | Self::Charges(_) => Kind::Mixed,
            Self::GravityCharge(_) => Kind::Gravitational,
            Self::Parity(_) => Kind::Global,
            Self::GaugeSquaredDiscrete { .. } | Self::GravityDiscrete(_) => Kind::Discrete,
        }
    }

    /// Places of the symmetries in it, with repetition.
    #[must_use]
    pub fn symmetries(self) -> Vec<usize> {
        let (places, count) = self.places();
        places[..count].to_vec()
    }

    /// Places of the symmetries in it, and how many of the three are used.
    const fn places(self) -> ([usize; 3], usize) {
        match self {
            Self::GaugeCubed(gauge) => ([gauge; 3], 3),
            Self::GaugeSquaredCharge {
                gauge,
                charge: other,
            }
            | Self::GaugeSquaredDiscrete {
                gauge,
                discrete: other,
            } => ([gauge, gauge, other], 3),
            Self::Charges(charges) => (charges, 3),
            Self::GravityCharge(one) | Self::Parity(one) | Self::GravityDiscrete(one) => {
                ([one; 3], 1)
            }
        }
    }

    /// Whether gravity takes part.
    #[must_use]
    pub const fn is_with_gravity(self) -> bool {
        matches!(self, Self::GravityCharge(_) | Self::GravityDiscrete(_))
    }

    /// Whether it must cancel: all its symmetries are gauged.
    #[must_use]
    pub fn must_cancel(self, spectrum: &Spectrum) -> bool {
        let (places, _) = self.places();
        places
            .iter()
            .all(|&place| spectrum.symmetries()[place].is_gauged())
    }

    /// Places of the U(1)s in it, with repetition.
    pub(crate) const fn charges(&self) -> &[usize] {
        match self {
            Self::GaugeSquaredCharge { charge, .. } | Self::GravityCharge(charge) => {
                std::slice::from_ref(charge)
            }
            Self::Charges(charges) => charges,
            Self::GaugeCubed(_)
            | Self::Parity(_)
            | Self::GaugeSquaredDiscrete { .. }
            | Self::GravityDiscrete(_) => &[],
        }
    }

    /// Labels of the symmetries in it, with repetition, and "gravity".
    #[must_use]
    pub fn factors(self, spectrum: &Spectrum) -> Vec<String> {
        let labels = self.symmetries().into_iter();
        let labels = labels.map(|place| spectrum.symmetries()[place].label().to_owned());
        let gravity = if self.is_with_gravity() { 2 } else { 0 };
        std::iter::repeat_n("gravity".to_owned(), gravity)
            .chain(labels)
            .collect()
    }

    /// Its name, e.g. `colour^2 hypercharge`.
    #[must_use]
    pub fn name(self, spectrum: &Spectrum) -> String {
        let powers = powers(&self.factors(spectrum)).into_iter();
        let powers: Vec<String> = powers
            .map(|(label, power)| match power {
                1 => label,
                power => format!("{label}^{power}"),
            })
            .collect();
        let name = powers.join(" ");
        match self {
            Self::Parity(_) => format!("{name} parity"),
            _ => name,
        }
    }
}

/// Labels that follow each other alike, with how many there are; a label of more than one word
/// stands in brackets, so that it is clear what a power belongs to.
pub(crate) fn powers(factors: &[String]) -> Vec<(String, usize)> {
    let alike = factors.chunk_by(|left, right| left == right);
    let powers = alike.map(|alike| {
        let label = &alike[0];
        let one_word = label.chars().all(|c| c.is_alphanumeric() || c == '_');
        let label = if one_word {
            label.clone()
        } else {
            format!("({label})")
        };
        (label, alike.len())
    });
    powers.collect()
}

fn simple(spectrum: &Spectrum) -> impl Iterator<Item = (usize, SimpleAlgebra)> + '_ {
    let groups = spectrum.symmetries().iter().enumerate();
    groups.filter_map(|(place, symmetry)| Some((place, symmetry.group().simple()?)))
}

fn abelian(spectrum: &Spectrum) -> impl Iterator<Item = usize> + Clone + '_ {
    places(spectrum, |group| group.is_u1())
}

fn discrete(spectrum: &Spectrum) -> impl Iterator<Item = usize> + Clone + '_ {
    places(spectrum, |group| matches!(group, Group::Discrete(_)))
}

fn places(
    spectrum: &Spectrum,
    wanted: impl Fn(Group) -> bool + Clone,
) -> impl Iterator<Item = usize> + Clone {
    let groups = spectrum.symmetries().iter().enumerate();
    groups
        .filter(move |(_, symmetry)| wanted(symmetry.group()))
        .map(|(place, _)| place)
}

fn triples(spectrum: &Spectrum) -> impl Iterator<Item = [usize; 3]> + '_ {
    abelian(spectrum).flat_map(move |a| {
        let from_a = abelian(spectrum).filter(move |&b| b >= a);
        from_a.flat_map(move |b| {
            abelian(spectrum)
                .filter(move |&c| c >= b)
                .map(move |c| [a, b, c])
        })
    })
}

/// SU(N) from N = 3 on and SO(6) alone have a symmetric cubic invariant ([Georgi-Glashow 1972]).
fn has_cubic_index(algebra: SimpleAlgebra) -> bool {
    match algebra.cartan_type().family() {
        Family::A => algebra.rank() >= 2,
        Family::D => algebra.rank() == 3,
        _ => false,
    }
}

/// The fourth homotopy group is Z2 for Sp(2N), SU(2) and SO(5) among them, and trivial for every
/// other simple group ([Witten 1982]).
fn has_parity(algebra: SimpleAlgebra) -> bool {
    match algebra.cartan_type().family() {
        Family::A => algebra.rank() == 1,
        Family::B => algebra.rank() == 2,
        Family::C => true,
        _ => false,
    }
}
