/**
 * One reader for each open format behind one interface, with typed refusals. The only user of the format libraries for reading.
 *
 * <p>May use: sweep and its base.
 */
package hemline.reader;
