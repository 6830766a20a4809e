package hemline.reader;

/**
 * A field of a sweep.
 *
 * @param name     its name in the file
 * @param quantity standard name or quantity, empty when the file gives none
 * @param units    may be empty
 */
public record FieldFacts(String name, String quantity, String units) {
}
