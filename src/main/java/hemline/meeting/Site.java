package hemline.meeting;

import hemline.geometry.Point;
import java.util.Objects;

/**
 * A place for which arrivals are asked.
 *
 * @param name     for people and tables
 * @param position km east and north of the radar
 */
public record Site(String name, Point position) {
    public Site {
        Objects.requireNonNull(name);
        if (!Double.isFinite(position.xKm()) || !Double.isFinite(position.yKm())) {
            throw new IllegalArgumentException("site " + name + " needs a finite position, got " + position);
        }
    }
}
