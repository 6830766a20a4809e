package hemline.export;

import java.awt.Color;
import java.util.Locale;

/** A drawing in SVG 1.1, put together from a few kinds of mark; coordinates in pixels, rounded to a tenth. */
final class Svg {
    private final StringBuilder body = new StringBuilder();
    private final int width;
    private final int height;

    Svg(int width, int height) {
        this.width = width;
        this.height = height;
    }

    static String colour(Color color) {
        return String.format(Locale.ROOT, "#%02x%02x%02x", color.getRed(), color.getGreen(), color.getBlue());
    }

    /** A chain of points {@code {x, y}}. */
    Svg line(double[][] points, String stroke, double strokeWidth, double opacity, String dashes) {
        body.append("<polyline fill=\"none\" stroke=\"").append(stroke).append("\" stroke-width=\"")
                .append(px(strokeWidth)).append("\" stroke-linejoin=\"round\" stroke-linecap=\"round\"");
        if (opacity < 1) {
            body.append(" stroke-opacity=\"").append(Numbers.fixed(opacity, 2)).append('"');
        }
        if (!dashes.isEmpty()) {
            body.append(" stroke-dasharray=\"").append(dashes).append('"');
        }
        return points(points);
    }

    /** A filled area without a rim. */
    Svg area(double[][] points, String fill, double opacity) {
        body.append("<polygon stroke=\"none\" fill=\"").append(fill).append("\" fill-opacity=\"")
                .append(Numbers.fixed(opacity, 2)).append('"');
        return points(points);
    }

    private Svg points(double[][] points) {
        body.append(" points=\"");
        for (int i = 0; i < points.length; i++) {
            body.append(i == 0 ? "" : " ").append(px(points[i][0])).append(',').append(px(points[i][1]));
        }
        body.append("\"/>\n");
        return this;
    }

    Svg circle(double x, double y, double radius, String stroke, double strokeWidth, String dashes) {
        body.append("<circle fill=\"none\" cx=\"").append(px(x)).append("\" cy=\"").append(px(y)).append("\" r=\"")
                .append(px(radius)).append("\" stroke=\"").append(stroke).append("\" stroke-width=\"")
                .append(px(strokeWidth)).append('"');
        if (!dashes.isEmpty()) {
            body.append(" stroke-dasharray=\"").append(dashes).append('"');
        }
        body.append("/>\n");
        return this;
    }

    /** @param anchor {@code start}, {@code middle} or {@code end} */
    Svg words(String text, double x, double y, double size, String fill, String anchor) {
        body.append("<text x=\"").append(px(x)).append("\" y=\"").append(px(y)).append("\" font-size=\"")
                .append(px(size)).append("\" fill=\"").append(fill).append("\" text-anchor=\"").append(anchor)
                .append("\">").append(Markup.escape(text)).append("</text>\n");
        return this;
    }

    /** The drawing with a name that a screen reader says. */
    String drawing(String name) {
        return "<svg xmlns=\"http://www.w3.org/2000/svg\" role=\"img\" aria-label=\"" + Markup.escape(name)
                + "\" viewBox=\"0 0 " + width + " " + height + "\" width=\"" + width + "\" height=\"" + height
                + "\" font-family=\"sans-serif\">\n<title>" + Markup.escape(name) + "</title>\n" + body + "</svg>\n";
    }

    private static String px(double value) {
        String text = Numbers.fixed(value, 1);
        return text.endsWith(".0") ? text.substring(0, text.length() - 2) : text;
    }
}
