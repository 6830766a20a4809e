package hemline.simulation.echo;

import hemline.geometry.Point;
import hemline.simulation.front.Foot;
import hemline.simulation.front.FrontCurve;
import hemline.simulation.random.Streams;
import hemline.simulation.random.Texture;
import hemline.simulation.scene.Band;
import hemline.simulation.scene.Steps;
import java.util.List;

/** A narrow band of rain. */
final class BandLayer implements EchoLayer {
    private static final double LOSS_PER_SD2_DB = 6;
    private static final double FAINTEST_DBZ = -6;
    private final Band band;
    private final Texture ragged;

    BandLayer(Band band, Streams streams) {
        this.band = band;
        ragged = new Texture(List.of(new Texture.Octave(9, 0.8 * band.raggedDb(), 1500),
                new Texture.Octave(2.4, 0.6 * band.raggedDb(), 600)), streams.part("band", band.number()));
    }

    @Override
    public void addTo(RayEcho ray) {
        double share = band.life().share(ray.timeS);
        if (share <= 0) {
            return;
        }
        FrontCurve.Still still = band.curve().still(ray.timeS);
        Texture.Still lumps = ragged.still(ray.timeS);
        Foot foot = new Foot();
        Point drift = still.followingMs(0, 0);
        double radial = drift.xKm() * ray.sin + drift.yKm() * ray.cos;
        double half = band.curve().lastStation();
        for (int b = 0; b < ray.bins(); b++) {
            still.locate(ray.xKm[b], ray.yKm[b], foot);
            double across = foot.aheadKm / band.sdKm();
            double end = Steps.smooth((half - Math.abs(foot.station)) / (0.2 * half));
            if (Math.abs(across) > 3.5 || end <= 0) {
                continue;
            }
            double dbz = band.dbz() - LOSS_PER_SD2_DB * across * across - 25 * (2 - share - end)
                    + lumps.at(foot.station, foot.aheadKm);
            if (dbz > FAINTEST_DBZ) {
                ray.addRest(b, Decibels.toLinear(dbz), radial);
            }
        }
    }
}
