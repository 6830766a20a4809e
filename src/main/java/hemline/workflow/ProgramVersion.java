package hemline.workflow;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Properties;

/** The version this program was built as. */
public final class ProgramVersion {
    private ProgramVersion() {
    }

    public static String current() {
        try (InputStream in = ProgramVersion.class.getResourceAsStream("/hemline/version.properties")) {
            Properties properties = new Properties();
            properties.load(in);
            return properties.getProperty("version");
        } catch (IOException e) {
            throw new UncheckedIOException("the program's own version.properties cannot be read", e);
        }
    }
}
