package undermask.input;

/**
 * What a row of a quantity file is set to.
 *
 * @param value as a file would have it
 * @param unit likewise; empty for none
 */
public record SetRow(String value, String unit) {}
