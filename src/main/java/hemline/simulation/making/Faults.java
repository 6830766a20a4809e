package hemline.simulation.making;

import hemline.simulation.radar.RadarSpec;
import hemline.simulation.random.Streams;
import hemline.simulation.scene.FaultSpec;
import hemline.simulation.scene.SceneSpec;

/** Puts a scene's obstacles and receiver faults into a clean sweep, in the order of the scene. */
final class Faults {
    private final SceneSpec scene;
    private final SectorFaults sectors;
    private final ReceiverFaults receiver;
    private final Streams streams;

    Faults(SceneSpec scene, RadarSpec radar, Streams streams) {
        this.scene = scene;
        this.streams = streams;
        sectors = new SectorFaults(radar, streams);
        receiver = new ReceiverFaults();
    }

    void apply(CleanSweep clean, int sweep) {
        for (int i = 0; i < scene.faults().size(); i++) {
            FaultSpec fault = scene.faults().get(i);
            if (fault instanceof FaultSpec.Obstacle obstacle) {
                sectors.block(clean, obstacle, i);
            } else if (fault instanceof FaultSpec.SectorGain gain) {
                sectors.gain(clean, gain);
            } else if (fault instanceof FaultSpec.RainLoss loss) {
                sectors.attenuate(clean, loss);
            } else if (fault instanceof FaultSpec.SecondTrip trip) {
                sectors.secondTrip(clean, trip, streams.stream("second trip", i, sweep));
            } else if (fault instanceof FaultSpec.LostRays lost) {
                receiver.lose(clean, lost, streams.stream("lost", i, sweep));
            } else if (fault instanceof FaultSpec.RepeatedRays repeated) {
                receiver.repeat(clean, repeated, streams.stream("repeated", i, sweep));
            } else if (fault instanceof FaultSpec.Spikes spikes) {
                receiver.spike(clean, spikes, streams.stream("spikes", i, sweep));
            } else if (fault instanceof FaultSpec.SunStrobe strobe) {
                receiver.sun(clean, strobe);
            } else if (fault instanceof FaultSpec.RangeRings rings) {
                receiver.rings(clean, rings);
            } else if (fault instanceof FaultSpec.Speckles speckles) {
                receiver.speckle(clean, speckles, streams.stream("speckles", i, sweep));
            }
        }
    }
}
