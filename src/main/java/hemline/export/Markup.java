package hemline.export;

/** Text for HTML and SVG; whatever comes from files, folders or settings goes through {@link #escape}. */
final class Markup {
    private Markup() {
    }

    /** The words with every character that could open markup or leave an attribute replaced; controls dropped. */
    static String escape(String words) {
        StringBuilder out = new StringBuilder(words.length() + 16);
        words.codePoints().forEach(c -> {
            switch (c) {
                case '&' -> out.append("&amp;");
                case '<' -> out.append("&lt;");
                case '>' -> out.append("&gt;");
                case '"' -> out.append("&quot;");
                case '\'' -> out.append("&#39;");
                default -> {
                    boolean text = c == '\n' || c == '\t' || c >= 0x20 && c != 0x7f && (c < 0x80 || c > 0x9f)
                            && (c < 0xd800 || c > 0xdfff) && (c & 0xfffe) != 0xfffe;
                    if (text) {
                        out.appendCodePoint(c);
                    }
                }
            }
        });
        return out.toString();
    }
}
