package hemline.pipeline;

import hemline.kinematics.KinematicsSettings;
import hemline.meeting.MeetingSettings;
import hemline.tracking.TrackingSettings;
import java.util.Objects;

/**
 * Everything that decides what a run finds, apart from its input.
 *
 * @param heightCeilingM height of the beam centre above the radar beyond which nothing is claimed, m
 * @param tracking       how boundaries are linked
 * @param kinematics     how motion is measured
 * @param meeting        how meetings are found
 */
public record Settings(double heightCeilingM, TrackingSettings tracking, KinematicsSettings kinematics,
                       MeetingSettings meeting) {
    /** Outflow heads are about 1.3 km deep (Mahoney 1988, Mon. Wea. Rev. 116:1474); above this little is seen. */
    private static final double DEFAULT_CEILING_M = 1500;

    public Settings {
        if (!(heightCeilingM > 0 && heightCeilingM <= 10_000)) {
            throw new IllegalArgumentException("the height ceiling must lie within 0..10000 m, got " + heightCeilingM);
        }
        Objects.requireNonNull(tracking, "tracking");
        Objects.requireNonNull(kinematics, "kinematics");
        Objects.requireNonNull(meeting, "meeting");
    }

    public static Settings defaults() {
        return new Settings(DEFAULT_CEILING_M, TrackingSettings.defaults(), KinematicsSettings.defaults(),
                MeetingSettings.defaults());
    }

    public Settings withHeightCeilingM(double newCeilingM) {
        return new Settings(newCeilingM, tracking, kinematics, meeting);
    }
}
