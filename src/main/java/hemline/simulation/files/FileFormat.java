package hemline.simulation.files;

/** The open formats in which invented sweeps are written. */
public enum FileFormat {
    CFRADIAL_NETCDF4("cfradial-netcdf4", ".nc", new CfRadial4Writer()),
    CFRADIAL_NETCDF3("cfradial-netcdf3", ".nc", new CfRadial3Writer()),
    ODIM_H5("odim-h5", ".h5", new OdimWriter());

    private final String label;
    private final String ending;
    private final SweepWriter writer;

    FileFormat(String label, String ending, SweepWriter writer) {
        this.label = label;
        this.ending = ending;
        this.writer = writer;
    }

    /** The word for it in options. */
    public String label() {
        return label;
    }

    /** How its files end, with the dot. */
    public String ending() {
        return ending;
    }

    public SweepWriter writer() {
        return writer;
    }

    /** @throws IllegalArgumentException when there is none of that label */
    public static FileFormat labelled(String label) {
        for (FileFormat format : values()) {
            if (format.label.equals(label)) {
                return format;
            }
        }
        throw new IllegalArgumentException("no format is called " + label
                + "; there are cfradial-netcdf4, cfradial-netcdf3, odim-h5");
    }
}
