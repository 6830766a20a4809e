package hemline.screening;

/**
 * How gates are screened.
 *
 * @param heightCeilingM height of the beam centre above the radar beyond which gates are set aside, m
 * @param clutterOverDb  how far a gate that stays must stand over its surroundings to be clutter, dB
 * @param convectionDbz  reflectivity from which an area is deep convection, dBZ
 */
public record ScreeningSettings(double heightCeilingM, double clutterOverDb, double convectionDbz) {
    public ScreeningSettings {
        if (!(heightCeilingM > 0 && heightCeilingM <= 20_000)) {
            throw new IllegalArgumentException("the height ceiling must be within 0..20000 m, got " + heightCeilingM);
        }
        if (!(clutterOverDb >= 3)) {
            throw new IllegalArgumentException("clutter must stand at least 3 dB over, got " + clutterOverDb);
        }
        if (!(convectionDbz >= 20 && convectionDbz <= 60)) {
            throw new IllegalArgumentException("convection must start within 20..60 dBZ, got " + convectionDbz);
        }
    }

    public static ScreeningSettings defaults() {
        return new ScreeningSettings(1500, 7, 34);
    }

    public ScreeningSettings withHeightCeilingM(double ceilingM) {
        return new ScreeningSettings(ceilingM, clutterOverDb, convectionDbz);
    }

    public ScreeningSettings withClutterOverDb(double overDb) {
        return new ScreeningSettings(heightCeilingM, overDb, convectionDbz);
    }

    public ScreeningSettings withConvectionDbz(double dbz) {
        return new ScreeningSettings(heightCeilingM, clutterOverDb, dbz);
    }
}
