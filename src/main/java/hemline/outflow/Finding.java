package hemline.outflow;

import hemline.numerics.Estimate;

/**
 * One number that theory gives.
 *
 * @param key      short name for tables and JSON, for example {@code theory_speed_ms}
 * @param words    what it is, in words
 * @param estimate the number with its standard deviation
 * @param unit     empty for a pure number
 * @param from     what it was made from, in words
 */
public record Finding(String key, String words, Estimate estimate, String unit, String from) {
}
