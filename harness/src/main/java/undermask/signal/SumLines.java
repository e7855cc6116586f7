package undermask.signal;

/** Lines of two waveforms of one window added. */
final class SumLines implements Lines {
    private final Lines first;
    private final Lines second;
    private double[] re = new double[0];
    private double[] im = new double[0];

    SumLines(Lines first, Lines second) {
        if (first.spacing() != second.spacing()) {
            throw new IllegalArgumentException("lines of different windows have no sum");
        }
        this.first = first;
        this.second = second;
    }

    @Override
    public double spacing() {
        return first.spacing();
    }

    @Override
    public void read(int from, int count, double[] outRe, double[] outIm) {
        if (re.length < count) {
            re = new double[count];
            im = new double[count];
        }
        first.read(from, count, outRe, outIm);
        second.read(from, count, re, im);
        for (int i = 0; i < count; i++) {
            outRe[i] += re[i];
            outIm[i] += im[i];
        }
    }
}
