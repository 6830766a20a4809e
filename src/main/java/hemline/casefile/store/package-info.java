/**
 * The case as a folder of text: what was found, the append-only log, and how both survive a crash at any moment.
 *
 * <p>Two rules carry it. An edit is one line, appended and forced to disk before anyone is told that it is saved. A
 * new result is written beside the old one and counts from the moment {@code case.json}, which names its files by
 * hash, is renamed into place. What a crash can leave behind follows Pillai et al. (2014), All file systems are not
 * created equal, OSDI '14, pp. 433-448: appends may be torn, renames wait for their folder to be forced.
 *
 * <p>May use: casefile.edit, boundary, sweep and their base.
 * Open {@link hemline.casefile.store.CaseStore} first.
 */
package hemline.casefile.store;
