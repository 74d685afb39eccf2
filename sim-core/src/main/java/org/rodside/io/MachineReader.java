package org.rodside.io;

import org.rodside.model.Machine;
import org.rodside.model.Weight;

/** Reads the machine of a linkage file. */
final class MachineReader {

    private MachineReader() {}

    static Machine machine(FieldReader file, FileUnits units) {
        FieldReader at =
                file.object("machine", "give swinging, fixed and tipping").only("swinging", "fixed", "tipping", "grip");
        FieldReader tipping = at.object("tipping", "give {\"front\": …, \"rear\": …, \"side\": …}")
                .only("front", "rear", "side");
        Amount line = units.length("the distance of the tipping line from the swing axis", Range.ANY);
        Amount side = units.length("the distance of the side tipping line", Range.ABOVE_ZERO);
        return new Machine(
                weight(at, "swinging", units),
                weight(at, "fixed", units),
                tipping.number("front", line),
                tipping.number("rear", line),
                tipping.optionalNumber("side", side),
                at.optionalNumber("grip", Amount.plain("the friction number of the ground", Range.ZERO_OR_MORE)));
    }

    private static Weight weight(FieldReader at, String key, FileUnits units) {
        FieldReader weight =
                at.object(key, "give {\"mass\": …, \"cg\": [x, y]}").only("mass", "cg");
        return new Weight(
                weight.number("mass", units.mass("the mass")),
                weight.point("cg", units.length("the coordinate", Range.ANY)));
    }
}
