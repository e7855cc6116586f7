package undermask.report;

/** Text for a console of 80 columns. */
final class Paragraph {
    private static final int COLUMNS = 80;

    private Paragraph() {}

    /**
     * Appends words broken into lines.
     *
     * @param lead begins the first line
     * @param indent begins the others
     */
    static void append(StringBuilder text, String words, String lead, String indent) {
        StringBuilder line = new StringBuilder(lead);
        boolean begun = false;
        for (String word : words.split(" ")) {
            if (begun && line.length() + 1 + word.length() > COLUMNS) {
                text.append(line).append('\n');
                line.setLength(0);
                line.append(indent);
                begun = false;
            }
            line.append(begun ? " " : "").append(word);
            begun = true;
        }
        text.append(line).append('\n');
    }
}
