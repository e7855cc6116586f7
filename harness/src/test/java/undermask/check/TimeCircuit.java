package undermask.check;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.DoubleUnaryOperator;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.LUDecomposition;
import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.RealMatrix;

/**
 * A circuit of constant R, L, C and coupled coils in time: modified nodal equations C·dx/dt + G·x = b·u(t), stepped evenly
 * by the trapezoidal rule with a little of the backward one, in the periodic steady state of its source.
 */
final class TimeCircuit {
    /** Weight of the new point; a half would be the trapezoidal rule, which lets algebraic unknowns ring for ever. */
    private static final double NEW = 0.503;

    private final Map<String, Integer> nodes = new LinkedHashMap<>();
    private final List<double[]> conductances = new ArrayList<>();
    private final List<double[]> capacitances = new ArrayList<>();
    /** Two nodes and the branch's own number. */
    private final List<int[]> coils = new ArrayList<>();

    private final List<double[]> inductances = new ArrayList<>();
    private int[] voltageSource;
    private int[] currentSource;

    private int node(String name) {
        return name.equals("ground") ? -1 : nodes.computeIfAbsent(name, fresh -> nodes.size());
    }

    void resistor(String from, String to, double ohms) {
        conductances.add(new double[] {node(from), node(to), 1 / ohms});
    }

    void capacitor(String from, String to, double farads) {
        capacitances.add(new double[] {node(from), node(to), farads});
    }

    /** Resistance, inductance and capacitance in series; 0 leaves one of the first two out. */
    void branch(String from, String to, double ohms, double henries, double farads) {
        String next = from;
        if (ohms > 0) {
            String behind = "in " + conductances.size() + from + to;
            resistor(next, behind, ohms);
            next = behind;
        }
        if (henries > 0) {
            String behind = "in " + coils.size() + to + from;
            inductor(next, behind, henries);
            next = behind;
        }
        capacitor(next, to, farads);
    }

    /** Resistance and inductance in series. */
    void coil(String from, String to, double ohms, double henries) {
        String behind = "in " + conductances.size() + from + to;
        resistor(from, behind, ohms);
        inductor(behind, to, henries);
    }

    int inductor(String from, String to, double henries) {
        coils.add(new int[] {node(from), node(to)});
        inductances.add(new double[] {coils.size() - 1, coils.size() - 1, henries});
        return coils.size() - 1;
    }

    void coupled(int one, int other, double henries) {
        inductances.add(new double[] {one, other, henries});
        inductances.add(new double[] {other, one, henries});
    }

    void voltageSource(String plus, String minus) {
        voltageSource = new int[] {node(plus), node(minus)};
    }

    void currentSource(String into, String from) {
        currentSource = new int[] {node(into), node(from)};
    }

    /**
     * The voltage of a node against ground over one period.
     *
     * @param source at a time in s
     */
    double[] steadyState(String observed, DoubleUnaryOperator source, double period, int steps) {
        int size = nodes.size() + coils.size() + (voltageSource == null ? 0 : 1);
        double[][] g = new double[size][size];
        double[][] c = new double[size][size];
        double[] b = new double[size];
        conductances.forEach(part -> stamp(g, (int) part[0], (int) part[1], part[2]));
        capacitances.forEach(part -> stamp(c, (int) part[0], (int) part[1], part[2]));
        for (int i = 0; i < coils.size(); i++) {
            incidence(g, coils.get(i), nodes.size() + i);
        }
        inductances.forEach(part -> c[nodes.size() + (int) part[0]][nodes.size() + (int) part[1]] -= part[2]);
        if (voltageSource != null) {
            incidence(g, voltageSource, size - 1);
            b[size - 1] = 1;
        } else {
            for (int side = 0; side < 2; side++) {
                if (currentSource[side] >= 0) {
                    b[currentSource[side]] += side == 0 ? 1 : -1;
                }
            }
        }
        double step = period / steps;
        RealMatrix gm = new Array2DRowRealMatrix(g);
        RealMatrix cm = new Array2DRowRealMatrix(c).scalarMultiply(1 / step);
        RealMatrix inverse = new LUDecomposition(cm.add(gm.scalarMultiply(NEW)), 1e-300)
                .getSolver()
                .getInverse();
        RealMatrix advance = inverse.multiply(cm.subtract(gm.scalarMultiply(1 - NEW)));
        double[] drive = inverse.operate(b);
        double[] values = new double[steps];
        for (int i = 0; i < steps; i++) {
            values[i] = NEW * source.applyAsDouble((i + 1) * step) + (1 - NEW) * source.applyAsDouble(i * step);
        }
        double[][] a = advance.getData();
        double[] fromRest = run(a, drive, values, new double[size], null, -1);
        RealMatrix whole = power(advance, steps);
        double[] start = new LUDecomposition(
                        MatrixUtils.createRealIdentityMatrix(size).subtract(whole), 1e-300)
                .getSolver()
                .solve(MatrixUtils.createRealVector(fromRest))
                .toArray();
        double[] seen = new double[steps];
        run(a, drive, values, start, seen, node(observed));
        return seen;
    }

    private static RealMatrix power(RealMatrix matrix, int exponent) {
        RealMatrix result = null;
        RealMatrix square = matrix;
        for (int rest = exponent; rest > 0; rest >>= 1) {
            if ((rest & 1) == 1) {
                result = result == null ? square : result.multiply(square);
            }
            square = square.multiply(square);
        }
        return result;
    }

    private static double[] run(
            double[][] a, double[] drive, double[] values, double[] start, double[] seen, int observed) {
        double[] x = start.clone();
        double[] next = new double[x.length];
        for (int n = 0; n < values.length; n++) {
            if (seen != null) {
                seen[n] = x[observed];
            }
            for (int i = 0; i < next.length; i++) {
                double sum = drive[i] * values[n];
                double[] row = a[i];
                for (int j = 0; j < row.length; j++) {
                    sum += row[j] * x[j];
                }
                next[i] = sum;
            }
            double[] spare = x;
            x = next;
            next = spare;
        }
        return x;
    }

    private static void stamp(double[][] matrix, int from, int to, double value) {
        if (from >= 0) {
            matrix[from][from] += value;
        }
        if (to >= 0) {
            matrix[to][to] += value;
        }
        if (from >= 0 && to >= 0) {
            matrix[from][to] -= value;
            matrix[to][from] -= value;
        }
    }

    private static void incidence(double[][] matrix, int[] ends, int unknown) {
        for (int side = 0; side < 2; side++) {
            if (ends[side] >= 0) {
                matrix[ends[side]][unknown] += side == 0 ? 1 : -1;
                matrix[unknown][ends[side]] += side == 0 ? 1 : -1;
            }
        }
    }
}
