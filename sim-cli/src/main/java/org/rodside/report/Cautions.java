package org.rodside.report;

import java.util.List;

/** The cautions that go with every result which somebody might lift, dig or weld by. The one place where they are worded. */
public final class Cautions {

    private static final List<String> ESTIMATES = List.of(
            "Engineering estimates for a planar, rigid linkage on firm, level ground; dynamic effects are counted only"
                    + " where the text says so.",
            "Not a rated-load chart. Ratings are established, tested and marked under the applicable standards and"
                    + " local codes.",
            "A licensed engineer checks and signs what is built, altered or lifted on the strength of these numbers.");

    private static final List<String> WORK = List.of(
            "Before work on the front or its hydraulics: lower the tool to the ground, lock out, release the pressure"
                    + " in every circuit, and block what could fall.",
            "Stay clear of raised equipment and of its reach; a holding circuit is not a support.");

    private Cautions() {}

    /** What the numbers are and are not: for every lift, sizing and report output. */
    public static List<String> estimates() {
        return ESTIMATES;
    }

    /** How to keep from harm at the machine. */
    public static List<String> work() {
        return WORK;
    }

    /** The cautions on estimates as lines for the terminal. */
    public static String text() {
        return "Cautions:\n  " + String.join("\n  ", ESTIMATES) + "\n";
    }
}
