//! Cartan matrices written down once more, from memory.

/// The Cartan matrix of type `letter` and `rank` in the numbering of [Slansky 1981]: row i holds
/// the Dynkin labels of simple root i.
///
/// The chain is 1-2-...-n. B has a short last root, C a long one; in D the last node hangs on
/// node n - 2; in E the chain has n - 1 nodes and node n hangs on node 3; in F4 nodes 1 and 2 are
/// long; in G2 node 1 is.
///
/// # Panics
/// For a letter that is no type.
#[must_use]
pub fn slansky_cartan_matrix(letter: char, rank: usize) -> Vec<Vec<i64>> {
    let mut matrix = vec![vec![0; rank]; rank];
    for i in 0..rank {
        matrix[i][i] = 2;
        if i + 1 < rank {
            matrix[i][i + 1] = -1;
            matrix[i + 1][i] = -1;
        }
    }
    let hang = |matrix: &mut Vec<Vec<i64>>, from: usize, to: usize| {
        matrix[rank - 2][rank - 1] = 0;
        matrix[rank - 1][rank - 2] = 0;
        matrix[from][to] = -1;
        matrix[to][from] = -1;
    };
    match letter {
        'A' => {}
        // The row of the longer root has the -2: <long, short-check> = -2.
        'B' => matrix[rank - 2][rank - 1] = -2,
        'C' => matrix[rank - 1][rank - 2] = -2,
        'D' => hang(&mut matrix, rank - 3, rank - 1),
        'E' => hang(&mut matrix, 2, rank - 1),
        'F' => matrix[1][2] = -2,
        'G' => matrix[0][1] = -3,
        _ => panic!("no type {letter}"),
    }
    matrix
}
