package org.rodside.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rodside.io.DutyPassReader;
import org.rodside.io.LinkageReader;
import org.rodside.model.DutyPass;
import org.rodside.model.InputException;
import org.rodside.model.Point;
import org.rodside.table.Table;

class DutyMakerTest {

    /** Inverse kinematics closes to this; in m and rad. */
    private static final double CLOSED = 1e-9;

    private static final Path PASS = Path.of("../linkages/sallow-22-pass.json");

    private static final Front FRONT = Front.of(LinkageReader.read(Path.of("../linkages/sallow-22.json"), List.of()));

    private static FrontSolver placed(Table duty, int row) {
        FrontSolver solver = new FrontSolver(FRONT);
        solver.place(new double[] {duty.at(row, 1), duty.at(row, 2), duty.at(row, 3)});
        return solver;
    }

    /** The tip is on the line of its move, at the share of the way that least jerk gives, with the tool at its angle. */
    @Test
    void followsThePath() {
        DutyPass pass = DutyPassReader.read(PASS, FRONT.linkage());
        Table duty = DutyMaker.make(FRONT, pass);
        double begin = 0;
        Point from = pass.start();
        double fromAngle = pass.startAngle();
        int row = 0;
        for (DutyPass.Move move : pass.moves()) {
            while (row < duty.rows() && duty.at(row, 0) < begin + move.seconds() - 1e-9) {
                double share = (duty.at(row, 0) - begin) / move.seconds();
                double way = 10 * Math.pow(share, 3) - 15 * Math.pow(share, 4) + 6 * Math.pow(share, 5);
                FrontSolver solver = placed(duty, row);
                double x = FRONT.tip().x(solver.pose());
                double y = FRONT.tip().y(solver.pose());
                assertEquals(from.x() + way * (move.to().x() - from.x()), x, CLOSED);
                assertEquals(from.y() + way * (move.to().y() - from.y()), y, CLOSED);
                double angle = Math.atan2(
                        y - FRONT.hook().y(solver.pose()), x - FRONT.hook().x(solver.pose()));
                double wanted = fromAngle + way * (move.angle() - fromAngle);
                assertEquals(0, Math.IEEEremainder(angle - wanted, 2 * Math.PI), CLOSED);
                row++;
            }
            begin += move.seconds();
            from = move.to();
            fromAngle = move.angle();
        }
        assertEquals(duty.rows() - 1, row, "one row at the very end");
        assertEquals(begin, duty.at(row, 0), CLOSED);
    }

    /** The ground works against the motion and only while cutting; the bucket fills by the volume cut, then empties. */
    @Test
    void groundResistsAndFills() {
        DutyPass pass = DutyPassReader.read(PASS, FRONT.linkage());
        Table duty = DutyMaker.make(FRONT, pass);
        Point from = pass.moves().get(0).to();
        DutyPass.Move cut = pass.moves().get(1);
        double dx = cut.to().x() - from.x();
        double dy = cut.to().y() - from.y();
        double full = Math.min(1.05 * 1850, 0.25 * Math.hypot(dx, dy) * 1.2 * 1850);
        double most = 0;
        int resisted = 0;
        for (int row = 0; row < duty.rows(); row++) {
            double time = duty.at(row, 0);
            double fx = duty.at(row, 4);
            double fy = duty.at(row, 5);
            if (fx != 0 || fy != 0) {
                resisted++;
                assertTrue(time > 1.6 && time < 6.1, "only while cutting");
                assertTrue(fx * dx + fy * dy < 0, "against the motion");
            }
            most = Math.max(most, duty.at(row, 6));
        }
        assertTrue(resisted > 200);
        assertEquals(full, most, 1e-6);
        assertEquals(0, duty.at(duty.rows() - 1, 6), 1e-9);
    }

    @Test
    void saysWhereThePathLeavesTheReach() {
        DutyPass far = new DutyPass(
                50,
                Optional.empty(),
                new Point(8.3, 0.4),
                Math.toRadians(-75),
                List.of(new DutyPass.Move(new Point(12, 0), Math.toRadians(-75), 2, 0, false)),
                Map.of());
        InputException fault = assertThrows(InputException.class, () -> DutyMaker.make(FRONT, far));
        assertTrue(fault.getMessage().startsWith("moves.0: at "), fault.getMessage());
        assertTrue(fault.getMessage().contains("the nearest is"), fault.getMessage());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "\"rate_hz\": 50|\"rate_hz\": 0|rate_hz",
                "\"rate_hz\": 50|\"rate_hz\": 50, \"rate\": 3|rate",
                "\"seconds\": 1.6|\"seconds\": -1|moves.0.seconds",
                "\"seconds\": 1.6|\"seconds\": 1e7|more than a million samples",
                "\"friction_deg\": 32|\"friction_deg\": 95|ground.friction_deg",
                "\"empty\": true|\"empty\": \"yes\"|moves.4.empty",
                "rodside-duty/1|rodside-duty/9|format",
                "\"tip\": [8300, 400]|\"tip\": [8300]|start.tip",
            })
    void everyFaultNamesItsPlace(String from, String to, String named, @TempDir Path folder) throws IOException {
        Path file = folder.resolve("pass.json");
        String text = Files.readString(PASS);
        assertTrue(text.contains(from));
        Files.writeString(file, text.replace(from, to));
        InputException fault = assertThrows(InputException.class, () -> DutyPassReader.read(file, FRONT.linkage()));
        assertTrue(fault.getMessage().contains(named), fault.getMessage());
    }
}
