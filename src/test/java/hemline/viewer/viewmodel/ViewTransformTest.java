package hemline.viewer.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import hemline.geometry.Point;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;

class ViewTransformTest {
    private final ViewTransform view = ViewTransform.fitting(100, 800, 600);

    @Test
    void theRadarIsInTheMiddleOfAFittedViewAndNorthIsUp() {
        assertThat(view.screenX(0)).isEqualTo(400);
        assertThat(view.screenY(0)).isEqualTo(300);
        assertThat(view.screenY(50)).isLessThan(300);
        assertThat(view.screenX(50)).isGreaterThan(400);
    }

    @Test
    void aFittedCircleLiesWithinTheShorterSide() {
        assertThat(view.screenY(-100)).isLessThan(600).isGreaterThan(560);
    }

    @Property(tries = 200)
    void screenAndPlaneAreInverse(@ForAll @DoubleRange(min = -300, max = 300) double x,
                                  @ForAll @DoubleRange(min = -300, max = 300) double y,
                                  @ForAll @DoubleRange(min = 0.4, max = 400) double zoom) {
        ViewTransform any = new ViewTransform(new Point(x / 3, -y / 5), zoom, 640, 480);
        Point back = any.toPlane(any.screenX(x), any.screenY(y));
        assertThat(back.xKm()).isCloseTo(x, within(1e-8));
        assertThat(back.yKm()).isCloseTo(y, within(1e-8));
    }

    @Property(tries = 200)
    void zoomingKeepsThePlaceUnderTheCursor(@ForAll @DoubleRange(min = 0.01, max = 100) double factor,
                                            @ForAll @DoubleRange(min = 0, max = 800) double xPx,
                                            @ForAll @DoubleRange(min = 0, max = 600) double yPx) {
        Point before = view.toPlane(xPx, yPx);
        Point after = view.zoomed(factor, xPx, yPx).toPlane(xPx, yPx);
        assertThat(after.distanceKm(before)).isLessThan(1e-6);
    }

    @Test
    void draggingRightMovesThePlaneRight() {
        ViewTransform dragged = view.panned(30, 20);
        assertThat(dragged.screenX(0)).isCloseTo(430, within(1e-9));
        assertThat(dragged.screenY(0)).isCloseTo(320, within(1e-9));
    }

    @Test
    void zoomStopsAtItsLimits() {
        assertThat(view.zoomed(1e9, 0, 0).pxPerKm()).isEqualTo(ViewTransform.MAX_PX_PER_KM);
        assertThat(view.zoomed(1e-9, 0, 0).pxPerKm()).isEqualTo(ViewTransform.MIN_PX_PER_KM);
    }

    @Test
    void aZoomBeyondTheLimitsIsRefusedWithBoundAndValue() {
        assertThatThrownBy(() -> new ViewTransform(new Point(0, 0), 0.1, 10, 10))
                .isInstanceOf(IllegalArgumentException.class).hasMessageContaining("0.3").hasMessageContaining("0.1");
    }
}
