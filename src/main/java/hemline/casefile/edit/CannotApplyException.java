package hemline.casefile.edit;

/** An edit does not fit the state it is applied to; the message says why in words for the analyst. */
public final class CannotApplyException extends Exception {
    private static final long serialVersionUID = 1L;

    public CannotApplyException(String why) {
        super(why);
    }
}
