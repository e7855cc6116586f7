package undermask.bench;

import java.util.SplittableRandom;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import undermask.receiver.Receiver;
import undermask.receiver.ReceiverStandard;
import undermask.receiver.Trace;
import undermask.signal.Lines;

/** A scan of all bands by all detectors over dense lines that lie in memory, one operating point, one core. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 5, time = 3)
@Measurement(iterations = 5, time = 3)
@Fork(1)
public class ReceiverScan {
    private static final double HIGHEST = 30.1e6;

    /** Length of the window in s; 20 ms is one period of 50 Hz. */
    @Param({"0.02", "0.2"})
    public double window;

    @Param({"CISPR_16", "MIL_STD_461"})
    public ReceiverStandard standard;

    private Receiver receiver;
    private Lines lines;

    /** Every line is there, falling as those of edges do, and no envelope is like another. */
    @Setup
    public void synthesise() {
        receiver = Receiver.of(standard);
        int count = (int) (HIGHEST * window) + 1;
        double[] re = new double[count];
        double[] im = new double[count];
        SplittableRandom random = new SplittableRandom(1);
        for (int n = 1; n < count; n++) {
            re[n] = (random.nextDouble() - 0.5) / n;
            im[n] = (random.nextDouble() - 0.5) / n;
        }
        lines = new Lines() {
            @Override
            public double spacing() {
                return 1 / window;
            }

            @Override
            public void read(int first, int length, double[] outRe, double[] outIm) {
                System.arraycopy(re, first, outRe, 0, length);
                System.arraycopy(im, first, outIm, 0, length);
            }
        };
    }

    @Benchmark
    public Trace scan() {
        return receiver.scan(lines);
    }
}
