package org.rodside.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.PoseSolver;
import org.rodside.kinematics.StageChain;
import org.rodside.model.Cylinder;
import org.rodside.model.Linkage;

/**
 * A front whose strokes end where its stages stop to assemble (theory R4). In a chain of stages that depends on the stage's own
 * stroke alone, so the poses that assemble fill a smaller stroke box, and what searches or traces over a box need
 * not meet their border inside it. Fronts of another build, and stages that assemble in several stretches of their stroke,
 * are left as they are. Immutable.
 */
final class StrokeTrim {

    /** Places on each stroke at which assembling is tried. */
    private static final int PLACES = 256;

    /** The border is halved down to this and the trimmed stroke ends as far inside: ten times rounding; share of the length. */
    private static final double INSIDE = 2e-15;

    private final Front front;
    private final double[] low;
    private final double[] high;

    private StrokeTrim(Front front, double[] low, double[] high) {
        this.front = front;
        this.low = low;
        this.high = high;
    }

    /** Trims a front; the same front where all of its strokes assemble. */
    static StrokeTrim of(Front front) {
        Mechanism mechanism = front.mechanism();
        double[] low = new double[mechanism.cylinders()];
        double[] high = new double[mechanism.cylinders()];
        Arrays.fill(high, 1);
        Optional<StageChain> chain = StageChain.of(mechanism, front.toolBody());
        if (chain.isPresent() && chain.get().stages().size() == low.length) {
            FrontSolver solver = new FrontSolver(front);
            for (int c = 0; c < low.length; c++) {
                trim(solver, c, low, high);
            }
        }
        boolean whole =
                Arrays.stream(low).allMatch(f -> f == 0) && Arrays.stream(high).allMatch(f -> f == 1);
        return new StrokeTrim(whole ? front : Front.of(trimmed(front.linkage(), low, high)), low, high);
    }

    private static void trim(FrontSolver solver, int c, double[] low, double[] high) {
        double[] at = solver.front().drawnFractions();
        double drawn = at[c];
        boolean[] stands = new boolean[PLACES + 1];
        for (int i = 0; i <= PLACES; i++) {
            stands[i] = stands(solver, at, c, i / (double) PLACES);
        }
        int first = (int) Math.ceil(drawn * PLACES);
        int last = (int) Math.floor(drawn * PLACES);
        while (first > 0 && stands[first - 1]) {
            first--;
        }
        while (last < PLACES && stands[last + 1]) {
            last++;
        }
        for (int i = 0; i <= PLACES; i++) {
            if (stands[i] && (i < first || i > last)) {
                return;
            }
        }
        double inside = Math.max(drawn, last / (double) PLACES);
        high[c] = last == PLACES ? 1 : border(solver, at, c, inside, (last + 1) / (double) PLACES);
        inside = Math.min(drawn, first / (double) PLACES);
        low[c] = first == 0 ? 0 : border(solver, at, c, inside, (first - 1) / (double) PLACES);
    }

    private static boolean stands(FrontSolver solver, double[] at, int c, double fraction) {
        double drawn = at[c];
        at[c] = fraction;
        boolean stands = solver.place(at) == PoseSolver.ASSEMBLED;
        at[c] = drawn;
        return stands;
    }

    /** A link turns by the root of what is missing to the border: hence so close. */
    private static double border(FrontSolver solver, double[] at, int c, double inside, double outside) {
        Mechanism mechanism = solver.front().mechanism();
        double close = INSIDE * (mechanism.retracted(c) + mechanism.stroke(c)) / mechanism.stroke(c);
        double in = inside;
        double out = outside;
        while (Math.abs(out - in) > close) {
            double middle = (in + out) / 2;
            if (stands(solver, at, c, middle)) {
                in = middle;
            } else {
                out = middle;
            }
        }
        return in - Math.signum(outside - inside) * close;
    }

    private static Linkage trimmed(Linkage whole, double[] low, double[] high) {
        List<Cylinder> cylinders = new ArrayList<>();
        for (int c = 0; c < low.length; c++) {
            Cylinder cylinder = whole.cylinders().get(c);
            cylinders.add(cylinder.between(
                    cylinder.retracted() + low[c] * cylinder.stroke(), (high[c] - low[c]) * cylinder.stroke()));
        }
        return new Linkage(
                whole.name(),
                whole.note(),
                whole.pins(),
                whole.framePins(),
                whole.links(),
                cylinders,
                whole.tool(),
                whole.machine());
    }

    /** The front whose whole stroke box assembles. */
    Front front() {
        return front;
    }

    /** Whether a cylinder still extends fully. */
    boolean reachesItsEnd(int cylinder) {
        return high[cylinder] == 1;
    }

    /** A sentence for every stroke that was trimmed. */
    List<String> notes() {
        List<String> notes = new ArrayList<>();
        for (int c = 0; c < low.length; c++) {
            if (low[c] != 0 || high[c] != 1) {
                notes.add(String.format(
                        Locale.ROOT,
                        "%s: the linkage assembles from %.3f to %.3f of its stroke only; the range is over that part.",
                        front.mechanism().cylinderName(c),
                        low[c],
                        high[c]));
            }
        }
        return notes;
    }

    /** Fractions of the whole strokes. */
    double[] ofWhole(double[] fractions) {
        double[] whole = new double[fractions.length];
        Arrays.setAll(whole, c -> low[c] + fractions[c] * (high[c] - low[c]));
        return whole;
    }
}
