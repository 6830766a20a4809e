package hemline.viewer.viewmodel;

import java.util.Optional;

/**
 * Where a window was on the desktop, in screen units.
 *
 * @param maximised whether it filled the screen; the rest is then where it goes back to
 */
public record WindowPlace(int x, int y, int width, int height, boolean maximised) {
    private static final int LEAST = 200;
    private static final int MOST = 20_000;

    /** One line for a settings file. */
    String words() {
        return x + " " + y + " " + width + " " + height + " " + maximised;
    }

    /** Reads such a line; empty when it is not one or makes no sense. */
    static Optional<WindowPlace> parse(String words) {
        if (!words.matches("-?\\d{1,5} -?\\d{1,5} \\d{1,5} \\d{1,5} (true|false)")) {
            return Optional.empty();
        }
        String[] part = words.split(" ");
        WindowPlace place = new WindowPlace(Integer.parseInt(part[0]), Integer.parseInt(part[1]),
                Integer.parseInt(part[2]), Integer.parseInt(part[3]), part[4].equals("true"));
        boolean sensible = place.width >= LEAST && place.height >= LEAST && place.width <= MOST && place.height <= MOST;
        return sensible ? Optional.of(place) : Optional.empty();
    }
}
