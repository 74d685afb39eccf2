package org.rodside.study;

import java.util.List;
import java.util.Map;

/**
 * Working range of a front.
 *
 * @param dimensions named dimensions in the order of the contract of docs/working-range.md; in m, NaN where one does not exist
 * @param at fraction of stroke of each cylinder at each dimension that exists and has one pose
 * @param outline boundary of what the tip reaches: the outer ring anticlockwise first, holes clockwise after it; each ring closed, in
 *     m, as {x, y} arrays; not to be modified
 * @param notes what a reader should know, each a sentence
 */
public record RangeAnswer(
        Map<String, Double> dimensions, Map<String, double[]> at, List<double[][]> outline, List<String> notes) {

    public RangeAnswer {
        outline = List.copyOf(outline);
        notes = List.copyOf(notes);
    }
}
