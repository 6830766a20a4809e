/**
 * A case: what a run found, every correction made by hand since, and who made it, when and why.
 *
 * <p>{@code edit} says what can be changed and applies it, without files; {@code store} keeps the folder and loses
 * nothing; here both come together with a measurement given from outside.
 *
 * <p>May use: pipeline, boundary, sweep and their base.
 * Open {@link hemline.casefile.CaseSession} first.
 */
package hemline.casefile;
