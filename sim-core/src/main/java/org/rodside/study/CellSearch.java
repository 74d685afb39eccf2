package org.rodside.study;

import java.util.Comparator;
import java.util.PriorityQueue;

/**
 * Checks that a grid passed over no narrow peak (theory W1): every cell that could still hide a higher value than the best
 * known is halved on all free axes, the likeliest first, until none is left that could or the allowance is used up. What a
 * cell could hide is judged from the second differences about its own corners. The same call gives the same bits. Not
 * thread-safe.
 */
final class CellSearch {

    private record Cell(double[] low, double width, double bound, int number) {}

    /** A cell that could hold no more than this share above the best known is not opened; no unit. */
    private static final double TOLERANCE = 1e-4;

    /** Poses that may be solved in opening cells. */
    private static final int ALLOWANCE = 1500;

    /** Cells that may be opened, whatever the number of axes. */
    private static final int FEWEST_OPENED = 30;

    /** Rise over two neighbours at a kink half-way between them, as a share of the second difference; no unit. */
    private static final double KINK = 0.5;

    /** Points an axis in a cell that is opened. */
    private static final int HALVED = 3;

    private final BoxMaximum.Objective objective;
    private final int[] free;
    private final double[] lattice;
    private final PriorityQueue<Cell> queue = new PriorityQueue<>(
            Comparator.comparingDouble((Cell cell) -> -cell.bound()).thenComparingInt(Cell::number));

    /**
     * @param objective what is to be made largest
     * @param free axes along which it may move, at least one; not modified
     */
    CellSearch(BoxMaximum.Objective objective, int[] free) {
        this.objective = objective;
        this.free = free;
        lattice = new double[(int) Math.round(Math.pow(HALVED, free.length))];
    }

    /**
     * Opens cells; climbs from whatever is found above the best known.
     *
     * @param best the best known; its axes that are not free stay
     * @param values values on a grid of the free axes, the first running fastest; not modified
     * @param n grid points an axis, at least 3
     * @return the best found
     */
    Optimum open(Optimum best, double[] values, int n) {
        RidgeClimber climber = new RidgeClimber(objective, free);
        Optimum highest = best;
        queueCells(values, n, new double[free.length], 1, threshold(highest));
        int left = Math.max(FEWEST_OPENED, ALLOWANCE / lattice.length);
        while (left-- > 0 && !queue.isEmpty() && queue.peek().bound() > threshold(highest)) {
            Cell cell = queue.poll();
            Optimum found = sample(cell, best.at());
            if (found.value() > highest.value()) {
                highest = climber.climb(found);
            }
            queueCells(lattice, HALVED, cell.low(), cell.width(), threshold(highest));
        }
        return highest;
    }

    /** What a cell must promise to be opened. */
    private static double threshold(Optimum best) {
        return best.value() + TOLERANCE * Math.abs(best.value());
    }

    /** Fills the lattice of a cell; returns its highest place, with no value where it has none. */
    private Optimum sample(Cell cell, double[] fixed) {
        double[] at = fixed.clone();
        Optimum highest = new Optimum(Double.NaN, fixed);
        for (int p = 0; p < lattice.length; p++) {
            int rest = p;
            for (int a = 0; a < free.length; a++) {
                at[free[a]] = Math.min(1, cell.low()[a] + cell.width() * (rest % HALVED) / (HALVED - 1));
                rest /= HALVED;
            }
            lattice[p] = objective.at(at);
            if (!Double.isNaN(lattice[p]) && !(lattice[p] <= highest.value())) {
                highest = new Optimum(lattice[p], at.clone());
            }
        }
        return highest;
    }

    /** Queues every cell of a lattice of n points an axis over a box that could hold more than a threshold. */
    private void queueCells(double[] values, int n, double[] low, double width, double threshold) {
        int axes = free.length;
        double[] rise = rises(values, n, axes);
        int[] corners = corners(n, axes);
        for (int p = 0; p < values.length; p++) {
            if (!isLowCorner(p, n, axes)) {
                continue;
            }
            double most = Double.NEGATIVE_INFINITY;
            double steepest = 0;
            for (int corner : corners) {
                most = values[p + corner] > most ? values[p + corner] : most;
                steepest = Math.max(steepest, rise[p + corner]);
            }
            if (most + steepest > threshold) {
                queue.add(new Cell(cornerOf(p, n, low, width), width / (n - 1), most + steepest, queue.size()));
            }
        }
    }

    private static double[] cornerOf(int p, int n, double[] low, double width) {
        double[] corner = new double[low.length];
        int rest = p;
        for (int a = 0; a < corner.length; a++) {
            corner[a] = low[a] + width * (rest % n) / (n - 1);
            rest /= n;
        }
        return corner;
    }

    private static boolean isLowCorner(int p, int n, int axes) {
        int rest = p;
        for (int a = 0; a < axes; a++) {
            if (rest % n == n - 1) {
                return false;
            }
            rest /= n;
        }
        return true;
    }

    private static int[] corners(int n, int axes) {
        int[] corners = new int[1 << axes];
        for (int c = 0; c < corners.length; c++) {
            int stride = 1;
            for (int a = 0; a < axes; a++) {
                corners[c] += (c >> a & 1) * stride;
                stride *= n;
            }
        }
        return corners;
    }

    /**
     * What could rise between a point and its neighbours, from the size of the second difference on each axis: a smooth
     * curve rises an eighth of it over the chord, a kink half-way a half. Beside poses without values the
     * step to the neighbour stands in.
     */
    private static double[] rises(double[] values, int n, int axes) {
        double[] rise = new double[values.length];
        int stride = 1;
        for (int a = 0; a < axes; a++) {
            for (int p = 0; p < values.length; p++) {
                int i = p / stride % n;
                int c = p + (Math.max(1, Math.min(n - 2, i)) - i) * stride;
                double before = values[c - stride];
                double after = values[c + stride];
                double second = Math.abs(before - 2 * values[c] + after);
                if (second == second) {
                    rise[p] += KINK * second;
                } else {
                    double down = Math.abs(values[c] - before);
                    double up = Math.abs(after - values[c]);
                    rise[p] += Math.max(down == down ? down : 0, up == up ? up : 0);
                }
            }
            stride *= n;
        }
        return rise;
    }
}
