package hemline.pipeline;

import hemline.detection.DetectionSettings;
import hemline.kinematics.KinematicsSettings;
import hemline.meeting.MeetingSettings;
import hemline.screening.ScreeningSettings;
import hemline.tracking.TrackingSettings;
import java.util.Objects;

/**
 * Everything that decides what a run finds, apart from its input.
 *
 * @param screening  which gates are set aside, the height ceiling among the reasons
 * @param detection  how boundaries are found sweep by sweep
 * @param tracking   how they are linked
 * @param kinematics how their motion is measured
 * @param meeting    how meetings are found
 */
public record Settings(ScreeningSettings screening, DetectionSettings detection, TrackingSettings tracking,
                       KinematicsSettings kinematics, MeetingSettings meeting) {
    public Settings {
        Objects.requireNonNull(screening, "screening");
        Objects.requireNonNull(detection, "detection");
        Objects.requireNonNull(tracking, "tracking");
        Objects.requireNonNull(kinematics, "kinematics");
        Objects.requireNonNull(meeting, "meeting");
    }

    public static Settings defaults() {
        return new Settings(ScreeningSettings.defaults(), DetectionSettings.defaults(), TrackingSettings.defaults(),
                KinematicsSettings.defaults(), MeetingSettings.defaults());
    }

    /** Height of the beam centre above the radar beyond which nothing is claimed, m. */
    public double heightCeilingM() {
        return screening.heightCeilingM();
    }

    public Settings withHeightCeilingM(double ceilingM) {
        return new Settings(screening.withHeightCeilingM(ceilingM), detection, tracking, kinematics, meeting);
    }

    public Settings withDetection(DetectionSettings newDetection) {
        return new Settings(screening, newDetection, tracking, kinematics, meeting);
    }

    public Settings withTracking(TrackingSettings newTracking) {
        return new Settings(screening, detection, newTracking, kinematics, meeting);
    }
}
