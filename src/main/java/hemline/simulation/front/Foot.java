package hemline.simulation.front;

/** Where a place lies with respect to a curve: a reusable answer, so that none is allocated for each gate. */
public final class Foot {
    /** Distance from the curve along its normal, km; positive on the side it moves toward. */
    public double aheadKm;
    /** Station along the curve: km from its middle for a bow, radians of bearing from the centre for a ring. */
    public double station;
}
