package hemline.reader;

/**
 * Where in a Level II volume some neighbouring cuts lie, so that they can be read again without walking the rest.
 *
 * @param from       start of the first cut
 * @param to         start of what follows the last
 * @param firstIndex index of the first cut in its volume
 */
record SweepSpan(Level2Position from, Level2Position to, int firstIndex) {
}
