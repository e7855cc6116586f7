package undermask.network;

/** Windings that share flux: the voltages are jω times the inductance matrix times the currents. */
final class CoupledCoils implements Element {
    private final int[] starts;
    private final int[] ends;
    private final double[][] reluctance;

    /**
     * Couples windings.
     *
     * @param starts node at the dotted end of each winding
     * @param ends node at its other end
     * @param inductance symmetric matrix in H
     * @throws IllegalArgumentException when the matrix is not symmetric and positive definite, as with a coupling of 1
     */
    CoupledCoils(int[] starts, int[] ends, double[][] inductance) {
        this.starts = starts.clone();
        this.ends = ends.clone();
        this.reluctance = inverse(inductance, starts.length);
    }

    @Override
    public void stamp(NodalEquations equations, double omega) {
        for (int i = 0; i < starts.length; i++) {
            for (int j = 0; j < starts.length; j++) {
                equations.transferAdmittance(starts[i], ends[i], starts[j], ends[j], 0, -reluctance[i][j] / omega);
            }
        }
    }

    /** The inverse of a positive definite matrix by its Cholesky factor. */
    private static double[][] inverse(double[][] matrix, int size) {
        requireSymmetric(matrix, size);
        double[][] factor = new double[size][size];
        for (int i = 0; i < size; i++) {
            for (int j = 0; j <= i; j++) {
                double rest = matrix[i][j];
                for (int k = 0; k < j; k++) {
                    rest -= factor[i][k] * factor[j][k];
                }
                if (i != j) {
                    factor[i][j] = rest / factor[j][j];
                } else if (rest > 1e-12 * matrix[i][i]) {
                    factor[i][i] = Math.sqrt(rest);
                } else {
                    throw new IllegalArgumentException("windings are coupled without leakage: winding " + (i + 1)
                            + " has no inductance of its own");
                }
            }
        }
        double[][] inverse = new double[size][size];
        for (int column = 0; column < size; column++) {
            double[] x = new double[size];
            for (int i = 0; i < size; i++) {
                double rest = i == column ? 1 : 0;
                for (int k = 0; k < i; k++) {
                    rest -= factor[i][k] * x[k];
                }
                x[i] = rest / factor[i][i];
            }
            for (int i = size - 1; i >= 0; i--) {
                double rest = x[i];
                for (int k = i + 1; k < size; k++) {
                    rest -= factor[k][i] * x[k];
                }
                x[i] = rest / factor[i][i];
                inverse[i][column] = x[i];
            }
        }
        return inverse;
    }

    private static void requireSymmetric(double[][] matrix, int size) {
        if (matrix.length != size) {
            throw new IllegalArgumentException(
                    size + " windings need as many rows of inductance, not " + matrix.length);
        }
        for (int i = 0; i < size; i++) {
            if (matrix[i].length != size) {
                throw new IllegalArgumentException(
                        "row " + (i + 1) + " of the inductance matrix is not " + size + " long");
            }
            for (int j = 0; j <= i; j++) {
                if (!Double.isFinite(matrix[i][j]) || matrix[i][j] != matrix[j][i]) {
                    throw new IllegalArgumentException("inductance between windings " + (i + 1) + " and " + (j + 1)
                            + " is " + matrix[i][j] + " H one way and " + matrix[j][i] + " H the other");
                }
            }
        }
    }
}
