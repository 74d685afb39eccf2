package org.rodside.study;

import java.util.ArrayList;
import java.util.List;
import org.rodside.model.DutyPass;
import org.rodside.model.InputException;
import org.rodside.model.Point;
import org.rodside.model.Tool;
import org.rodside.soil.Blade;
import org.rodside.soil.Ground;
import org.rodside.soil.WedgeStatus;
import org.rodside.table.Column;
import org.rodside.table.RowSink;
import org.rodside.table.RowSource;
import org.rodside.table.Table;
import org.rodside.units.Quantity;

/**
 * Makes a duty from a pass (theory D5, D6): the tip goes along straight lines from rest to rest with least jerk, strokes follow by
 * inverse kinematics, cutting meets the ground's resistance and fills the bucket. Used once; not thread-safe.
 */
public final class DutyMaker {

    private final Front front;
    private final DutyPass pass;
    private final FrontSolver solver;
    private final ToolInverse inverse;
    private final Table duty;
    private final double[] fractions;
    private final Blade blade;
    private final double fullLoad;
    private double payload;

    private DutyMaker(Front front, DutyPass pass) {
        this.front = front;
        this.pass = pass;
        Tool tool = front.tool();
        solver = new FrontSolver(front);
        inverse = new ToolInverse(
                solver, named(front.hoist(), "tool.hoist"), named(front.crowd(), "tool.crowd"), front.curl());
        boolean cuts = pass.moves().stream().anyMatch(move -> move.cut() > 0);
        blade = cuts ? blade(tool) : null;
        fullLoad = cuts ? fullLoad(tool) : 0;
        fractions = start();
        List<Column> columns = new ArrayList<>(List.of(Column.of("time", Quantity.TIME, 9)));
        front.linkage().cylinders().forEach(c -> columns.add(Column.of(c.name() + ".fraction", Quantity.NONE, 12)));
        columns.add(Column.of("tip.x", Quantity.FORCE));
        columns.add(Column.of("tip.y", Quantity.FORCE));
        columns.add(Column.of("payload", Quantity.MASS));
        duty = new Table(columns);
    }

    /**
     * Makes the duty of a pass.
     *
     * @return a table with time (s), fraction of every cylinder, force of the ground on the tip (N) and payload (kg)
     * @throws InputException where the pass asks for what cannot be reached or lacks what it needs
     */
    public static Table make(Front front, DutyPass pass) {
        DutyMaker maker = new DutyMaker(front, pass);
        maker.run();
        return maker.duty;
    }

    /** Runs a duty through the history, rows dropped, to learn where cylinders or pump cannot follow. */
    public static HistoryAccumulator judge(Front front, Table duty, double pump) {
        RowSink drop = row -> {};
        return new History(front, new HistoryQuestion(false, false, pump)).run(source(front, duty), drop, time -> {});
    }

    /** The rows of a made duty as a history reads them. */
    static RowSource source(Front front, Table duty) {
        int cylinders = front.mechanism().cylinders();
        return new RowSource() {
            private int row;

            @Override
            public boolean next(double[] values) {
                if (row == duty.rows()) {
                    return false;
                }
                values[0] = duty.at(row, 0);
                for (int c = 0; c < cylinders; c++) {
                    values[1 + c] = duty.at(row, 1 + c) * front.mechanism().stroke(c);
                }
                for (int k = 0; k < 3; k++) {
                    values[1 + cylinders + k] = duty.at(row, 1 + cylinders + k);
                }
                row++;
                return true;
            }

            @Override
            public String name() {
                return "duty";
            }
        };
    }

    private static int named(int cylinder, String path) {
        if (cylinder < 0) {
            throw Front.needs(path);
        }
        return cylinder;
    }

    private Blade blade(Tool tool) {
        front.heel();
        DutyPass.Soil soil = pass.soil()
                .orElseThrow(() -> new InputException("ground: a move cuts, so the pass must say what it cuts; add"
                        + " \"ground\" as described in docs/load-histories.md"));
        Ground ground = new Ground(
                soil.density(),
                soil.cohesion(),
                soil.friction(),
                soil.wallFriction(),
                soil.adhesion(),
                soil.surcharge());
        return Blade.of(ground, tool.width().orElseThrow(() -> Front.needs("tool.width")));
    }

    private double fullLoad(Tool tool) {
        DutyPass.Soil soil = pass.soil().orElseThrow();
        return tool.capacity().orElseThrow(() -> Front.needs("tool.capacity")) * soil.fillFactor() * soil.density();
    }

    private double[] start() {
        double[] at = new double[front.mechanism().cylinders()];
        for (int c = 0; c < at.length; c++) {
            at[c] = pass.hold().getOrDefault(front.mechanism().cylinderName(c), LiftQuestion.USUAL_OTHERS);
        }
        if (!inverse.search(pass.start().x(), pass.start().y(), pass.startAngle(), at)) {
            throw outOfReach("start", 0, pass.start(), pass.startAngle(), at);
        }
        return at;
    }

    private InputException outOfReach(String where, double time, Point to, double angle, double[] at) {
        double[] nearest = inverse.nearest(to.x(), to.y(), angle, at);
        solver.place(nearest);
        return new InputException(where + ": at " + rounded(time) + " s the tip cannot reach " + shown(to.x(), to.y())
                + " with the tool at "
                + rounded(Math.toDegrees(angle)) + " deg; the nearest is "
                + shown(front.tip().x(solver.pose()), front.tip().y(solver.pose())) + " at "
                + rounded(Math.toDegrees(inverse.angle())) + " deg");
    }

    private static String shown(double x, double y) {
        return "[" + rounded(1e3 * x) + ", " + rounded(1e3 * y) + "] mm";
    }

    private static double rounded(double value) {
        return Math.rint(value * 10) / 10;
    }

    private void run() {
        double begin = 0;
        long sample = 0;
        Point from = pass.start();
        double fromAngle = pass.startAngle();
        for (int i = 0; i < pass.moves().size(); i++) {
            DutyPass.Move move = pass.moves().get(i);
            double end = begin + move.seconds();
            double loadBefore = payload;
            for (; sample / pass.rate() < end - 1e-9; sample++) {
                double share = (sample / pass.rate() - begin) / move.seconds();
                sample(i, sample / pass.rate(), Math.max(0, share), from, fromAngle, loadBefore);
            }
            payload = carried(move, from, 1, loadBefore);
            begin = end;
            from = move.to();
            fromAngle = move.angle();
        }
        // the end of the last move: all of the way done, so that where it came from no longer counts
        sample(pass.moves().size() - 1, begin, 1, from, fromAngle, payload);
    }

    /** Theory (D5): least jerk from rest to rest. */
    static double leastJerk(double share) {
        return share * share * share * (10 + share * (-15 + 6 * share));
    }

    private void sample(int index, double time, double share, Point from, double fromAngle, double loadBefore) {
        DutyPass.Move move = pass.moves().get(index);
        double way = leastJerk(share);
        double x = from.x() + way * (move.to().x() - from.x());
        double y = from.y() + way * (move.to().y() - from.y());
        double angle = fromAngle + way * (move.angle() - fromAngle);
        if (!inverse.follow(x, y, angle, fractions)) {
            throw outOfReach("moves." + index, time, new Point(x, y), angle, fractions);
        }
        double[] row = new double[4 + fractions.length];
        row[0] = time;
        System.arraycopy(fractions, 0, row, 1, fractions.length);
        if (move.cut() > 0 && share > 0 && share < 1) {
            resist(index, move, from, row);
        }
        row[3 + fractions.length] = share < 1 ? carried(move, from, way, loadBefore) : loadBefore;
        duty.row(row);
    }

    /** Payload after a share of a move; in kg. */
    private double carried(DutyPass.Move move, Point from, double way, double before) {
        if (move.empty()) {
            return before * (1 - way);
        }
        if (move.cut() <= 0) {
            return before;
        }
        double length = Math.hypot(move.to().x() - from.x(), move.to().y() - from.y());
        double width = front.tool().width().getAsDouble();
        double density = pass.soil().orElseThrow().density();
        return Math.max(before, Math.min(fullLoad, before + move.cut() * way * length * width * density));
    }

    /** Force of the ground on the tip, theory (D6). */
    private void resist(int index, DutyPass.Move move, Point from, double[] row) {
        double dx = move.to().x() - from.x();
        double dy = move.to().y() - from.y();
        double length = Math.hypot(dx, dy);
        if (length == 0) {
            return;
        }
        Place heel = front.heel();
        double bx = heel.x(solver.pose()) - front.tip().x(solver.pose());
        double by = heel.y(solver.pose()) - front.tip().y(solver.pose());
        double side = Math.signum(dx * by - dy * bx);
        double rake = Math.atan2(Math.abs(dx * by - dy * bx), -(dx * bx + dy * by));
        Blade.Resistance found = blade.resistance(rake, move.cut());
        if (found.status() != WedgeStatus.FOUND) {
            throw new InputException("moves." + index + ": the ground gives no wedge at " + row[0] + " s: "
                    + found.status().reason() + " (cutting line " + rounded(Math.toDegrees(rake))
                    + " deg from the way it came); change tool_deg or the way");
        }
        double ex = dx / length;
        double ey = dy / length;
        row[1 + fractions.length] = found.along() * ex - side * found.up() * ey;
        row[2 + fractions.length] = found.along() * ey + side * found.up() * ex;
    }
}
