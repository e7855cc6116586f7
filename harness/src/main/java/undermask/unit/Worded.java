package undermask.unit;

/** A choice that files, messages and reports write as a word or two. */
public interface Worded {
    /** The words as written in files. */
    String words();
}
