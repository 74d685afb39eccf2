package org.rodside.report;

import java.util.ArrayList;
import java.util.List;
import org.rodside.chart.Plot;
import org.rodside.chart.Svg;
import org.rodside.table.Table;
import org.rodside.units.UnitSystem;

/**
 * Builds one page that needs nothing outside itself: no script, no font, no picture file; it reads on a screen and
 * prints on A4. Everything given is text and is escaped. The result is well-formed XML. Grows from top to bottom; not
 * thread-safe.
 */
public final class PageWriter {

    /** Height of a drawing of a linkage as a share of the page's width. */
    public static final double DRAWING = 0.68;

    private static final int FIGURE_WIDTH = 860;

    private static final String STYLE = """
            body{font:15px/1.5 'Segoe UI','Helvetica Neue',Arial,sans-serif;color:#2a2d33;background:#fff;\
            max-width:920px;margin:2em auto;padding:0 1.5em}
            h1{font-size:1.7em;line-height:1.2;margin:0 0 .3em}
            h2{font-size:1.2em;margin:2em 0 .4em;padding-top:.6em;border-top:2px solid #1b967f}
            p{margin:.5em 0}.job{font-size:1.05em}.note{color:#5b616b;font-size:.92em}
            nav{margin:1em 0}nav a{color:#2153ab;margin-right:1.2em;text-decoration:none}
            figure{margin:1em 0;break-inside:avoid}svg{max-width:100%;height:auto;display:block}
            figcaption,caption{font-size:.92em;color:#5b616b;text-align:left;padding:.3em 0}
            .wide{overflow-x:auto}table{border-collapse:collapse;font-size:.9em;margin:.8em 0}
            th{text-align:left;border-bottom:1.5px solid #7a808a;padding:.25em .9em .25em 0;vertical-align:bottom}
            td{border-bottom:1px solid #e3e5e8;padding:.25em .9em .25em 0;white-space:nowrap}
            .n{text-align:right;font-variant-numeric:tabular-nums}
            .cautions{border:1.5px solid #ee6748;border-left-width:7px;padding:.5em 1em;margin:1.5em 0;\
            break-inside:avoid}.cautions ul{margin:.3em 0;padding-left:1.2em}
            @media print{@page{size:A4;margin:16mm}body{font-size:10.5pt;margin:0;padding:0;max-width:none}\
            h2{break-after:avoid}tr{break-inside:avoid}nav{display:none}.wide{overflow:visible}}
            """;

    private final String title;
    private final String job;
    private final StringBuilder body = new StringBuilder();
    private final List<String> headings = new ArrayList<>();

    /**
     * An empty page.
     *
     * @param title heading of the page
     * @param job what was computed, from what, for whom: one paragraph
     */
    public PageWriter(String title, String job) {
        this.title = title;
        this.job = job;
    }

    /** Starts a section with a sentence that says what its figures show; the sentence may be empty. */
    public PageWriter section(String heading, String lead) {
        headings.add(heading);
        body.append("<h2 id=\"s" + headings.size() + "\">" + escape(heading) + "</h2>\n");
        return lead.isEmpty() ? this : paragraph("", lead);
    }

    /** A paragraph. */
    public PageWriter text(String words) {
        return paragraph("", words);
    }

    /** A paragraph in small print. */
    public PageWriter note(String words) {
        return paragraph(" class=\"note\"", words);
    }

    /**
     * A picture with its caption.
     *
     * @param share height as a share of the width
     */
    public PageWriter figure(Plot plot, String caption, double share) {
        body.append("<figure>\n" + Svg.of(plot.untitled(), FIGURE_WIDTH, (int) Math.round(FIGURE_WIDTH * share)));
        body.append("<figcaption>" + escape(caption) + "</figcaption>\n</figure>\n");
        return this;
    }

    /** The first rows of a table; says how many were left out. */
    public PageWriter table(String caption, Table table, UnitSystem units, int mostRows) {
        table(caption, TextTable.headings(table, units), TextTable.rows(table, units, mostRows));
        int left = table.rows() - mostRows;
        return left > 0 ? note(left + " more rows are in the table's own file.") : this;
    }

    /** A table of words; cells that are numbers stand to the right. */
    public PageWriter table(String caption, List<String> headings, List<List<String>> rows) {
        body.append("<div class=\"wide\"><table>\n");
        if (!caption.isEmpty()) {
            body.append("<caption>" + escape(caption) + "</caption>\n");
        }
        body.append("<thead><tr>");
        headings.forEach(heading -> body.append("<th>" + escape(heading) + "</th>"));
        body.append("</tr></thead>\n<tbody>\n");
        for (List<String> row : rows) {
            body.append("<tr>");
            row.forEach(cell -> body.append(cell(cell)));
            body.append("</tr>\n");
        }
        body.append("</tbody></table></div>\n");
        return this;
    }

    /** The box with the cautions. */
    public PageWriter cautions() {
        body.append("<div class=\"cautions\"><strong>Cautions</strong>\n<ul>\n");
        List<String> all = new ArrayList<>(Cautions.estimates());
        all.addAll(Cautions.work());
        all.forEach(line -> body.append("<li>" + escape(line) + "</li>\n"));
        body.append("</ul></div>\n");
        return this;
    }

    /** The whole page so far. */
    public String html() {
        StringBuilder nav = new StringBuilder();
        for (int i = 0; i < headings.size(); i++) {
            nav.append("<a href=\"#s" + (i + 1) + "\">" + escape(headings.get(i)) + "</a>\n");
        }
        return "<!DOCTYPE html>\n<html xmlns=\"http://www.w3.org/1999/xhtml\" lang=\"en\">\n<head>\n"
                + "<meta charset=\"utf-8\"/>\n<meta name=\"viewport\" content=\"width=device-width\"/>\n<title>"
                + escape(title) + "</title>\n<style>\n" + STYLE + "</style>\n</head>\n<body>\n<h1>" + escape(title)
                + "</h1>\n<p class=\"job\">" + escape(job) + "</p>\n"
                + (nav.isEmpty() ? "" : "<nav>\n" + nav + "</nav>\n") + body + "</body>\n</html>\n";
    }

    private static String escape(String raw) {
        return Svg.escape(raw);
    }

    private PageWriter paragraph(String attributes, String words) {
        body.append("<p" + attributes + ">" + escape(words) + "</p>\n");
        return this;
    }

    private static String cell(String text) {
        boolean number = !text.isEmpty() && text.chars().allMatch(c -> "+-.0123456789E".indexOf(c) >= 0);
        return (number ? "<td class=\"n\">" : "<td>") + escape(text) + "</td>";
    }
}
