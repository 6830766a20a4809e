package hemline.simulation.catalogue;

import hemline.simulation.scene.SceneSpec;

/** Makes one kind of scene. */
@FunctionalInterface
public interface SceneKind {
    SceneSpec build(SceneKit kit);
}
