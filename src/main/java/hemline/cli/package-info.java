/**
 * Commands and exit codes. The only user of the standard streams.
 *
 * <p>May use: workflow, casefile, boundary, sweep and their base.
 * Open {@link hemline.cli.Main} first.
 */
package hemline.cli;
