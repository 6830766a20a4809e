package hemline.casefile.store;

/** How a case is to be opened. */
public enum OpenMode {
    /** For edits; where that cannot be, to look only, and the case says why. */
    WRITE,
    /** To look only; nothing in the folder is touched. */
    LOOK,
    /** For edits, even where lines of the log are damaged: they are kept aside and the rest is used. */
    SALVAGE
}
