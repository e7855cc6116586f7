package undermask.signal;

/** Lines kept in memory up to a number; those beyond are read from their source. */
final class StoredLines implements Lines {
    private final Lines source;
    private final double[] re;
    private final double[] im;

    StoredLines(Lines source, int count) {
        this.source = source;
        this.re = new double[count];
        this.im = new double[count];
        source.read(1, count, re, im);
    }

    @Override
    public double spacing() {
        return source.spacing();
    }

    @Override
    public void read(int first, int count, double[] outRe, double[] outIm) {
        if (first + count - 1 > re.length) {
            source.read(first, count, outRe, outIm);
            return;
        }
        System.arraycopy(re, first - 1, outRe, 0, count);
        System.arraycopy(im, first - 1, outIm, 0, count);
    }
}
