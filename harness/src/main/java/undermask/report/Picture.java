package undermask.report;

/** A chart, drawn. */
final class Picture {
    private final byte[] png;
    private final byte[] svg;

    /** Takes over both arrays. */
    Picture(byte[] png, byte[] svg) {
        this.png = png;
        this.svg = svg;
    }

    byte[] png() {
        return png;
    }

    byte[] svg() {
        return svg;
    }
}
