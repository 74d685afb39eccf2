package org.rodside.io;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rodside.model.InputException;

/** One slip in an otherwise right file gives exactly one fault, at its place, with what is wrong, what was found and what would be right. */
class LinkageFaultsTest {

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            # edit                                         | fault, after the name of the file
            format=-                                       | format: is missing; this program reads "rodside-linkage/1"
            format="rodside-linkage/2"                     | format: is another format, found "rodside-linkage/2"; this program reads "rodside-linkage/1"
            name=""                                        | name: must not be blank; name the machine or front
            name=22                                        | name: must be a text, found 22; name the machine or front
            note=["a"]                                     | note: must be a text, found a list of 1; give any remark or leave it out
            nota=1                                         | nota: is not a key here; the nearest right one is note
            units=-                                        | units: is missing; give the units of length, mass and pressure
            units.length="yd"                              | units.length: is not a unit of length here, found "yd"; give one of mm, cm, m, in, ft
            units.pressure=null                            | units.pressure: must be a text, found null; give one of bar, MPa, kPa, psi
            units.force="N "                               | units.force: is not a unit of force here, found "N "; give one of kN, N, lbf
            pins.boom-foot="120, 1780"                     | pins.boom-foot: must be a list of two numbers, found the text "120, 1780"; give [x, y] in mm
            pins.boom-foot=[120]                           | pins.boom-foot: must be a list of two numbers, found a list of 1; give [x, y] in mm
            pins.boom-foot.1="1780"                        | pins.boom-foot.1: must be a number, found the text "1780"; give the coordinate in mm
            pins.boom-foot.1=null                          | pins.boom-foot.1: must be a number, found null; give the coordinate in mm
            pins.boom-foot.1=1780000                       | pins.boom-foot.1: is too large to be meant (over 1000000), found 1780000; give the coordinate in mm
            pins.spare=[1, 2]                              | pins.spare: no link and no cylinder uses the pin; use it or leave it out
            frame.pins=[]                                  | frame.pins: must not be empty; list the pins that are on it
            frame.pins.0="boom-fot"                        | frame.pins.0: there is no pin boom-fot; the nearest right one is boom-foot
            frame.pins="boom-foot"                         | frame.pins: must be a list of names in brackets, found the text "boom-foot"; list the pins that are on it
            links.rocker.pins.0=true                       | links.rocker.pins.0: must be a text, found true; list the pins that are on it
            links.rocker.pins.1="rocker-pivot"             | links.rocker.pins.1: the name rocker-pivot stands in the list twice; keep one
            links.rocker.mass=-1                           | links.rocker.mass: must be 0 or more, found -1; give the mass of the link in kg
            links.rocker.cg=-                              | links.rocker.cg: is missing; give [x, y] in mm
            links.rocker.gyration=-3                       | links.rocker.gyration: must be 0 or more, found -3; give the radius of gyration in mm
            links.rocker.weight=95                         | links.rocker.weight: is not a key here; known are pins, mass, cg, gyration, points
            links.bucket.points.bucket-pivot=[0, 0]        | links.bucket.points.bucket-pivot: a pin of the link has the same name; call the point something else
            cylinders.boom=17                              | cylinders.boom: must be an object in braces, found 17; give every cylinder, as "name": {"cap_pin": …, "rod_pin": …, …}
            cylinders.boom.bore=-125                       | cylinders.boom.bore: must be above 0, found -125; give the bore in mm
            cylinders.boom.bore=0                          | cylinders.boom.bore: must be above 0, found 0; give the bore in mm
            cylinders.boom.bore=1e-300                     | cylinders.boom.bore: is too small to be meant (below 0.001), found 1.0E-300; give the bore in mm
            cylinders.boom.bore=-                          | cylinders.boom.bore: is missing; give the bore in mm
            cylinders.boom.rod=125                         | cylinders.boom.rod: must be below the bore of 125 mm, found 125 mm; swap them or measure again
            cylinders.boom.retracted=1165                  | cylinders.boom.retracted: must be above the stroke of 1165 mm, found 1165 mm; give the pin-to-pin length with the rod fully in
            cylinders.boom.count=1.5                       | cylinders.boom.count: must be a whole number from 1 to 8, found 1.5; give the count as a plain number
            cylinders.boom.count=0                         | cylinders.boom.count: must be a whole number from 1 to 8, found 0; give the count as a plain number
            cylinders.boom.working=-343                    | cylinders.boom.working: must be 0 or more, found -343; give the pump pressure that reaches the cylinder in bar
            cylinders.boom.working={"cap":343}             | cylinders.boom.working.rod: is missing; give the pump pressure that reaches the cylinder in bar
            cylinders.boom.working=[343, 343]              | cylinders.boom.working: must be one number or an object, found a list of 2; give the pump pressure that reaches the cylinder in bar, one number or {"cap": …, "rod": …}
            cylinders.boom.relief={"cap":1,"rod":-2}       | cylinders.boom.relief.rod: must be 0 or more, found -2; give the line relief pressure in bar
            cylinders.boom.friction.share=1                | cylinders.boom.friction.share: must be from 0 to below 1, found 1; give the share as a plain number
            cylinders.boom.friction.constant=-1            | cylinders.boom.friction.constant: must be 0 or more, found -1; give the constant part of the friction in kN
            cylinders.boom.harder_share=0.4                | cylinders.boom.harder_share: must be from 1/count to 1, found 0.4 with count 2; leave it out for equal shares
            cylinders.boom.harder_share=1.1                | cylinders.boom.harder_share: must be from 1/count to 1, found 1.1; give the share as a plain number
            cylinders.boom.tube={"length":0}               | cylinders.boom.tube.length: must be above 0, found 0; give the length from cap pin to gland face in mm
            cylinders.boom.tube={"length":1850}            | cylinders.boom.tube.length: must be above 0 and below the retracted length of 1850 mm, is 1850 mm (where left out: retracted - 1.25 rod); give cap pin to gland face
            cylinders.boom.tube={"outside":125}            | cylinders.boom.tube.outside: must be above the bore of 125 mm, found 125 mm; give the outside diameter of the tube
            cylinders.boom.yield=0                         | cylinders.boom.yield: must be above 0, found 0; give the yield stress of the rod in bar
            cylinders.boom.cap_pin="boom-foot-eye"         | cylinders.boom.cap_pin: there is no pin boom-foot-eye; the nearest right one is boom-rod-eye
            cylinders.boom.cap_pin="boom-rod-eye"          | cylinders.boom.rod_pin: both ends are on the pin boom-rod-eye; name two different pins
            tool.link="buckett"                            | tool.link: there is no link buckett; the nearest right one is bucket
            tool.tip="tooht"                               | tool.tip: there is no point or pin of the tool link tooht; the nearest right one is tooth
            tool.hook="stick-pivot"                        | tool.hook: there is no point or pin of the tool link stick-pivot; the nearest right one is bucket-pivot
            tool.curl="bukcet"                             | tool.curl: there is no cylinder bukcet; the nearest right one is bucket
            tool.crowd="boom"                              | tool.crowd: the cylinder boom does the duty hoist already; name another
            tool.curl=-                                    | tool.curl: is missing; name the cylinder that curls
            tool.width=0                                   | tool.width: must be above 0, found 0; give the cutting width in mm
            tool.capacity=-1                               | tool.capacity: must be above 0, found -1; give the bucket capacity in m3
            machine.fixed=-                                | machine.fixed: is missing; give {"mass": …, "cg": [x, y]}
            machine.grip=-0.1                              | machine.grip: must be 0 or more, found -0.1; give the friction number of the ground as a plain number
            machine.tipping.rear=1920                      | machine.tipping.front: must be above rear, which is 1920 mm, found 1920 mm; x is positive towards the front
            machine.tipping.side=0                         | machine.tipping.side: must be above 0, found 0; give the distance of the side tipping line in mm
            """)
    void oneSlipIsOneFault(String edit, String fault) {
        List<String> faults = Drawn.faults(Drawn.edited(edit));
        boolean takesMoreWithIt = Stream.of(
                        "frame.pins",
                        "links.rocker.pins",
                        "cylinders.boom.cap_pin=",
                        "cylinders.boom=",
                        "cylinders.boom.retracted")
                .anyMatch(edit::startsWith);
        if (takesMoreWithIt) {
            assertTrue(faults.contains(Drawn.NAME + ": " + fault), () -> String.join("\n", faults));
        } else {
            assertEquals(List.of(Drawn.NAME + ": " + fault), faults);
        }
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            # edits, with semicolons between                                   | fault, after the name of the file
            cylinders.boom.boer=125; cylinders.boom.bore=-                     | cylinders.boom.boer: is not a key here; the nearest right one is bore
            links.frame={"pins":["boom-foot","stick-pivot"]}                   | links.frame: the name frame is taken by the frame; choose another
            pins.boom foot=[1, 2]                                              | pins.boom foot: is not a name; a name is a letter (A to Z, a to z), then letters, digits or -
            pins.boom_foot=[1, 2]                                              | pins.boom_foot: is not a name; a name is a letter (A to Z, a to z), then letters, digits or -
            pins.1st=[1, 2]                                                    | pins.1st: is not a name; a name is a letter (A to Z, a to z), then letters, digits or -
            pins={}                                                            | pins: must not be empty; give every pin once, as "name": [x, y]
            links={}                                                           | links: must not be empty; give every moving link, as "name": {"pins": […], …}
            cylinders={}                                                       | cylinders: must not be empty; give every cylinder, as "name": {"cap_pin": …, "rod_pin": …, …}
            pins.rocker-pivot=[5493.9, 3422.7]                                 | links.rocker.pins: the pins rocker-pivot and bucket-rod-eye are at the same place; take both off the drawing again, or make them one pin
            pins.boom-cap-eye=[120, 1780]                                      | frame.pins: the pins boom-foot and boom-cap-eye are at the same place; take both off the drawing again, or make them one pin
            pins.boom-cap-eye=[1780.7, 3758.9]                                 | cylinders.boom: the pins boom-cap-eye and boom-rod-eye at its ends are at the same place; take both off the drawing again
            cylinders.boom.cap_pin="stick-pivot"                               | cylinders.boom: both ends are on the link boom, so it moves nothing; name a pin of another link
            cylinders.boom.stroke=1000                                         | cylinders.boom: is drawn 2929.91 mm long from boom-cap-eye to boom-rod-eye, but reaches from 1850 to 2850 mm; check both pins, retracted and stroke
            cylinders.boom.retracted=2930.1                                    | cylinders.boom: is drawn 2929.91 mm long from boom-cap-eye to boom-rod-eye, but reaches from 2930.1 to 4095.1 mm; check both pins, retracted and stroke
            links.bucket.pins=["bucket-pivot"]                                 | links: the linkage has 5 degrees of freedom, but the number of cylinders is 3; a link lacks a pin or a cylinder is missing
            links.stick.pins.5="bucket-link-pin"                               | links: the linkage has 1 degree of freedom, but the number of cylinders is 3; a link is held by too many pins or a cylinder is too many
            cylinders.bucket=-; pins.bucket-cap-eye=-; links.stick.pins=["stick-pivot","stick-rod-eye","rocker-pivot","bucket-pivot"]; tool.curl="stick"; tool.crowd=- | links: the linkage has 3 degrees of freedom, but the number of cylinders is 2; a link lacks a pin or a cylinder is missing
            pins.a=[0,0]; pins.b=[1,1]; links.loose={"pins":["a","b"]}         | links.loose: no chain of pins and cylinders leads from the link to the frame; share a pin with another link
            links.boom.pins=["boom-foot","stick-cap-eye","stick-pivot"]        | cylinders.boom.rod_pin: the pin boom-rod-eye is on no link and no other cylinder; list it under the link or frame that it is on
            """)
    void slipsAgainstOtherValues(String edits, String fault) {
        List<String> faults = Drawn.faults(Drawn.edited(edits.split("; ")));
        assertTrue(faults.contains(Drawn.NAME + ": " + fault), () -> String.join("\n", faults));
    }

    @Test
    void allFaultsOfAFileAreReportedTogetherEachOnItsLine() {
        String text = Drawn.edited("cylinders.boom.bore=-125", "cylinders.stick.rood=3", "tool.tip=\"tooht\"", "name=7")
                .toString()
                .replaceFirst("\"grip\":0.7", "\"grip\":NaN,\"grip\":0.7")
                .replaceFirst("\"mass\":9400", "\"mass\":1e999");
        List<String> faults = Drawn.faults(text);
        List<String> places = faults.stream().map(fault -> fault.split(": ")[1]).toList();
        assertEquals(
                List.of(
                        "machine.grip",
                        "name",
                        "cylinders.boom.bore",
                        "cylinders.stick.rood",
                        "machine.swinging.mass",
                        "machine.grip",
                        "tool.tip"),
                places,
                () -> String.join("\n", faults));
        InputException thrown = assertThrows(
                InputException.class,
                () -> LinkageReader.read(Drawn.NAME, text.getBytes(StandardCharsets.UTF_8), List.of()));
        assertEquals(String.join(System.lineSeparator(), faults), thrown.getMessage());
    }

    @Test
    void aDrawingRoundedToATenthOfAMillimetreIsTaken() {
        // The boom cylinder is drawn sqrt(1230.7² + 2658.9²) = 2929.911 mm long.
        assertEquals(List.of(), Drawn.faults(Drawn.edited("cylinders.boom.retracted=2930.0")));
        assertEquals(List.of(), Drawn.faults(Drawn.edited("cylinders.boom.stroke=1079.82")));
        assertEquals(
                1, Drawn.faults(Drawn.edited("cylinders.boom.stroke=1079.8")).size());
    }

    @Test
    void namesWithLineBreaksStayOnOneLine() {
        List<String> faults = Drawn.faults(Drawn.exampleText().replaceFirst("\"grip\"", "\"gr\\\\nip\""));
        assertEquals(1, faults.size());
        assertTrue(
                faults.get(0).startsWith("x.json: machine.gr\\nip: is not a key here; the nearest right one is grip"),
                faults.get(0));
    }
}
