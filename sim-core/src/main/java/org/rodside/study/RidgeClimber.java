package org.rodside.study;

import java.util.Arrays;

/**
 * Climbs along ridges (theory W1). Under a tool force every load is the least of several smooth pieces, one a limit; its
 * peaks sit on sharp ridges that slant through the stroke box, where a search along fixed directions stops. One slope
 * along each stroke gives the tangent planes of all pieces; the highest point under all of them within a small box is
 * the next trial; the planes serve until a trial in an ever smaller box about the same place is higher (successive linear
 * programmes with a trust region and a second-order step, any textbook of optimisation; recalled). Never leaves the
 * stroke box, never ends lower than it started; the same call gives the same bits. Not thread-safe.
 */
final class RidgeClimber {

    /** First half-width of the small box; share of a stroke. */
    private static final double FIRST = 0.02;

    /** Widest that the small box may grow; share of a stroke. */
    private static final double WIDEST = 0.1;

    /** Steps of one climb from a hill, and of one that is to reach the top. */
    private static final int FEW_STEPS = 24;

    private static final int MANY_STEPS = 120;

    /** A place that beats another by less than this share is not sought; no unit. */
    private static final double BARELY = 1e-8;

    /** Last half-width of the small box: beyond it a slope is left that rounding alone may make; share of a stroke. */
    private static final double LAST = 1e-9;

    /** Step of a slope: its square against the box, and rounding over it, both stay near 1e-10; share of a stroke. */
    private static final double SLOPE_STEP = 1e-6;

    /** Step where a bend is taken too: a second difference wants more room above rounding; share of a stroke. */
    private static final double BEND_STEP = 1e-5;

    /** A climb ends where the planes promise no more than this share; no unit. */
    private static final double PROMISE = 1e-11;

    /** Shrinking after a trial that was no higher: least and most; no unit. */
    private static final double LEAST_LEFT = 0.1;

    private static final double MOST_LEFT = 0.5;

    /** The box grows where a trial keeps this share of what the planes promised; no unit. */
    private static final double KEPT = 0.7;

    private final BoxMaximum.Objective objective;
    private final int[] free;
    private final int n;
    private final TangentPlaneBuffer planes;
    private final double[] width;
    private final double[] trusted;
    private final double[] box;
    private final double[] centre;
    private final double[] place;
    private final double[] pieces;
    private final double[][] slopes;
    private final double[] bent;
    private double[] trial;
    private double[] here;
    private double value;
    private double reached;

    /**
     * @param objective what is to be made largest
     * @param free axes along which it may move, at least one; not modified
     */
    RidgeClimber(BoxMaximum.Objective objective, int[] free) {
        this.objective = objective;
        this.free = free;
        n = free.length;
        planes = new TangentPlaneBuffer(n);
        width = new double[n];
        trusted = new double[n];
        box = new double[n];
        centre = new double[n];
        place = new double[n];
        pieces = new double[objective.pieces()];
        slopes = new double[objective.pieces()][n];
        bent = new double[objective.pieces()];
    }

    /** Climbs from a pose that has a value until nothing more is gained. */
    Optimum top(Optimum from) {
        return climb(from, MANY_STEPS, Double.NaN);
    }

    /**
     * Climbs some way from a pose that has a value.
     *
     * @param toBeat a climb that seems to end no higher is given up; NaN where none is to be
     */
    Optimum climb(Optimum from, double toBeat) {
        return climb(from, FEW_STEPS, toBeat);
    }

    private Optimum climb(Optimum from, int steps, double toBeat) {
        here = from.at().clone();
        value = from.value();
        trial = here.clone();
        Arrays.fill(width, FIRST);
        objective.at(here);
        boolean rises = true;
        for (int i = 0; i < steps && rises; i++) {
            takeSlopes();
            rises = !hopeless(toBeat) && step();
        }
        return new Optimum(value, here);
    }

    /** Goes to a higher place, the one asked for last; false where none is found however small the box. */
    private boolean step() {
        while (Arrays.stream(width).max().orElseThrow() > LAST) {
            if (!planes.highest(box(), place)) {
                scale(LEAST_LEFT);
                continue;
            }
            double promised = planes.rise();
            if (!(promised > PROMISE * Math.abs(value))) {
                return false;
            }
            double gain = tryPlace();
            if (Double.isNaN(gain)) {
                shrinkBeforeTheEnd();
                continue;
            }
            gain = gain > 0 ? gain : Math.max(gain, tryBent(gain));
            if (gain > 0) {
                scale(gain > KEPT * promised ? 2 : 1);
                value = reached;
                here = trial.clone();
                return true;
            }
            // what falls short of the planes grows with the square of the way
            scale(Math.max(LEAST_LEFT, Math.min(MOST_LEFT, promised / (2 * (promised - gain)))));
        }
        return false;
    }

    private double[] box() {
        Arrays.setAll(box, a -> Math.min(width[a], trusted[a]));
        return box;
    }

    private boolean hopeless(double toBeat) {
        return value + planes.most() <= toBeat + BARELY * Math.abs(toBeat);
    }

    private void scale(double by) {
        for (int a = 0; a < n; a++) {
            width[a] = Math.min(WIDEST, by * width[a]);
        }
    }

    /** The trial does not stand: the box shrinks along the strokes without which it would, or along all. */
    private void shrinkBeforeTheEnd() {
        boolean found = false;
        for (int a = 0; a < n; a++) {
            double gone = trial[free[a]];
            trial[free[a]] = here[free[a]];
            if (!Double.isNaN(objective.at(trial))) {
                width[a] *= MOST_LEFT;
                found = true;
            }
            trial[free[a]] = gone;
        }
        if (!found) {
            scale(MOST_LEFT);
        }
    }

    /** Tries once more with the same slopes through what the pieces are at the trial: follows a ridge that bends. */
    private double tryBent(double gain) {
        if (bent.length == 1) {
            return gain;
        }
        tellPieces(reached, bent);
        layPlanes(trial, bent);
        double again = planes.highest(box(), place) ? tryPlace() : gain;
        layPlanes(here, pieces);
        return Double.isNaN(again) ? gain : again;
    }

    /** Takes the place the planes point to as the next trial; what it gains. */
    private double tryPlace() {
        System.arraycopy(here, 0, trial, 0, here.length);
        for (int a = 0; a < n; a++) {
            trial[free[a]] = place[a];
        }
        reached = objective.at(trial);
        return reached - value;
    }

    /** Planes of the present slopes through pieces at a place. */
    private void layPlanes(double[] at, double[] through) {
        planes.begin(onAxes(here, centre), value);
        onAxes(at, place);
        for (int p = 0; p < through.length; p++) {
            planes.add(place, through[p], slopes[p]);
        }
    }

    private double[] onAxes(double[] at, double[] out) {
        for (int a = 0; a < n; a++) {
            out[a] = at[free[a]];
        }
        return out;
    }

    /** All pieces at the present place, which was asked for last, their slopes, how far these are to be trusted, and their planes. */
    private void takeSlopes() {
        tellPieces(value, pieces);
        System.arraycopy(here, 0, trial, 0, here.length);
        Arrays.fill(trusted, WIDEST);
        for (int a = 0; a < n; a++) {
            double size = pieces.length == 1 ? BEND_STEP : SLOPE_STEP;
            double step = here[free[a]] + size > 1 ? -size : size;
            takeSlope(a, step);
            if (Double.isNaN(reached)) {
                step = -step;
                takeSlope(a, step);
            }
            if (pieces.length == 1) {
                takeBend(a, step);
            }
        }
        layPlanes(here, pieces);
    }

    private double beside(int a, double by) {
        int axis = free[a];
        trial[axis] = Math.max(0, Math.min(1, here[axis] + by));
        reached = objective.at(trial);
        double step = trial[axis] - here[axis];
        trial[axis] = here[axis];
        return step;
    }

    /** Slopes along one axis by a small step; NaN where the pose beside does not stand. */
    private void takeSlope(int a, double by) {
        double step = beside(a, by);
        tellPieces(reached, bent);
        for (int p = 0; p < slopes.length; p++) {
            slopes[p][a] = Double.isNaN(reached) ? Double.NaN : (bent[p] - pieces[p]) / step;
        }
    }

    /**
     * A smooth function bends: the parabola through a second pose beside, on the other side where there is room, gives its
     * slope to the second order and where its top lies along the axis.
     */
    private void takeBend(int a, double first) {
        double end = here[free[a]] - first;
        double second = beside(a, end >= 0 && end <= 1 ? -first : 2 * first);
        double rise = (reached - pieces[0]) / second;
        double bend = 2 * (rise - slopes[0][a]) / (second - first);
        double slope = slopes[0][a] - first * bend / 2;
        if (bend < 0) {
            trusted[a] = Math.min(WIDEST, -Math.abs(slope) / bend);
        }
        slopes[0][a] = Double.isNaN(slope) ? slopes[0][a] : slope;
    }

    private void tellPieces(double whole, double[] out) {
        if (out.length == 1) {
            out[0] = whole;
        } else {
            objective.tellPieces(out);
        }
    }
}
