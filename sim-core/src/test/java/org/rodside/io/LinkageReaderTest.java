package org.rodside.io;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.rodside.model.Cylinder;
import org.rodside.model.Friction;
import org.rodside.model.Link;
import org.rodside.model.Linkage;
import org.rodside.model.Machine;
import org.rodside.model.Point;
import org.rodside.model.Sides;
import org.rodside.model.Tool;
import org.rodside.model.Tube;
import org.rodside.model.Weight;

/** What a right file is read as, in SI. */
class LinkageReaderTest {

    /** A change of unit is one multiplication, so two roundings of a double at most; relative. */
    private static final double TWO_ROUNDINGS = 4e-16;

    private static Linkage read(String... edits) {
        return LinkageReader.read(Drawn.NAME, Drawn.bytes(Drawn.edited(edits)), List.of());
    }

    private static void assertNear(double expected, double found) {
        assertEquals(expected, found, Math.abs(expected) * TWO_ROUNDINGS);
    }

    @Test
    void theExampleFile() {
        Linkage linkage = LinkageReader.read(Drawn.EXAMPLE, List.of());
        assertEquals("Sallow Pit 22", linkage.name());
        assertEquals(11, linkage.pins().size());
        assertEquals("boom-foot", linkage.pins().get(0).name());
        assertNear(0.12, linkage.pins().get(0).at().x());
        assertNear(1.78, linkage.pins().get(0).at().y());
        assertEquals(List.of("boom-foot", "boom-cap-eye"), linkage.framePins());
        assertEquals(
                List.of("boom", "stick", "rocker", "push-link", "bucket"),
                linkage.links().stream().map(Link::name).toList());
        Link bucket = linkage.links().get(4);
        assertEquals(860, bucket.mass());
        assertNear(0.494, bucket.gyration());
        assertEquals(
                List.of("tooth", "lip", "heel", "fill"),
                List.copyOf(bucket.points().keySet()));
        assertEquals(
                List.of("boom", "stick", "bucket"),
                linkage.cylinders().stream().map(Cylinder::name).toList());
        Tool tool = linkage.tool().orElseThrow();
        assertEquals(Optional.of("stick"), tool.crowd());
        assertNear(1.2, tool.width().orElseThrow());
        assertNear(1.05, tool.capacity().orElseThrow());
        Machine machine = linkage.machine().orElseThrow();
        assertEquals(new Weight(9400, new Point(-1.12, 1.56)), machine.swinging());
        assertEquals(OptionalDouble.of(0.7), machine.grip());
        assertNear(-1.92, machine.tippingRear());
    }

    @Test
    void whatIsLeftOutTakesItsDefault() {
        Cylinder boom = read().cylinders().get(0);
        assertEquals(0.5, boom.harderShare());
        assertEquals(new Sides(0, 0), boom.back());
        assertEquals(350e6, boom.yield());
        // 1850 - 1.25·90 = 1737.5 mm; 1.2·125 = 150 mm.
        assertNear(1.7375, boom.tube().length());
        assertNear(0.150, boom.tube().outside());
        Linkage bare = read(
                "cylinders.boom.friction=-",
                "cylinders.boom.mass=-",
                "cylinders.boom.count=-",
                "links.rocker.mass=-",
                "links.rocker.cg=-",
                "links.rocker.gyration=-",
                "tool.fill=-",
                "tool.lip=-",
                "tool.width=-",
                "tool.hoist=-",
                "machine=-",
                "note=-",
                "units.force=-");
        assertEquals(Friction.NONE, bare.cylinders().get(0).friction());
        assertEquals(0, bare.cylinders().get(0).mass());
        assertEquals(1, bare.cylinders().get(0).count());
        assertEquals(1, bare.cylinders().get(0).harderShare());
        Link rocker = bare.links().get(2);
        assertEquals(0, rocker.mass());
        assertEquals(0, rocker.gyration());
        assertEquals(bare.pins().get(7).at(), rocker.cg());
        assertEquals("tooth", bare.tool().orElseThrow().fill());
        assertEquals(Optional.empty(), bare.tool().orElseThrow().lip());
        assertEquals(OptionalDouble.empty(), bare.tool().orElseThrow().width());
        assertEquals(Optional.empty(), bare.tool().orElseThrow().hoist());
        assertTrue(bare.machine().isEmpty());
        assertEquals("", bare.note());
        assertTrue(read("tool=-").tool().isEmpty());
        assertTrue(read("machine.grip=-", "machine.tipping.side=-")
                .machine()
                .orElseThrow()
                .tippingSide()
                .isEmpty());
    }

    @Test
    void whatIsGivenIsTaken() {
        Cylinder boom = read(
                        "cylinders.boom.working={\"cap\":343,\"rod\":300}",
                        "cylinders.boom.back={\"cap\":0,\"rod\":5}",
                        "cylinders.boom.harder_share=0.6",
                        "cylinders.boom.tube={\"length\":1720,\"outside\":152}",
                        "cylinders.boom.yield=5000")
                .cylinders()
                .get(0);
        assertEquals(new Sides(343e5, 300e5), boom.working());
        assertEquals(new Sides(373e5, 373e5), boom.relief());
        assertEquals(new Sides(0, 5e5), boom.back());
        assertEquals(new Friction(1600, 0.02), boom.friction());
        assertEquals(0.6, boom.harderShare());
        assertEquals(new Tube(1.72, 0.152), boom.tube());
        assertEquals(500e6, boom.yield());
        assertEquals(2, boom.count());
        assertEquals(190, boom.mass());
        assertNear(3.015, boom.extended());
    }

    /**
     * The same file with other unit names: a coordinate of 120 is then 120 of the other unit. Literals: 1 in = 25.4 mm,
     * 1 lb = 0.45359237 kg, 1 yd³ = 0.764554857984 m³, 1 psi = 6894.757293 Pa, 1 lbf = 4.4482216152605 N (NIST SP 811
     * appendix B; from memory).
     */
    @Test
    void everyUnitOfAFile() {
        Linkage us = read(
                "units={\"length\":\"in\",\"mass\":\"lb\",\"pressure\":\"psi\",\"force\":\"lbf\"}",
                "cylinders.boom.yield=50000");
        assertNear(120 * 0.0254, us.pins().get(0).at().x());
        assertNear(1980 * 0.45359237, us.links().get(0).mass());
        assertEquals(1.05 * 0.764554857984, us.tool().orElseThrow().capacity().orElseThrow(), 1e-15);
        assertEquals(343 * 6894.757293, us.cylinders().get(0).working().cap(), 1e-3);
        assertEquals(50000 * 6894.757293, us.cylinders().get(0).yield(), 1);
        assertEquals(1.6 * 4.4482216152605, us.cylinders().get(0).friction().constant(), 1e-12);
        Linkage metres = read(
                "units={\"length\":\"cm\",\"mass\":\"t\",\"pressure\":\"MPa\",\"force\":\"N\"}",
                "cylinders.boom.working=34.3");
        assertNear(1.2, metres.pins().get(0).at().x());
        assertEquals(1980e3, metres.links().get(0).mass());
        assertNear(34.3e6, metres.cylinders().get(0).working().cap());
        assertEquals(1.6, metres.cylinders().get(0).friction().constant());
        assertEquals(1.05, metres.tool().orElseThrow().capacity().orElseThrow());
        Linkage kilopascal = read("units={\"length\":\"mm\",\"mass\":\"kg\",\"pressure\":\"kPa\"}");
        assertEquals(343e3, kilopascal.cylinders().get(0).working().cap());
        assertEquals(1600, kilopascal.cylinders().get(0).friction().constant());
    }

    /**
     * A two-piece boom with a cylinder between its pieces, a link carried by cylinders alone and pins that join three
     * links are welcome; two cylinders meeting on a pin of no link are counted too.
     */
    @Test
    void otherLinkages() {
        String frame =
                "{\"format\":\"rodside-linkage/1\",\"name\":\"n\",\"units\":{\"length\":\"m\",\"mass\":\"kg\",\"pressure\":\"bar\"},";
        String sizes = ",\"bore\":0.1,\"rod\":0.05,\"retracted\":0.6,\"stroke\":0.5,\"working\":300,\"relief\":350}";
        // A plate on three cylinders: 3 degrees of freedom, no shared pin with the frame.
        String plate = frame
                + "\"pins\":{\"a\":[0,0],\"b\":[1,0],\"c\":[0,0.8],\"d\":[1,0.8]},\"frame\":{\"pins\":[\"a\",\"b\"]},"
                + "\"links\":{\"plate\":{\"pins\":[\"c\",\"d\"]}},\"cylinders\":{"
                + "\"l\":{\"cap_pin\":\"a\",\"rod_pin\":\"c\"" + sizes
                + ",\"r\":{\"cap_pin\":\"b\",\"rod_pin\":\"d\"" + sizes
                + ",\"x\":{\"cap_pin\":\"a\",\"rod_pin\":\"d\"" + sizes.replace("0.6", "1.0") + "}}";
        assertEquals(List.of(), Drawn.faults(plate));
        // Two cylinders meeting on a pin without a link: 2 degrees of freedom of the pin.
        String knee = frame
                + "\"pins\":{\"a\":[0,0],\"b\":[1,0],\"k\":[0.5,0.7],\"e\":[0,0.8]},\"frame\":{\"pins\":[\"a\",\"b\"]},"
                + "\"links\":{\"arm\":{\"pins\":[\"a\",\"e\"]}},\"cylinders\":{"
                + "\"l\":{\"cap_pin\":\"b\",\"rod_pin\":\"k\"" + sizes
                + ",\"r\":{\"cap_pin\":\"a\",\"rod_pin\":\"k\"" + sizes
                + ",\"m\":{\"cap_pin\":\"b\",\"rod_pin\":\"e\"" + sizes.replace("0.6", "1.0") + "}}";
        assertEquals(List.of(), Drawn.faults(knee));
    }
}
