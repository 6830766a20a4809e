package hemline.screening;

import hemline.sweep.Field;
import hemline.sweep.GateMask;
import hemline.sweep.MaskReason;
import hemline.sweep.NoiseFloor;
import hemline.sweep.ScreenedSweep;
import hemline.sweep.Sweep;

/** Gives the gates of one sweep their reasons, from the sweep itself and from what its loop taught. */
final class SweepScreener {
    private final ScreeningSettings settings;
    private final StayingEcho staying;
    private final BlockedSectors blocked;
    private final boolean byTexture;

    /** @param byTexture whether texture alone may call a gate clutter, for loops too short to know what stays */
    SweepScreener(ScreeningSettings settings, StayingEcho staying, BlockedSectors blocked, boolean byTexture) {
        this.settings = settings;
        this.staying = staying;
        this.blocked = blocked;
        this.byTexture = byTexture;
    }

    ScreenedSweep screen(Sweep sweep) {
        PolarGates gates = PolarGates.of(sweep, NoiseFloor.of(sweep));
        byte[] bits = new byte[gates.rays * gates.gates];
        Speckle.mark(gates, bits);
        boolean[] streak = RadialStreaks.find(gates);
        for (int r = 0; r < gates.rays; r++) {
            double azimuth = sweep.rays().azimuthDeg(r);
            for (int g = 0; g < gates.gates; g++) {
                double range = sweep.slantRangeM(g);
                int at = r * gates.gates + g;
                if (staying.at(azimuth, range)) {
                    bits[at] |= (byte) MaskReason.CLUTTER.bit();
                }
                if (blocked.at(azimuth, range)) {
                    bits[at] |= (byte) MaskReason.BLOCKED.bit();
                }
                if (streak[at]) {
                    bits[at] |= (byte) MaskReason.SPIKE.bit();
                }
            }
        }
        if (byTexture) {
            RoughEcho.mark(gates, bits);
        }
        DeepConvection.mark(gates, settings.convectionDbz(), bits);
        markAboveCeiling(sweep, bits);
        return new ScreenedSweep(sweep, new GateMask(gates.rays, gates.gates, bits));
    }

    private void markAboveCeiling(Sweep sweep, byte[] bits) {
        Field field = sweep.reflectivity();
        for (int g = field.gates() - 1; g >= 0; g--) {
            double height = sweep.beam().heightAboveAntennaM(Math.max(0, sweep.slantRangeM(g)));
            if (height <= settings.heightCeilingM()) {
                return;
            }
            for (int r = 0; r < field.rays(); r++) {
                bits[r * field.gates() + g] |= (byte) MaskReason.ABOVE_CEILING.bit();
            }
        }
    }
}
