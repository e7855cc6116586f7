package undermask.input;

import undermask.unit.Place;

/**
 * A cell of a table.
 *
 * @param text without quotes and without spaces around it
 * @param place of its first character, the opening quote of a quoted cell
 */
record Cell(String text, Place place) {
    boolean empty() {
        return text.isEmpty();
    }
}
