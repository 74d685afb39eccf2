package org.rodside.io;

import java.util.Optional;
import org.rodside.model.Tool;

/** Reads the tool of a linkage file. */
final class ToolReader {

    private static final String PLACE = "name a point of the tool link or one of its pins";

    private ToolReader() {}

    static Tool tool(FieldReader file, FileUnits units) {
        FieldReader at = file.object("tool", "give {\"link\": …, \"tip\": …, \"hook\": …, \"curl\": …}")
                .only("link", "tip", "lip", "heel", "fill", "hook", "width", "capacity", "hoist", "crowd", "curl");
        String tip = at.text("tip", PLACE).orElse("");
        Optional<String> fill = at.optionalText("fill", PLACE);
        return new Tool(
                at.text("link", "name the link that works the ground").orElse(""),
                tip,
                at.optionalText("lip", PLACE),
                at.optionalText("heel", PLACE),
                at.has("fill") ? fill.orElse("") : tip,
                at.text("hook", PLACE).orElse(""),
                at.optionalNumber("width", units.length("the cutting width", Range.ABOVE_ZERO)),
                at.optionalNumber("capacity", units.volume("the bucket capacity")),
                at.optionalText("hoist", "name the cylinder that hoists"),
                at.optionalText("crowd", "name the cylinder that crowds"),
                at.text("curl", "name the cylinder that curls").orElse(""));
    }
}
