package hemline.export;

import java.awt.geom.AffineTransform;
import java.awt.geom.Path2D;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Text as strokes. It needs no fonts of the machine, which a server may not have, and gives the same picture
 * everywhere. Characters it does not hold are drawn as an empty box.
 */
final class StrokeFont {
    private static final double CAP_HEIGHT = 9;
    private static final double LETTER_GAP = 2.2;
    private static final double SPACE = 3.6;
    private static final Glyph UNKNOWN = Glyph.parse("5 0,0 5,0 5,9 0,9 0,0");
    private static final StrokeFont STANDARD = load();

    private final Map<Integer, Glyph> glyphs;

    private StrokeFont(Map<Integer, Glyph> glyphs) {
        this.glyphs = glyphs;
    }

    static StrokeFont standard() {
        return STANDARD;
    }

    private static StrokeFont load() {
        Map<Integer, Glyph> glyphs = new HashMap<>();
        try (BufferedReader in = new BufferedReader(new InputStreamReader(
                StrokeFont.class.getResourceAsStream("/hemline/export/stroke-font.txt"), StandardCharsets.UTF_8))) {
            // Three lines of explanation lead the file; '#' itself is a glyph.
            for (String line : in.lines().skip(3).toList()) {
                int character = line.codePointAt(0);
                glyphs.put(character, Glyph.parse(line.substring(Character.charCount(character) + 1)));
            }
        } catch (IOException e) {
            throw new UncheckedIOException("the program's own stroke-font.txt cannot be read", e);
        }
        return new StrokeFont(glyphs);
    }

    /** Whether every character of a text can be drawn. */
    boolean holds(String text) {
        return text.codePoints().allMatch(c -> c == ' ' || glyphs.containsKey(c));
    }

    /** Width of a text whose capitals are {@code height} pixels high, pixels. */
    double width(String text, double height) {
        return text.isEmpty() ? 0 : (advance(text) - LETTER_GAP) * height / CAP_HEIGHT;
    }

    private double advance(String text) {
        return text.codePoints().mapToDouble(c -> c == ' ' ? SPACE : glyph(c).width() + LETTER_GAP).sum();
    }

    private Glyph glyph(int character) {
        return glyphs.getOrDefault(character, UNKNOWN);
    }

    /** The strokes of a text that starts at a point of its base line; y grows downward, as in pictures. */
    Path2D path(String text, double x, double y, double height) {
        double scale = height / CAP_HEIGHT;
        Path2D path = new Path2D.Double();
        double at = 0;
        for (int c : text.codePoints().toArray()) {
            if (c == ' ') {
                at += SPACE;
                continue;
            }
            AffineTransform place = new AffineTransform(scale, 0, 0, -scale, x + at * scale, y);
            path.append(glyph(c).shape().getPathIterator(place), false);
            at += glyph(c).width() + LETTER_GAP;
        }
        return path;
    }

    /**
     * @param width advance without the gap to the next letter
     * @param shape strokes, y upward
     */
    private record Glyph(double width, Path2D shape) {

        static Glyph parse(String spec) {
            int space = spec.indexOf(' ');
            Path2D shape = new Path2D.Double();
            for (String stroke : spec.substring(space + 1).split(";")) {
                char first = stroke.charAt(0);
                boolean curve = first == '~' || first == '@';
                double[][] corners = corners(curve ? stroke.substring(1) : stroke);
                if (first == '@') {
                    closed(shape, corners);
                } else if (curve) {
                    open(shape, corners);
                } else {
                    chain(shape, corners);
                }
            }
            return new Glyph(Double.parseDouble(spec.substring(0, space)), shape);
        }

        private static double[][] corners(String text) {
            String[] pairs = text.strip().split(" ");
            double[][] corners = new double[pairs.length][];
            for (int i = 0; i < pairs.length; i++) {
                String[] xy = pairs[i].split(",");
                corners[i] = new double[] {Double.parseDouble(xy[0]), Double.parseDouble(xy[1])};
            }
            return corners;
        }

        private static void chain(Path2D shape, double[][] p) {
            shape.moveTo(p[0][0], p[0][1]);
            for (int i = 1; i < p.length; i++) {
                shape.lineTo(p[i][0], p[i][1]);
            }
        }

        private static void open(Path2D shape, double[][] p) {
            shape.moveTo(p[0][0], p[0][1]);
            for (int i = 1; i + 1 < p.length; i++) {
                boolean last = i + 2 == p.length;
                double endX = last ? p[i + 1][0] : (p[i][0] + p[i + 1][0]) / 2;
                double endY = last ? p[i + 1][1] : (p[i][1] + p[i + 1][1]) / 2;
                shape.quadTo(p[i][0], p[i][1], endX, endY);
            }
        }

        private static void closed(Path2D shape, double[][] p) {
            int n = p.length;
            shape.moveTo((p[n - 1][0] + p[0][0]) / 2, (p[n - 1][1] + p[0][1]) / 2);
            for (int i = 0; i < n; i++) {
                double[] next = p[(i + 1) % n];
                shape.quadTo(p[i][0], p[i][1], (p[i][0] + next[0]) / 2, (p[i][1] + next[1]) / 2);
            }
            shape.closePath();
        }
    }
}
