package hemline.simulation.echo;

/** One thing that scatters. Layers hold no state that changes: several threads may ask one at once. */
interface EchoLayer {
    /** Adds what comes back along a ray. */
    void addTo(RayEcho ray);
}
