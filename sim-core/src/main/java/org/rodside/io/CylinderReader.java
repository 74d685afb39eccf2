package org.rodside.io;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.rodside.model.Cylinder;
import org.rodside.model.Friction;
import org.rodside.model.Sides;
import org.rodside.model.Tube;

/** Reads the cylinders of a linkage file and fills in what they leave out. */
final class CylinderReader {

    /** More cylinders side by side than any front carries. */
    private static final int MOST_SIDE_BY_SIDE = 8;

    private static final String REMEDY = "give every cylinder, as \"name\": {\"cap_pin\": …, \"rod_pin\": …, …}";

    private static final Range COUNT =
            new Range(1, false, MOST_SIDE_BY_SIDE, false, "a whole number from 1 to " + MOST_SIDE_BY_SIDE);

    private static final Range HARDER_SHARE = new Range(1.0 / MOST_SIDE_BY_SIDE, false, 1, false, "from 1/count to 1");

    private static final String[] KEYS = {
        "cap_pin",
        "rod_pin",
        "count",
        "bore",
        "rod",
        "retracted",
        "stroke",
        "working",
        "relief",
        "back",
        "friction",
        "mass",
        "harder_share",
        "tube",
        "yield"
    };

    private final FieldReader file;
    private final FileUnits units;

    CylinderReader(FieldReader file, FileUnits units) {
        this.file = file;
        this.units = units;
    }

    List<Cylinder> cylinders() {
        FieldReader section = file.object("cylinders", REMEDY).notEmpty(REMEDY);
        List<Cylinder> cylinders = new ArrayList<>();
        for (String name : section.userNames()) {
            cylinders.add(cylinder(name, section.object(name, REMEDY).only(KEYS)));
        }
        return cylinders;
    }

    private Cylinder cylinder(String name, FieldReader at) {
        double bore = at.number("bore", units.length("the bore", Range.ABOVE_ZERO));
        double rod = at.number("rod", units.length("the rod diameter", Range.ABOVE_ZERO));
        double retracted = at.number("retracted", units.length("the retracted pin-to-pin length", Range.ABOVE_ZERO));
        int count = count(at);
        return new Cylinder(
                name,
                at.text("cap_pin", "name the pin at the cap end").orElse(""),
                at.text("rod_pin", "name the pin at the rod end").orElse(""),
                count,
                bore,
                rod,
                retracted,
                at.number("stroke", units.length("the stroke", Range.ABOVE_ZERO)),
                sides(at, "working", "the pump pressure that reaches the cylinder"),
                sides(at, "relief", "the line relief pressure"),
                at.has("back") ? sides(at, "back", "the back pressure") : new Sides(0, 0),
                friction(at),
                at.number("mass", units.mass("the mass of one cylinder"), 0),
                at.number("harder_share", Amount.plain("the share", HARDER_SHARE), 1.0 / count),
                tube(at, bore, rod, retracted),
                at.number(
                        "yield",
                        units.pressure("the yield stress of the rod", Range.ABOVE_ZERO),
                        Cylinder.DEFAULT_YIELD));
    }

    /** How many side by side; 1 stands in for a count at fault. */
    private static int count(FieldReader at) {
        double count = at.number("count", Amount.plain("the count", COUNT), 1);
        if (count != Math.rint(count)) {
            if (!Double.isNaN(count)) {
                at.fault(
                        "count",
                        "must be " + COUNT.words() + ", found " + Shown.number(count)
                                + "; give the count as a plain number");
            }
            return 1;
        }
        return (int) count;
    }

    /** One number for both sides of the piston, or one for each. */
    private Sides sides(FieldReader at, String key, String what) {
        Amount pressure = units.pressure(what, Range.ZERO_OR_MORE);
        String remedy = pressure.remedy() + ", one number or {\"cap\": …, \"rod\": …}";
        Object node = at.node(key, remedy);
        if (node instanceof Map<?, ?>) {
            FieldReader both = at.object(key, remedy).only("cap", "rod");
            return new Sides(both.number("cap", pressure), both.number("rod", pressure));
        } else if (node instanceof JsonTree.Number) {
            double one = at.number(at.path(key), node, pressure);
            return new Sides(one, one);
        } else if (node != null) {
            at.fault(key, "must be one number or an object, found " + JsonTree.describe(node) + "; " + remedy);
        }
        return new Sides(Double.NaN, Double.NaN);
    }

    private Friction friction(FieldReader at) {
        FieldReader friction = at.optionalObject("friction", "give {\"constant\": …, \"share\": …}")
                .only("constant", "share");
        return new Friction(
                friction.number("constant", units.force("the constant part of the friction"), Friction.NONE.constant()),
                friction.number("share", Amount.plain("the share", Range.SHARE_BELOW_ONE), Friction.NONE.share()));
    }

    private Tube tube(FieldReader at, double bore, double rod, double retracted) {
        FieldReader tube = at.optionalObject("tube", "give {\"length\": …, \"outside\": …}")
                .only("length", "outside");
        return new Tube(
                tube.number(
                        "length",
                        units.length("the length from cap pin to gland face", Range.ABOVE_ZERO),
                        retracted - Cylinder.TUBE_LENGTH_ROD_SHARE * rod),
                tube.number(
                        "outside",
                        units.length("the outside diameter", Range.ABOVE_ZERO),
                        Cylinder.TUBE_OUTSIDE_OVER_BORE * bore));
    }
}
