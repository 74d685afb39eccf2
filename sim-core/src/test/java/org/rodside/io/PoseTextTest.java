package org.rodside.io;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.rodside.model.Cylinder;
import org.rodside.model.Friction;
import org.rodside.model.InputException;
import org.rodside.model.Linkage;
import org.rodside.model.Sides;
import org.rodside.model.Tube;

class PoseTextTest {

    private static final Linkage FRONT = front("boom", "stick", "bucket");

    @Test
    void fractionsComeInFileOrderWhateverTheOrderTyped() {
        assertArrayEquals(new double[] {0.4, 0, 1}, PoseText.fractions("--at", " bucket=1, boom=.4 ,stick=0", FRONT));
    }

    @Test
    void everyFaultIsReportedAtOnce() {
        InputException e = assertThrows(
                InputException.class, () -> PoseText.fractions("--at", "bom=0.5,boom=1.2,boom=0.3,x", FRONT));
        assertEquals(
                List.of(
                        "--at: no cylinder is named 'bom'; the nearest right one is boom",
                        "--at: boom: 1.2 is outside 0 (retracted) to 1 (extended)",
                        "--at: cylinder boom is given twice",
                        "--at: 'x' is not CYLINDER=FRACTION, for example boom=0.5",
                        "--at: cylinder stick is missing; name every one of boom, stick, bucket",
                        "--at: cylinder bucket is missing; name every one of boom, stick, bucket"),
                e.faults());
    }

    @ParameterizedTest
    @ValueSource(strings = {"NaN", "Infinity", "-Infinity", "1e999", "-0.01", "1.0000001", "0x1p-2", "0.5d", "", "½"})
    void whatIsNoFractionIsRefused(String value) {
        InputException e = assertThrows(
                InputException.class,
                () -> PoseText.fractions("--at", "boom=" + value + ",stick=0.5,bucket=0.5", FRONT));
        assertTrue(e.faults().get(0).startsWith("--at: boom: "), e.faults().get(0));
    }

    @Test
    void aDecimalCommaIsNotTakenForAnotherPair() {
        InputException e = assertThrows(
                InputException.class, () -> PoseText.fractions("--at", "boom=0,5,stick=0.5,bucket=0.5", FRONT));
        assertEquals(List.of("--at: '5' is not CYLINDER=FRACTION, for example boom=0.5"), e.faults());
    }

    @Test
    void cylindersNotNamedMayTakeADefault() {
        assertArrayEquals(new double[] {0.5, 0.2, 0.5}, PoseText.fractions("--at", "stick=0.2", FRONT, 0.5));
        assertArrayEquals(new double[] {0.5, 0.5, 0.5}, PoseText.fractions("--at", "", FRONT, 0.5));
    }

    private static Linkage front(String... names) {
        Sides none = new Sides(0, 0);
        List<Cylinder> cylinders = List.of(names).stream()
                .map(name -> new Cylinder(
                        name,
                        "a",
                        "b",
                        1,
                        0.1,
                        0.07,
                        1.5,
                        1,
                        none,
                        none,
                        none,
                        Friction.NONE,
                        0,
                        1,
                        new Tube(1.4, 0.12),
                        350e6))
                .toList();
        return new Linkage("", "", List.of(), List.of(), List.of(), cylinders, Optional.empty(), Optional.empty());
    }
}
