package org.rodside.study;

import java.util.ArrayList;
import java.util.List;
import org.rodside.kinematics.PoseSolver;

/**
 * Whether a point can be reached by a place of the front (theory R3). The poses that reach a point form a set that, unless it closes
 * in itself, meets the faces of the stroke box on which two strokes move; those are searched whole, with slices through the
 * middle besides. Closed sets lie close to a pose at which all strokes carry the place along one line; a search from the
 * neighbourhood of a given pose finds them. Owns its scratch; not thread-safe.
 */
final class ReachTest {

    /** Where the strokes that stand are put: both ends and the middle. */
    private static final double[] SLICES = {0, 0.5, 1};

    private static final double[] OFFSETS = {0.01, -0.01, 0.04, -0.04};
    private static final int ROUNDS = 40;

    /** A point counts as reached within; in m. */
    private static final double REACHED = 1e-8;

    private final FrontSolver solver;
    private final Place place;
    private final int cylinders;
    private final List<HookInverse> faces = new ArrayList<>();
    private final double[][] travel;

    ReachTest(FrontSolver solver, Place place) {
        this.solver = solver;
        this.place = place;
        cylinders = solver.front().mechanism().cylinders();
        travel = new double[cylinders][2];
        for (int one = 0; one < cylinders; one++) {
            for (int two = one + 1; two < cylinders; two++) {
                slices(one, two);
            }
        }
    }

    private void slices(int one, int two) {
        int others = cylinders - 2;
        int count = (int) Math.round(Math.pow(SLICES.length, others));
        for (int slice = 0; slice < count; slice++) {
            double[] at = new double[cylinders];
            int rest = slice;
            for (int c = 0; c < cylinders; c++) {
                if (c != one && c != two) {
                    at[c] = SLICES[rest % SLICES.length];
                    rest /= SLICES.length;
                }
            }
            faces.add(new HookInverse(solver, place, one, two, at));
        }
    }

    /**
     * Whether a point can be reached.
     *
     * @param near a pose close by; not modified
     */
    boolean reaches(double x, double y, double[] near) {
        for (HookInverse face : faces) {
            if (face.reaches(x, y)) {
                return true;
            }
        }
        for (int axis = 0; axis < cylinders; axis++) {
            for (double offset : OFFSETS) {
                double[] at = near.clone();
                at[axis] = inside(at[axis] + offset);
                if (search(x, y, at)) {
                    return true;
                }
            }
        }
        return false;
    }

    private static double inside(double fraction) {
        return Math.max(0, Math.min(1, fraction));
    }

    /** Damped least change of all strokes towards the point, kept in the box. */
    private boolean search(double x, double y, double[] at) {
        double damping = 1e-4;
        for (int round = 0; round < ROUNDS; round++) {
            if (solver.place(at) != PoseSolver.ASSEMBLED) {
                return false;
            }
            double mx = x - place.x(solver.pose());
            double my = y - place.y(solver.pose());
            double miss = Math.hypot(mx, my);
            if (miss < REACHED) {
                return true;
            }
            step(mx, my, damping * miss, at);
        }
        return false;
    }

    private void step(double mx, double my, double damping, double[] at) {
        double a = damping;
        double b = 0;
        double d = damping;
        for (int c = 0; c < cylinders; c++) {
            solver.travel(place, c, travel[c]);
            double stroke = solver.front().mechanism().stroke(c);
            travel[c][0] *= stroke;
            travel[c][1] *= stroke;
            if (blocked(at[c], travel[c][0] * mx + travel[c][1] * my)) {
                travel[c][0] = 0;
                travel[c][1] = 0;
            }
            a += travel[c][0] * travel[c][0];
            b += travel[c][0] * travel[c][1];
            d += travel[c][1] * travel[c][1];
        }
        double det = a * d - b * b;
        double px = (d * mx - b * my) / det;
        double py = (a * my - b * mx) / det;
        for (int c = 0; c < cylinders; c++) {
            double change = travel[c][0] * px + travel[c][1] * py;
            at[c] = inside(at[c] + Math.max(-0.1, Math.min(0.1, change)));
        }
    }

    private static boolean blocked(double fraction, double towards) {
        return fraction == 0 && towards < 0 || fraction == 1 && towards > 0;
    }
}
