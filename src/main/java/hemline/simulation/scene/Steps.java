package hemline.simulation.scene;

/** The smooth step that softens every edge of a scene. */
public final class Steps {
    private Steps() {
    }

    /** 0 for t ≤ 0, 1 for t ≥ 1, 3t² − 2t³ between. */
    public static double smooth(double t) {
        if (t <= 0) {
            return 0;
        }
        return t >= 1 ? 1 : t * t * (3 - 2 * t);
    }
}
