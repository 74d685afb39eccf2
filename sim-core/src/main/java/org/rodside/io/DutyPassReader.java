package org.rodside.io;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.rodside.model.Cylinder;
import org.rodside.model.DutyPass;
import org.rodside.model.InputException;
import org.rodside.model.Linkage;
import org.rodside.units.Unit;

/** Reads a pass file (docs/load-histories.md) as strictly as a linkage file: whole, or refused with every fault. */
public final class DutyPassReader {

    /** The format this reader knows. */
    public static final String FORMAT = "rodside-duty/1";

    private static final double MOST_RATE = 10_000;
    /** Most samples of a pass: five hours and a half at 50 a second; more is a slip of the finger. */
    private static final double MOST_SAMPLES = 1e6;

    private static final Amount DEGREES = Amount.plain("the angle in degrees", Range.ANY);

    private final FieldReader file;
    private final FaultAccumulator faults;
    private final FileUnits units;
    private final Amount coordinate;

    private DutyPassReader(FieldReader file, FaultAccumulator faults) {
        this.file = file;
        this.faults = faults;
        units = FileUnits.read(file);
        coordinate = units.length("the coordinate", Range.ANY);
    }

    /**
     * Reads a pass file.
     *
     * @param path the file
     * @param linkage the linkage that makes the pass, for the names of its cylinders
     * @return the pass; in SI
     * @throws InputException with every fault, when there is one
     */
    public static DutyPass read(Path path, Linkage linkage) {
        FaultAccumulator faults = new FaultAccumulator(path.toString());
        String text = SourceFile.text(SourceFile.bytes(path), faults);
        faults.throwIfAny();
        JsonTree.Parsed parsed = JsonTree.parse(text, "", faults);
        if (parsed.trouble() != null) {
            faults.add("", parsed.trouble());
        }
        FieldReader file = new FieldReader(faults, "", parsed.root(), "a pass file is one object");
        if (!(parsed.root() instanceof Map<?, ?>)) {
            faults.throwIfAny();
        }
        DutyPass pass = new DutyPassReader(file, faults).pass(linkage);
        faults.throwIfAny();
        return pass;
    }

    private DutyPass pass(Linkage linkage) {
        file.only("format", "name", "note", "units", "rate_hz", "ground", "start", "moves", "hold");
        String remedy = "this program reads \"" + FORMAT + "\"";
        file.text("format", remedy)
                .filter(format -> !format.equals(FORMAT))
                .ifPresent(format -> file.fault(
                        "format", "is another format, found \"" + JsonTree.shorten(format) + "\"; " + remedy));
        double rate = file.number("rate_hz", Amount.plain("samples a second", Range.ABOVE_ZERO));
        if (rate > MOST_RATE) {
            file.fault("rate_hz", "is more than 10000, found " + rate + "; give samples a second");
        }
        FieldReader start =
                file.object("start", "give {\"tip\": [x, y], \"tool_deg\": …}").only("tip", "tool_deg");
        List<DutyPass.Move> moves = moves();
        double seconds = moves.stream().mapToDouble(DutyPass.Move::seconds).sum();
        if (rate * seconds > MOST_SAMPLES) {
            file.fault(
                    "moves",
                    "take " + seconds + " s in all, which at " + rate
                            + " samples a second is more than a million samples;"
                            + " give shorter moves or a smaller rate_hz");
        }
        return new DutyPass(
                rate,
                file.has("ground") ? Optional.of(soil()) : Optional.empty(),
                start.point("tip", coordinate),
                Unit.DEGREE.toSi(start.number("tool_deg", DEGREES)),
                moves,
                hold(linkage));
    }

    private DutyPass.Soil soil() {
        FieldReader ground = file.object("ground", "give density, cohesion_kPa, friction_deg, wall_friction_deg")
                .only(
                        "density",
                        "cohesion_kPa",
                        "friction_deg",
                        "wall_friction_deg",
                        "adhesion_kPa",
                        "surcharge_kPa",
                        "fill_factor");
        double friction = ground.number("friction_deg", DEGREES);
        if (!(friction > 0 && friction < 60)) {
            ground.fault("friction_deg", "must be above 0 and below 60, found " + friction);
        }
        double wall = ground.number("wall_friction_deg", DEGREES);
        if (!(wall >= 0 && wall < 60)) {
            ground.fault("wall_friction_deg", "must be from 0 to below 60, found " + wall);
        }
        return new DutyPass.Soil(
                ground.number("density", Amount.plain("the density in kg/m3", Range.ABOVE_ZERO)),
                pressure(ground, "cohesion_kPa"),
                Unit.DEGREE.toSi(friction),
                Unit.DEGREE.toSi(wall),
                pressure(ground, "adhesion_kPa"),
                pressure(ground, "surcharge_kPa"),
                ground.number("fill_factor", Amount.plain("heaped volume over capacity", Range.ABOVE_ZERO), 1));
    }

    private static double pressure(FieldReader ground, String key) {
        return Unit.KILOPASCAL.toSi(ground.number(key, Amount.plain("the pressure in kPa", Range.ZERO_OR_MORE), 0));
    }

    private List<DutyPass.Move> moves() {
        List<DutyPass.Move> moves = new ArrayList<>();
        String remedy = "list the moves, each {\"to\": [x, y], \"tool_deg\": …, \"seconds\": …}";
        if (!(file.node("moves", remedy) instanceof List<?> list) || list.isEmpty()) {
            file.fault("moves", "must be a list with at least one move; " + remedy);
            return moves;
        }
        for (int i = 0; i < list.size(); i++) {
            FieldReader move = new FieldReader(faults, "moves." + i, list.get(i), remedy)
                    .only("to", "tool_deg", "seconds", "cut", "empty");
            moves.add(new DutyPass.Move(
                    move.point("to", coordinate),
                    Unit.DEGREE.toSi(move.number("tool_deg", DEGREES)),
                    move.number("seconds", Amount.plain("seconds", Range.ABOVE_ZERO)),
                    move.number("cut", units.length("the depth of cut", Range.ZERO_OR_MORE), 0),
                    flag(move)));
        }
        return moves;
    }

    private static boolean flag(FieldReader move) {
        if (!move.has("empty")) {
            return false;
        }
        Object node = move.node("empty", "give true or false");
        if (!(node instanceof Boolean)) {
            move.fault("empty", "must be true or false, found " + JsonTree.describe(node));
            return false;
        }
        return (Boolean) node;
    }

    private Map<String, Double> hold(Linkage linkage) {
        Map<String, Double> hold = new LinkedHashMap<>();
        if (!file.has("hold")) {
            return hold;
        }
        List<String> names = linkage.cylinders().stream().map(Cylinder::name).toList();
        FieldReader at = file.object("hold", "give fractions of stroke by name of cylinder");
        at.only(names.toArray(new String[0]));
        for (String name : names) {
            if (at.has(name)) {
                double fraction = at.number(name, Amount.plain("the fraction of stroke", Range.ZERO_OR_MORE));
                if (fraction > 1) {
                    at.fault(name, "must be from 0 to 1, found " + fraction);
                }
                hold.put(name, fraction);
            }
        }
        return hold;
    }
}
