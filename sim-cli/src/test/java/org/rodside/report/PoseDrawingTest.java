package org.rodside.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.rodside.io.LinkageReader;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.kinematics.PoseSolver;
import org.rodside.model.Linkage;

class PoseDrawingTest {

    /** A place may be off by the rounding of the drawing (0.1 mm) through the linkage; in m. */
    private static final double DRAWN = 2e-3;

    /** Lengths within one pose; in m. */
    private static final double LENGTH = 1e-9;

    private static final Linkage FRONT = LinkageReader.read(Path.of("../linkages/sallow-22.json"), List.of());

    @Test
    void aPoseIsDrawnWhereItStands() {
        Mechanism mechanism = Mechanism.of(FRONT);
        double[] drawnStrokes = new double[mechanism.cylinders()];
        for (int c = 0; c < drawnStrokes.length; c++) {
            drawnStrokes[c] = mechanism.drawnLength(c) - mechanism.retracted(c);
        }
        DrawnPose pose = solved(mechanism, drawnStrokes);
        for (int p = 0; p < mechanism.pins(); p++) {
            assertEquals(
                    FRONT.pins().get(p).at().x(),
                    pose.pins().x()[p],
                    DRAWN,
                    FRONT.pins().get(p).name());
            assertEquals(
                    FRONT.pins().get(p).at().y(),
                    pose.pins().y()[p],
                    DRAWN,
                    FRONT.pins().get(p).name());
        }
        DrawnPose.Body bucket = pose.links().get(4);
        assertEquals("bucket", bucket.name());
        assertEquals(6.2912, bucket.places().x()[2], DRAWN);
        assertEquals(1.4652, bucket.places().y()[2], DRAWN);
    }

    @Test
    void cylindersAreDrawnAtTheirLength() {
        Mechanism mechanism = Mechanism.of(FRONT);
        DrawnPose pose = solved(mechanism, new double[] {0.3, 0.4, 0.5});
        for (int c = 0; c < 3; c++) {
            DrawnPose.Strut strut = pose.cylinders().get(c);
            double length = Math.hypot(
                    strut.ends().x()[1] - strut.ends().x()[0],
                    strut.ends().y()[1] - strut.ends().y()[0]);
            assertEquals(mechanism.retracted(c) + 0.3 + 0.1 * c, length, LENGTH, strut.name());
            assertTrue(strut.tubeLength() < length);
        }
    }

    private static DrawnPose solved(Mechanism mechanism, double[] strokes) {
        PoseBuffer buffer = new PoseBuffer(mechanism);
        assertEquals(PoseSolver.ASSEMBLED, mechanism.newSolver().solve(strokes, buffer));
        return PoseDrawing.of(buffer);
    }
}
