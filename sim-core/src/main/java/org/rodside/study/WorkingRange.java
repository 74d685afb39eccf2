package org.rodside.study;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Working range of the tip and the hook: named dimensions and the true outline (docs/working-range.md). */
public final class WorkingRange {

    /** Length of the level floor that the level depth is measured on: 96 in, ISO 7135; in m. */
    public static final double LEVEL_FLOOR = 2.44;

    private WorkingRange() {}

    /** Finds dimensions and outline of a front; an error where the linkage has no tool. */
    public static RangeAnswer of(Front front) {
        front.tool();
        RangeDimensions found = new RangeDimensions(front);
        found.find();
        List<double[][]> outline = Outline.of(front);
        Map<String, Double> dimensions = new LinkedHashMap<>(found.values());
        dimensions.put("level_depth", -Outline.deepestLevel(outline, LEVEL_FLOOR));
        return new RangeAnswer(dimensions, found.poses(), outline);
    }
}
