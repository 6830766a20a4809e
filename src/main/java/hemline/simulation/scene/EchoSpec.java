package hemline.simulation.scene;

/** Something that scatters, besides the clear air and its fronts. */
public sealed interface EchoSpec permits Cell, Ground, Sheet, Band, Roost, Masts {
}
