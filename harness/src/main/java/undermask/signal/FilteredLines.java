package undermask.signal;

/** Lines multiplied by a transfer. */
record FilteredLines(Lines source, Transfer transfer) implements Lines {
    @Override
    public double spacing() {
        return source.spacing();
    }

    @Override
    public void read(int first, int count, double[] re, double[] im) {
        source.read(first, count, re, im);
        transfer.multiply(spacing(), first, count, re, im);
    }
}
