package org.rodside.io;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rodside.model.Cylinder;
import org.rodside.model.InputException;
import org.rodside.model.Linkage;
import org.rodside.model.Sides;

/** Values given beside the file. */
class OverridesTest {

    private static Linkage read(String... overrides) {
        return LinkageReader.read(Drawn.EXAMPLE, List.of(overrides));
    }

    @Test
    void theOverrideIsReadInThePlaceOfTheFilesValue() {
        Linkage linkage = read(
                "cylinders.boom.working=360",
                "pins.boom-foot.1=1800",
                "name=Foo bar",
                "note={not JSON",
                "cylinders.boom.relief={\"cap\":373,\"rod\":300}",
                "cylinders.stick.relief.rod=310",
                "cylinders.stick.tube.length=1900",
                "cylinders.stick.yield=4000",
                "tool.width=1000",
                "tool.width=900");
        Cylinder boom = linkage.cylinders().get(0);
        Cylinder stick = linkage.cylinders().get(1);
        assertEquals(new Sides(360e5, 360e5), boom.working());
        assertEquals(1.8, linkage.pins().get(0).at().y());
        assertEquals("Foo bar", linkage.name());
        assertEquals("{not JSON", linkage.note());
        assertEquals(new Sides(373e5, 300e5), boom.relief());
        assertEquals(new Sides(373e5, 310e5), stick.relief());
        assertEquals(1.9, stick.tube().length(), 1e-15);
        assertEquals(400e6, stick.yield());
        assertEquals(0.9, linkage.tool().orElseThrow().width().orElseThrow(), 1e-15);
        assertEquals("a=b", read("name=a=b").name());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            cylinders.boom.working          | override "cylinders.boom.working": has no equals sign; write PATH=VALUE, as in cylinders.boom.working=360
            =3                              | override "=3": has no path; write PATH=VALUE, as in cylinders.boom.working=360
            pins..x=3                       | override "pins..x=3": has an empty step in its path; write steps with one dot between, as in pins.boom-foot.1=1800
            pins.boom-foot.2=3              | override "pins.boom-foot.2=3": there is no pins.boom-foot.2; the list has positions 0 to 1
            pins.boom-foot.-1=3             | override "pins.boom-foot.-1=3": there is no pins.boom-foot.-1; the list has positions 0 to 1
            pins.boom-foot.y=3              | override "pins.boom-foot.y=3": there is no pins.boom-foot.y; the list has positions 0 to 1
            pins.boom-foot.0.0=3            | override "pins.boom-foot.0.0=3": leads through pins.boom-foot.0, which is 120.0 and holds nothing; end the path there
            cylinders.boom.bore.cap=3       | override "cylinders.boom.bore.cap=3": leads through cylinders.boom.bore, which is 125 and holds nothing; end the path there
            name.first=Foo                  | override "name.first=Foo": leads through name, which is the text "Sallow Pit 22" and holds nothing; end the path there
            cylinders.boon.bore=3           | override "cylinders.boon.bore=3": there is no cylinders.boon; the nearest right one is boom
            cylinders.boom.wroking=360      | cylinders.boom.wroking: is not a key here; the nearest right one is working (set by an override)
            cylinders.boom.bore=-1          | cylinders.boom.bore: must be above 0, found -1; give the bore in mm (set by an override)
            cylinders.boom.working=360bar   | cylinders.boom.working: must be one number or an object, found the text "360bar"; give the pump pressure that reaches the cylinder in bar, one number or {"cap": …, "rod": …} (set by an override)
            cylinders.boom.bore=NaN         | cylinders.boom.bore: must be a finite number, found NaN; give the bore in mm (set by an override)
            cylinders.boom.relief={"cap":1,"rod":2,"cap":3} | cylinders.boom.relief: a key appears twice in the value of the override; keep one
            cylinders.boom.relief={"cap":1,"rod":-2} | cylinders.boom.relief.rod: must be 0 or more, found -2; give the line relief pressure in bar (set by an override)
            """)
    void whatIsWrongWithAnOverride(String override, String fault) {
        InputException thrown = assertThrows(InputException.class, () -> read(override));
        assertEquals(List.of(Drawn.EXAMPLE + ": " + fault), thrown.faults());
    }
}
