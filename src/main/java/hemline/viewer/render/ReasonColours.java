package hemline.viewer.render;

import hemline.sweep.MaskReason;

/** The colour each mask reason is drawn in; they differ in lightness too, for any kind of colour vision. */
public final class ReasonColours {
    private ReasonColours() {
    }

    /** Colour as {@code 0xAARRGGBB}. */
    public static int argb(MaskReason reason) {
        return switch (reason) {
            case CLUTTER -> 0xffc8651b;
            case SPIKE -> 0xfff2d04b;
            case SPECKLE -> 0xff8a8f98;
            case SECOND_TRIP -> 0xffd98cc4;
            case BLOCKED -> 0xff5b4a8a;
            case DEEP_CONVECTION -> 0xff7fc4e8;
            case ABOVE_CEILING -> 0xff2f3a44;
        };
    }
}
