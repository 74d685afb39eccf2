package org.rodside.io;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.rodside.model.InputException;
import org.rodside.model.Link;
import org.rodside.model.Linkage;
import org.rodside.model.Pin;
import org.rodside.model.Point;

/**
 * Reads a linkage file (docs/linkage-file.md) strictly. A file is taken whole or refused with every fault it has; no
 * value is repaired. First each value is judged alone (what docs/linkage.schema.json can say too), then the values
 * against each other ({@link LinkageChecks}, {@link MechanismChecks}).
 */
public final class LinkageReader {

    /** The format this reader knows. */
    public static final String FORMAT = "rodside-linkage/1";

    private static final String PINS_ON = "list the pins that are on it";

    private final FieldReader file;
    private final FaultAccumulator faults;
    private final FileUnits units;
    private final Map<String, Point> places = new HashMap<>();

    private LinkageReader(FieldReader file, FaultAccumulator faults) {
        this.file = file;
        this.faults = faults;
        this.units = FileUnits.read(file);
    }

    /**
     * Reads a linkage file.
     *
     * @param file the file
     * @param overrides values that replace those of the file before it is read, each {@code PATH=VALUE}
     * @return the linkage; in SI
     * @throws InputException with every fault, when there is one
     */
    public static Linkage read(Path file, List<String> overrides) {
        return read(file.toString(), SourceFile.bytes(file), overrides);
    }

    /**
     * Reads the bytes of a linkage file.
     *
     * @param sourceName what errors call the file
     * @param bytes UTF-8 JSON, with or without a byte order mark; not modified
     * @param overrides values that replace those of the file before it is read, each {@code PATH=VALUE}
     * @return the linkage; in SI
     * @throws InputException with every fault, when there is one
     */
    public static Linkage read(String sourceName, byte[] bytes, List<String> overrides) {
        FaultAccumulator faults = new FaultAccumulator(sourceName);
        LinkageReader reader = open(bytes, overrides, faults);
        Linkage linkage = reader == null ? null : reader.draft();
        if (linkage != null) {
            new LinkageChecks(linkage, reader.units, faults).run();
            new MechanismChecks(linkage, faults).run();
        }
        faults.throwIfAny();
        return linkage;
    }

    /** The faults that single values have, before values are held against each other. */
    static List<String> faultsOfSingleValues(byte[] bytes) {
        FaultAccumulator faults = new FaultAccumulator("file");
        LinkageReader reader = open(bytes, List.of(), faults);
        if (reader != null) {
            reader.draft();
        }
        return faults.lines();
    }

    private static LinkageReader open(byte[] bytes, List<String> overrides, FaultAccumulator faults) {
        String text = SourceFile.text(bytes, faults);
        if (text == null) {
            return null;
        }
        JsonTree.Parsed parsed = JsonTree.parse(text, "", faults);
        if (parsed.trouble() != null) {
            faults.add("", parsed.trouble());
            return null;
        }
        Overrides.apply(overrides, parsed.root(), faults);
        FieldReader file = new FieldReader(faults, "", parsed.root(), "a linkage file is one object");
        return parsed.root() instanceof Map<?, ?> ? new LinkageReader(file, faults) : null;
    }

    /** The linkage with stand-ins (NaN, names that lead nowhere) where a value is at fault. */
    private Linkage draft() {
        file.only("format", "name", "note", "units", "pins", "frame", "links", "cylinders", "tool", "machine");
        String remedy = "this program reads \"" + FORMAT + "\"";
        file.text("format", remedy)
                .filter(format -> !format.equals(FORMAT))
                .ifPresent(format -> file.fault(
                        "format", "is another format, found \"" + JsonTree.shorten(format) + "\"; " + remedy));
        String name = file.text("name", "name the machine or front").orElse("");
        String note = file.has("note") ? note() : "";
        List<Pin> pins = pins();
        FieldReader frame =
                file.object("frame", "give the frame and " + PINS_ON).only("pins");
        return new Linkage(
                name,
                note,
                pins,
                frame.names("pins", PINS_ON),
                links(),
                new CylinderReader(file, units).cylinders(),
                file.has("tool") ? Optional.of(ToolReader.tool(file, units)) : Optional.empty(),
                file.has("machine") ? Optional.of(MachineReader.machine(file, units)) : Optional.empty());
    }

    /** Free text, which may be empty. */
    private String note() {
        Object node = file.node("note", "");
        if (node instanceof String text) {
            return text;
        }
        file.fault("note", "must be a text, found " + JsonTree.describe(node) + "; give any remark or leave it out");
        return "";
    }

    private Amount coordinate() {
        return units.length("the coordinate", Range.ANY);
    }

    private List<Pin> pins() {
        String remedy = "give every pin once, as \"name\": [x, y]";
        FieldReader section = file.object("pins", remedy);
        List<Pin> pins = new ArrayList<>();
        for (String name : section.notEmpty(remedy).userNames()) {
            Pin pin = new Pin(name, section.point(name, coordinate()));
            pins.add(pin);
            places.put(name, pin.at());
        }
        return pins;
    }

    private List<Link> links() {
        String remedy = "give every moving link, as \"name\": {\"pins\": […], …}";
        FieldReader section = file.object("links", remedy);
        List<Link> links = new ArrayList<>();
        for (String name : section.notEmpty(remedy).userNames()) {
            if (name.equals(Linkage.FRAME)) {
                section.fault(name, "the name frame is taken by the frame; choose another");
            }
            links.add(link(name, section.object(name, remedy).only("pins", "mass", "cg", "gyration", "points")));
        }
        return links;
    }

    private Link link(String name, FieldReader link) {
        double mass = link.number("mass", units.mass("the mass of the link"), 0);
        Point cg = null;
        // A mass at fault is NaN, which is no mass above 0: one fault is enough.
        if (link.has("cg") || mass > 0) {
            cg = link.point("cg", coordinate());
        }
        double gyration = link.number("gyration", units.length("the radius of gyration", Range.ZERO_OR_MORE), 0);
        List<String> pins = link.names("pins", PINS_ON);
        Map<String, Point> points = new LinkedHashMap<>();
        if (link.has("points")) {
            FieldReader section = link.object("points", "give points as \"name\": [x, y]");
            for (String point : section.userNames()) {
                points.put(point, section.point(point, coordinate()));
            }
        }
        return new Link(name, pins, mass, cg != null ? cg : firstPin(pins), gyration, points);
    }

    /** Where a link without mass has its cg, so that the place is at least on the link. */
    private Point firstPin(List<String> pins) {
        Point nowhere = new Point(Double.NaN, Double.NaN);
        return pins.isEmpty() ? nowhere : places.getOrDefault(pins.get(0), nowhere);
    }
}
