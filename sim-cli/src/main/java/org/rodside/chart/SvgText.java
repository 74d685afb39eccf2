package org.rodside.chart;

import java.util.Locale;

/** The letters of an SVG file: elements, escaping, short numbers. Grows while it is written; not thread-safe. */
final class SvgText {

    private static final String FONT = "font-family=\"'Segoe UI', 'Helvetica Neue', Arial, sans-serif\"";

    private final StringBuilder text = new StringBuilder(4096);

    /** Path data, one tenth of a pixel fine. */
    static final class Path {

        private final StringBuilder data = new StringBuilder();

        Path move(double x, double y) {
            return step('M', x, y);
        }

        Path line(double x, double y) {
            return step('L', x, y);
        }

        Path polyline(double[] x, double[] y) {
            for (int i = 0; i < x.length; i++) {
                step(i == 0 ? 'M' : 'L', x[i], y[i]);
            }
            return this;
        }

        Path end() {
            data.append('Z');
            return this;
        }

        private Path step(char letter, double x, double y) {
            data.append(letter).append(number(x)).append(' ').append(number(y));
            return this;
        }
    }

    /** Width of a text in a usual sans-serif face, a little generous; in pixels for a size in pixels. */
    static double width(String text, double size) {
        double ems = 0;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            boolean narrow = "iljtf.,:;|!'()[] \u2009".indexOf(c) >= 0;
            boolean wide = "mwMWOQ%@".indexOf(c) >= 0;
            ems += narrow ? 0.34 : wide ? 0.86 : Character.isUpperCase(c) ? 0.68 : 0.57;
        }
        return ems * size;
    }

    /** A number with at most one decimal. */
    static String number(double value) {
        long tenths = Math.round(value * 10);
        String sign = tenths < 0 ? "-" : "";
        long size = Math.abs(tenths);
        return sign + size / 10 + (size % 10 == 0 ? "" : "." + size % 10);
    }

    /** Text made safe inside elements and attributes; letters that XML does not allow become a question mark. */
    static String escape(String raw) {
        StringBuilder safe = new StringBuilder(raw.length() + 16);
        raw.codePoints().forEach(c -> {
            switch (c) {
                case '&' -> safe.append("&amp;");
                case '<' -> safe.append("&lt;");
                case '>' -> safe.append("&gt;");
                case '"' -> safe.append("&quot;");
                case '\'' -> safe.append("&#39;");
                default -> safe.appendCodePoint(allowed(c) ? c : '?');
            }
        });
        return safe.toString();
    }

    private static boolean allowed(int c) {
        boolean control = c < 0x20 && c != '\t' && c != '\n' && c != '\r';
        boolean half = c >= 0xD800 && c <= 0xDFFF;
        return !control && !half && c != 0xFFFE && c != 0xFFFF;
    }

    private static String colour(int rgb) {
        return String.format(Locale.ROOT, "#%06x", rgb);
    }

    void open(int width, int height, String title) {
        text.append("<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 " + width + ' ' + height + "\" width=\""
                + width + "\" height=\"" + height + "\" role=\"img\" " + FONT + ">\n");
        if (!title.isEmpty()) {
            text.append("<title>").append(escape(title)).append("</title>\n");
        }
    }

    String close() {
        return text.append("</svg>\n").toString();
    }

    void text(double x, double y, String words, String anchor, double size, String more) {
        if (!words.isEmpty()) {
            text.append("<text x=\"" + number(x) + "\" y=\"" + number(y) + "\" text-anchor=\"" + anchor
                    + "\" font-size=\"" + number(size) + "\" fill=\"" + colour(Palette.INK) + "\"");
            text.append(more.isEmpty() ? "" : " " + more);
            text.append('>').append(escape(words)).append("</text>\n");
        }
    }

    /** Text with a white rim, to be read on top of a drawing. */
    void haloed(double x, double y, String words, String anchor, double size) {
        text(x, y, words, anchor, size, "stroke=\"#fff\" stroke-width=\"3\" paint-order=\"stroke\"");
    }

    void stroke(Path path, int rgb, double width, String more) {
        if (!path.data.isEmpty()) {
            text.append("<path d=\"" + path.data + "\" fill=\"none\" stroke=\"" + colour(rgb) + "\" stroke-width=\""
                    + number(width) + "\" stroke-linejoin=\"round\"" + (more.isEmpty() ? "" : " " + more) + "/>\n");
        }
    }

    void fill(Path path, int inside, int rim) {
        if (!path.data.isEmpty()) {
            text.append("<path d=\"" + path.data + "\" fill=\"" + colour(inside) + "\" stroke=\"" + colour(rim)
                    + "\" stroke-width=\"1.4\" stroke-linejoin=\"round\"/>\n");
        }
    }

    void circle(double x, double y, double radius, int rgb) {
        text.append("<circle cx=\"" + number(x) + "\" cy=\"" + number(y) + "\" r=\"" + number(radius)
                + "\" fill=\"#fff\" stroke=\"" + colour(rgb) + "\" stroke-width=\"1.6\"/>\n");
    }
}
