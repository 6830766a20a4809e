/**
 * The use cases that every skin shares: open, run, edit, save, export, watch.
 *
 * <p>May use: everything below the skins.
 */
package hemline.workflow;
