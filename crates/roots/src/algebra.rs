//! One simple Lie algebra and the facts that belong to it.

use num_bigint::BigUint;

use crate::{CartanMatrix, CartanType, Center, DynkinDiagram, Error, Family, Irrep, RootSystem};

/// A simple Lie algebra: SU(N), SO(N), Sp(2N), E6, E7, E8, F4 or G2.
///
/// A copy costs nothing; what takes work to find is found when asked for. Two names of one
/// Cartan type are equal, and so are SU(2), SO(3) and Sp(2); SO(5) and Sp(4), and SO(6) and
/// SU(4), are kept apart, since their nodes and labels differ.
///
/// ```
/// use roots::SimpleAlgebra;
/// let algebra: SimpleAlgebra = "su5".parse()?;
/// assert_eq!(algebra.to_string(), "SU(5)");
/// assert_eq!(algebra.cartan_type().to_string(), "A4");
/// assert_eq!((algebra.rank(), algebra.dimension()), (4, 24));
/// # Ok::<(), roots::Error>(())
/// ```
#[derive(Clone, Copy, Debug, PartialEq, Eq, PartialOrd, Ord, Hash)]
pub struct SimpleAlgebra {
    cartan_type: CartanType,
}

impl SimpleAlgebra {
    /// The algebra of that Cartan type.
    #[must_use]
    pub const fn new(cartan_type: CartanType) -> Self {
        Self { cartan_type }
    }

    /// SU(n).
    ///
    /// # Errors
    /// [`Error::NoSuchType`] below n = 2, [`Error::RankTooLarge`] above [`MAX_RANK`](crate::MAX_RANK) + 1.
    pub fn su(n: usize) -> Result<Self, Error> {
        CartanType::new(Family::A, n.saturating_sub(1)).map(Self::new)
    }

    /// Every simple algebra of rank up to `rank`, by family and rank.
    pub fn up_to_rank(rank: usize) -> impl Iterator<Item = Self> + Clone {
        use Family::{A, B, C, D, E, F, G};
        let families = [A, B, C, D, E, F, G].into_iter();
        families.flat_map(move |family| {
            let ranks = *family.ranks().start()..=rank.min(*family.ranks().end());
            ranks.filter_map(move |n| CartanType::new(family, n).ok().map(Self::new))
        })
    }

    /// Family and rank.
    #[must_use]
    pub const fn cartan_type(self) -> CartanType {
        self.cartan_type
    }

    /// Number of nodes of the Dynkin diagram, and so of Dynkin labels.
    #[must_use]
    pub const fn rank(self) -> usize {
        self.cartan_type.rank()
    }

    /// Number of generators.
    #[must_use]
    pub fn dimension(self) -> usize {
        self.rank() + 2 * self.positive_root_count()
    }

    /// Number of positive roots.
    #[must_use]
    pub fn positive_root_count(self) -> usize {
        let n = self.rank();
        match self.cartan_type.family() {
            Family::A => n * (n + 1) / 2,
            Family::B | Family::C => n * n,
            Family::D => n * (n - 1),
            Family::E | Family::F | Family::G => self.exceptional_roots().positive_roots().len(),
        }
    }

    /// The Dynkin diagram, in Slansky's numbering.
    #[must_use]
    pub fn dynkin_diagram(self) -> DynkinDiagram {
        DynkinDiagram::of(self.cartan_type)
    }

    /// The Cartan matrix, in Slansky's numbering.
    #[must_use]
    pub fn cartan_matrix(self) -> CartanMatrix {
        CartanMatrix::of(self.cartan_type)
    }

    /// All positive roots; hold the answer, it is built anew at each call.
    #[must_use]
    pub fn root_system(self) -> RootSystem {
        RootSystem::of(self.cartan_type)
    }

    /// Number of elements of the Weyl group: the product of the exponents, each plus one.
    ///
    /// # Source
    /// [Humphreys 1990], 3.9.
    #[must_use]
    pub fn weyl_group_order(self) -> BigUint {
        let exponents = self.root_system().exponents();
        exponents
            .into_iter()
            .map(|m| BigUint::from(m + 1))
            .product()
    }

    /// The centre of the simply connected group.
    #[must_use]
    pub const fn center(self) -> Center {
        Center::of(self.cartan_type)
    }

    /// The irrep with highest weight `labels`: Dynkin labels, node 1 first, Slansky's numbering.
    ///
    /// # Errors
    /// [`Error::LabelCount`] unless there is one label per node. A negative label cannot be
    /// written.
    pub fn irrep(self, labels: &[u32]) -> Result<Irrep, Error> {
        Irrep::new(self, labels)
    }

    /// The one-dimensional irrep.
    #[must_use]
    pub fn singlet(self) -> Irrep {
        Irrep::from_fn(self, |_| 0)
    }

    /// The irrep of the generators, whose highest weight is the highest root.
    #[must_use]
    pub fn adjoint(self) -> Irrep {
        let last = self.rank() - 1;
        let labels: &[(usize, u32)] = match self.cartan_type.family() {
            Family::A if last == 0 => &[(0, 2)],
            Family::A => &[(0, 1), (last, 1)],
            Family::B if last == 1 => &[(1, 2)],
            Family::D if last == 2 => &[(1, 1), (2, 1)],
            Family::B | Family::D => &[(1, 1)],
            Family::C => &[(0, 2)],
            Family::E if last == 5 => &[(5, 1)],
            Family::E if last == 7 => &[(6, 1)],
            Family::E | Family::F | Family::G => &[(0, 1)],
        };
        Irrep::from_fn(self, |i| {
            labels
                .iter()
                .find(|(node, _)| *node == i)
                .map_or(0, |(_, label)| *label)
        })
    }

    /// The root system of an exceptional algebra, held once found.
    pub(crate) fn exceptional_roots(self) -> &'static RootSystem {
        RootSystem::exceptional(self.cartan_type)
    }
}
