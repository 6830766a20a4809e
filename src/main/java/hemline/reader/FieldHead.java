package hemline.reader;

/**
 * A field of a sweep before its values are read.
 *
 * @param name     its name in the file
 * @param quantity standard name or quantity, empty when the file gives none
 * @param longName description, may be empty
 * @param units    may be empty
 * @param ranges   its own gates
 * @param tellsUndetect whether the file tells "below detection" from "not measured"
 */
record FieldHead(String name, String quantity, String longName, String units, Ranges ranges,
                 boolean tellsUndetect) {
}
