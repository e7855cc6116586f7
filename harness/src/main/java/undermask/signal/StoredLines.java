package undermask.signal;

/**
 * Lines kept in memory up to a number, in single precision, whose 6e-8 no receiver sees; those beyond are read from their
 * source.
 */
final class StoredLines implements Lines {
    private static final int BLOCK = 1 << 14;

    private final Lines source;
    private final float[] re;
    private final float[] im;

    StoredLines(Lines source, int count) {
        this.source = source;
        this.re = new float[count];
        this.im = new float[count];
        double[] blockRe = new double[BLOCK];
        double[] blockIm = new double[BLOCK];
        for (int done = 0; done < count; done += BLOCK) {
            int size = Math.min(BLOCK, count - done);
            source.read(done + 1, size, blockRe, blockIm);
            for (int i = 0; i < size; i++) {
                re[done + i] = (float) blockRe[i];
                im[done + i] = (float) blockIm[i];
            }
        }
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
        for (int i = 0; i < count; i++) {
            outRe[i] = re[first - 1 + i];
            outIm[i] = im[first - 1 + i];
        }
    }
}
