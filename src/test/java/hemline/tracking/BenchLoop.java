package hemline.tracking;

import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.core.type.TypeReference;
import hemline.boundary.ObservedBoundary;
import hemline.boundary.truth.Truth;
import hemline.geodesy.BeamGeometry;
import hemline.simulation.SimulatedLoop;
import hemline.sweep.RayGeometry;
import hemline.sweep.Sweep;
import hemline.sweep.SweepFrame;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** The truth and the frames of an invented loop, without its gates, so that it is made once and read fast. */
record BenchLoop(Truth truth, List<Frame> rays) {
    record Frame(double[] azimuthDeg, double[] elevationDeg, long[] timeMs, double beamDeg, double altitudeM) {
    }

    static BenchLoop of(SimulatedLoop made) {
        List<Frame> rays = new ArrayList<>();
        for (int k = 0; k < made.size(); k++) {
            Sweep sweep = made.sweep(k);
            int n = sweep.rayCount();
            Frame frame = new Frame(new double[n], new double[n], new long[n], sweep.elevationDeg(),
                    sweep.beam().antennaAltitudeM());
            for (int i = 0; i < n; i++) {
                frame.azimuthDeg[i] = sweep.rays().azimuthDeg(i);
                frame.elevationDeg[i] = sweep.rays().elevationDeg(i);
                frame.timeMs[i] = sweep.rays().timeMs(i);
            }
            rays.add(frame);
        }
        return new BenchLoop(made.truth(), rays);
    }

    List<SweepFrame> frames() {
        List<SweepFrame> frames = new ArrayList<>();
        for (Frame one : rays) {
            frames.add(new SweepFrame(frames.size(), new RayGeometry(one.azimuthDeg, one.elevationDeg, one.timeMs),
                    new BeamGeometry(one.beamDeg, one.altitudeM)));
        }
        return frames;
    }

    void write(Path file) throws IOException {
        Files.createDirectories(file.getParent());
        new ObjectMapper().writeValue(file.toFile(), this);
    }

    static BenchLoop read(Path file) throws IOException {
        return new ObjectMapper().readValue(file.toFile(), BenchLoop.class);
    }

    static void writeFound(List<ObservedBoundary> found, Path file) throws IOException {
        new ObjectMapper().writeValue(file.toFile(), found);
    }

    static List<ObservedBoundary> readFound(Path file) throws IOException {
        return new ObjectMapper().configure(com.fasterxml.jackson.databind.DeserializationFeature
                .FAIL_ON_UNKNOWN_PROPERTIES, false).readValue(file.toFile(), new TypeReference<>() {
                });
    }
}
