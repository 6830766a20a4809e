package hemline.reader;

import java.nio.file.Path;
import java.util.Optional;

/** Opens a radar file of any supported format, told by its content and never by its name. */
public final class RadarFiles {
    private static final String SUPPORTED = "give CfRadial, ODIM_H5 or WSR-88D Level II files";

    private RadarFiles() {
    }

    /**
     * Opens a file and reads what it holds, not yet its values.
     *
     * @throws UnreadableFileException if it is no radar file that can be read
     */
    public static RadarFile open(Path path) throws UnreadableFileException {
        InputFile file = new InputFile(path);
        Content content = Content.of(file);
        return new RadarFile(file, format(file, content));
    }

    /** Opens what is needed of a file to take its low sweeps; of Level II volumes, no cut after the last low one. */
    static RadarFile openLow(Path path, ReadOptions options) throws UnreadableFileException {
        InputFile file = new InputFile(path);
        Content content = Content.of(file);
        return new RadarFile(file, content.kind() == ContentKind.LEVEL_II
                ? Level2File.openLow(file, content, options) : format(file, content));
    }

    /** Opens a file again for some of its sweeps. */
    static RadarFile reopen(Path path, Optional<SweepSpan> span) throws UnreadableFileException {
        InputFile file = new InputFile(path);
        Content content = Content.of(file);
        return new RadarFile(file, content.kind() == ContentKind.LEVEL_II && span.isPresent()
                ? Level2File.openSpan(file, content, span.get()) : format(file, content));
    }

    private static FormatFile format(InputFile file, Content content) throws UnreadableFileException {
        switch (content.kind()) {
            case HDF5:
                return arrays(file, Hdf5File.open(file, content.buffer()));
            case NETCDF_CLASSIC:
                return arrays(file, ClassicFile.open(file, content.bytes()));
            case LEVEL_II:
                return Level2File.open(file, content);
            case EMPTY:
                throw file.fault("", "is empty", "fetch or copy the file again");
            case TEXT:
                throw file.fault("", "is text, no radar file", SUPPORTED);
            default:
                throw file.fault("", "is in no radar format that is read here", SUPPORTED);
        }
    }

    private static FormatFile arrays(InputFile file, ArrayFile arrays) throws UnreadableFileException {
        boolean opened = false;
        try {
            FormatFile format;
            if (OdimFile.recognises(arrays.root())) {
                format = OdimFile.open(file, arrays);
            } else if (CfRadialFile.recognises(arrays.root())) {
                format = CfRadialFile.open(file, arrays);
            } else {
                throw file.fault("/", "is a sound " + arrays.container() + " file, but holds neither ODIM_H5 nor "
                        + "CfRadial sweeps", SUPPORTED);
            }
            opened = true;
            return format;
        } finally {
            if (!opened) {
                arrays.close();
            }
        }
    }
}
