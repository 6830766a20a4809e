/**
 * Which gates are not weather or insects, and why.
 *
 * <p>May use: sweep and its base.
 */
package hemline.screening;
