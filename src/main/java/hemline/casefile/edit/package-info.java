/**
 * What an analyst can change, and what a change does: pure, without files, clocks or screens.
 *
 * <p>A state is never altered: {@link hemline.casefile.edit.CaseState#apply} gives a new one. Undo is a replay of the
 * log without the undone entry. Edits name what they change by place and time, so that they still fit after a new run.
 *
 * <p>May use: boundary, sweep and their base.
 * Open {@link hemline.casefile.edit.Edit} first, then {@link hemline.casefile.edit.Replay}.
 */
package hemline.casefile.edit;
