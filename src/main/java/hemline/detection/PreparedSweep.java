package hemline.detection;

import hemline.sweep.ScreenedSweep;
import hemline.sweep.SweepFrame;

/**
 * Everything about one sweep that looking for boundaries needs; its gates are let go.
 *
 * @param raster   the sweep on the plane
 * @param rain     where rain is
 * @param evidence of this sweep alone
 * @param frame    where and when it looked
 */
record PreparedSweep(SweepRaster raster, RainMap rain, SweepEvidence evidence, SweepFrame frame) {

    static PreparedSweep of(int index, ScreenedSweep screened, Rasteriser rasteriser) {
        SweepRaster raster = rasteriser.raster(screened);
        RainMap rain = RainMap.of(raster);
        SweepEvidence evidence = new SweepEvidence(new StripResponses(raster), rain);
        return new PreparedSweep(raster, rain, evidence, SweepFrame.of(index, screened.raw()));
    }
}
