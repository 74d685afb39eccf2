package org.rodside.io;

import java.io.Closeable;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.rodside.model.Cylinder;
import org.rodside.model.InputException;
import org.rodside.model.Linkage;
import org.rodside.table.RowSource;
import org.rodside.units.Unit;

/**
 * Reads a duty file row by row (docs/load-histories.md). Rows come out in SI in a fixed layout: time; stroke of each cylinder; force
 * of the ground on the tip, x and y; payload; then cap and rod side pressure of each cylinder, NaN where none are measured. A bad
 * row stops the reading with its place. Not thread-safe.
 */
public final class DutySource implements RowSource, Closeable {

    /** Strokes may miss the cylinder's own range by this, for drawings and sensors are rounded; in m. */
    private static final double STROKE_MARGIN = 1e-4;

    private final CsvReader reader;
    private final Linkage linkage;
    private final String name;
    private final int cylinders;
    private final int width;
    private final List<String> chosen = new ArrayList<>();
    private final List<Integer> target = new ArrayList<>();
    private final List<Double> factor = new ArrayList<>();
    private final double[] shift;
    private final double[] cells;
    private boolean measured;
    private double last = Double.NEGATIVE_INFINITY;

    private record Meaning(int target, double factor, double shift) {}

    /**
     * Opens a duty file.
     *
     * @param file path, {@code -} for standard input, {@code .gz} packed
     * @throws InputException with every fault of the heading
     */
    public DutySource(String file, Linkage linkage) {
        this(CsvReader.open(file), file, linkage);
    }

    DutySource(CsvReader reader, String name, Linkage linkage) {
        this.reader = reader;
        this.name = name;
        this.linkage = linkage;
        cylinders = linkage.cylinders().size();
        width = width(cylinders);
        shift = new double[width];
        heading();
        reader.choose(chosen);
        cells = new double[chosen.size()];
    }

    /** Numbers in a row for so many cylinders. */
    public static int width(int cylinders) {
        return 4 + 3 * cylinders;
    }

    /** Whether pressures stand in place of the tip force. */
    public boolean measured() {
        return measured;
    }

    @Override
    public String name() {
        return name;
    }

    private Map<String, Meaning> meanings() {
        Map<String, Meaning> map = new LinkedHashMap<>();
        map.put("time_s", new Meaning(0, 1, 0));
        for (int c = 0; c < cylinders; c++) {
            Cylinder cylinder = linkage.cylinders().get(c);
            String prefix = cylinder.name() + ".";
            map.put(prefix + "fraction", new Meaning(1 + c, cylinder.stroke(), 0));
            for (Unit unit : List.of(Unit.MILLIMETRE, Unit.INCH)) {
                map.put(prefix + "stroke_" + unit.symbol(), new Meaning(1 + c, unit.inSi(), 0));
                map.put(prefix + "length_" + unit.symbol(), new Meaning(1 + c, unit.inSi(), -cylinder.retracted()));
            }
            for (Unit unit : List.of(Unit.BAR, Unit.PSI)) {
                map.put(prefix + "cap_" + unit.symbol(), new Meaning(4 + cylinders + 2 * c, unit.inSi(), 0));
                map.put(prefix + "rod_" + unit.symbol(), new Meaning(5 + cylinders + 2 * c, unit.inSi(), 0));
            }
        }
        for (Unit unit : List.of(Unit.KILONEWTON, Unit.POUND_FORCE)) {
            map.put("tip.x_" + unit.symbol(), new Meaning(1 + cylinders, unit.inSi(), 0));
            map.put("tip.y_" + unit.symbol(), new Meaning(2 + cylinders, unit.inSi(), 0));
        }
        for (Unit unit : List.of(Unit.KILOGRAM, Unit.POUND)) {
            map.put("payload_" + unit.symbol(), new Meaning(3 + cylinders, unit.inSi(), 0));
        }
        return map;
    }

    private void heading() {
        Map<String, Meaning> meanings = meanings();
        List<String> faults = new ArrayList<>();
        String[] from = new String[width];
        for (String column : reader.header()) {
            Meaning meaning = meanings.get(column);
            if (meaning == null) {
                faults.add(name + ": column '" + column + "' is not known; "
                        + NearestName.advice(column, meanings.keySet()));
            } else if (from[meaning.target()] != null) {
                faults.add(name + ": columns '" + from[meaning.target()] + "' and '" + column
                        + "' say the same twice; keep one of them");
            } else {
                from[meaning.target()] = column;
                chosen.add(column);
                target.add(meaning.target());
                factor.add(meaning.factor());
                shift[meaning.target()] = meaning.shift();
            }
        }
        complete(from, faults);
        if (!faults.isEmpty()) {
            throw new InputException(faults);
        }
    }

    private void complete(String[] from, List<String> faults) {
        if (from[0] == null) {
            faults.add(name + ": column 'time_s' is missing");
        }
        int pressures = 0;
        for (int c = 0; c < cylinders; c++) {
            String cylinder = linkage.cylinders().get(c).name();
            if (from[1 + c] == null) {
                faults.add(name + ": the motion of cylinder " + cylinder + " is missing; give one of " + cylinder
                        + ".fraction, " + cylinder + ".stroke_mm, " + cylinder + ".length_mm");
            }
            pressures += from[4 + cylinders + 2 * c] == null ? 0 : 1;
            pressures += from[5 + cylinders + 2 * c] == null ? 0 : 1;
        }
        boolean onTool = pressures > 0
                || from[1 + cylinders] != null
                || from[2 + cylinders] != null
                || from[3 + cylinders] != null;
        if (onTool && linkage.tool().isEmpty()) {
            faults.add(
                    name + ": tip force, payload and measured pressures act on the tool, and the linkage file has none;"
                            + " leave the columns out or add \"tool\"");
        }
        pressuresOrTip(pressures, from[1 + cylinders] != null, from[2 + cylinders] != null, faults);
    }

    private void pressuresOrTip(int pressures, boolean tipX, boolean tipY, List<String> faults) {
        if (tipX != tipY) {
            faults.add(name + ": tip.x and tip.y go together; give both columns or neither");
        }
        if (pressures > 0 && (tipX || tipY)) {
            faults.add(name + ": give the tip force or measured pressures, not both: the one follows from the other");
        }
        if (pressures > 0 && pressures < 2 * cylinders) {
            faults.add(name + ": measured pressures want cap and rod side of every cylinder; " + pressures + " of "
                    + 2 * cylinders + " columns are there");
        }
        if (pressures > 0 && cylinders < 2) {
            faults.add(name + ": the two parts of a tip force cannot be told from the pressures of one cylinder");
        }
        measured = pressures == 2 * cylinders;
    }

    @Override
    public boolean next(double[] values) {
        if (!reader.next(cells)) {
            return false;
        }
        Arrays.fill(values, 0, 4 + cylinders, 0);
        Arrays.fill(values, 4 + cylinders, width, Double.NaN);
        for (int i = 0; i < cells.length; i++) {
            int at = target.get(i);
            values[at] = cells[i] * factor.get(i) + shift[at];
        }
        check(values);
        last = values[0];
        return true;
    }

    private void check(double[] values) {
        if (!(values[0] > last)) {
            throw fault("time_s", values[0] + " s does not come after " + last + " s; time must rise from row to row");
        }
        for (int c = 0; c < cylinders; c++) {
            Cylinder cylinder = linkage.cylinders().get(c);
            double stroke = values[1 + c];
            if (!(stroke >= -STROKE_MARGIN && stroke <= cylinder.stroke() + STROKE_MARGIN)) {
                throw fault(
                        column(1 + c),
                        "a stroke of " + Unit.MILLIMETRE.fromSi(stroke) + " mm is outside the cylinder's 0 to "
                                + Unit.MILLIMETRE.fromSi(cylinder.stroke()) + " mm");
            }
        }
        if (!(values[3 + cylinders] >= 0)) {
            throw fault(column(3 + cylinders), "a payload below 0 was found");
        }
    }

    private String column(int at) {
        return chosen.get(target.indexOf(at));
    }

    private InputException fault(String column, String what) {
        return new InputException(reader.where() + ", column " + column + ": " + what);
    }

    @Override
    public void close() {
        reader.close();
    }
}
