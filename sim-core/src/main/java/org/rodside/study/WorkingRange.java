package org.rodside.study;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.IntFunction;

/** Working range of the tip and the hook: named dimensions and the true outline (docs/working-range.md). */
public final class WorkingRange {

    /** Length of the level floor that the level depth is measured on: 96 in, ISO 7135; in m. */
    public static final double LEVEL_FLOOR = 2.44;

    private WorkingRange() {}

    /** Finds dimensions and outline of a front, the same for any number of threads; an error where the linkage has no tool. */
    public static RangeAnswer of(Front front, int threads) {
        front.tool();
        StrokeTrim trim = StrokeTrim.of(front);
        List<String> names = RangeDimensions.NAMES;
        List<double[][]> outline = new ArrayList<>();
        List<Optimum> found = new ArrayList<>();
        // the outline first, for it takes longest
        new Chunks(threads, done -> {}).<Optimum>inOrder(1 + names.size(), () -> worker(trim, outline), found::add);
        Map<String, Double> dimensions = new LinkedHashMap<>();
        Map<String, double[]> poses = new LinkedHashMap<>();
        for (int i = 0; i < names.size(); i++) {
            Optimum dimension = found.get(1 + i);
            dimensions.put(names.get(i), dimension.value());
            if (dimension.exists()) {
                poses.put(names.get(i), dimension.at());
            }
        }
        dimensions.put("level_depth", -Outline.deepestLevel(outline, LEVEL_FLOOR));
        return new RangeAnswer(dimensions, poses, outline, trim.notes());
    }

    /** The first piece fills the outline and has no answer of its own, each later one finds a dimension. */
    private static IntFunction<Optimum> worker(StrokeTrim trim, List<double[][]> outline) {
        RangeDimensions range = new RangeDimensions(trim);
        return piece -> {
            if (piece == 0) {
                outline.addAll(Outline.of(trim.front()));
                return null;
            }
            return range.find(RangeDimensions.NAMES.get(piece - 1));
        };
    }
}
