package hemline.boundary;

/** How a boundary shows in reflectivity. */
public enum BoundaryKind {
    /** A narrow line of higher reflectivity than on both its sides. */
    THIN_LINE("thin-line"),
    /** A step between clearer air behind and brighter air ahead: the rim of a clear-air arc. */
    ARC("arc");

    private final String label;

    BoundaryKind(String label) {
        this.label = label;
    }

    /** The word for this kind in tables. */
    public String label() {
        return label;
    }
}
