package org.rodside.study;

import java.nio.file.Path;
import java.util.List;
import java.util.SplittableRandom;
import java.util.concurrent.TimeUnit;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.rodside.io.LinkageReader;
import org.rodside.kinematics.DensePoseSolver;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.kinematics.StagedPoseSolver;
import org.rodside.statics.DenseForceSolver;
import org.rodside.statics.ForceBuffer;
import org.rodside.statics.LoadBuffer;
import org.rodside.statics.StagedForceSolver;

/** What one pose costs, by each way: positions, forces, digging forces, and a general library's solve of the same size. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class PoseBench {

    private static final int STEPS = 201;

    /**
     * Sums and products, comparisons and divisions a pose of three cylinders, counted in the loops of StageDigLine and LimitLineBuffer:
     * 7 for the rooms on the ground, 29 a duty for the ground and the end, 4 a stage for weights, 18 a stage and duty for its limits; comparisons 5
     * a duty and 3 a stage and duty; one division a duty.
     */
    private static final int SUMS = 7 + 2 * 29 + 3 * 4 + 6 * 18;

    private static final int COMPARISONS = 2 * 5 + 6 * 3;
    private static final int DIVISIONS = 2;

    private final Front front = Front.of(LinkageReader.read(Path.of("../linkages/sallow-22.json"), List.of()));
    private final Mechanism mechanism = front.mechanism();
    private final double[][] strokes = new double[64][];
    private final double[][] fractions = new double[64][];
    private final StagedPoseSolver staged = new StagedPoseSolver(mechanism);
    private final DensePoseSolver dense = new DensePoseSolver(mechanism);
    private final StagedForceSolver stagedForces = new StagedForceSolver(mechanism);
    private final DenseForceSolver denseForces = new DenseForceSolver(mechanism);
    private final PoseBuffer pose = new PoseBuffer(mechanism);
    private final LoadBuffer loads = new LoadBuffer(mechanism);
    private final ForceBuffer forces = new ForceBuffer(mechanism);
    private final DigSolver curl = new DigSolver(new FrontSolver(front), front.tip(), front.curl(), false);
    private final SweepGrid grid = new SweepGrid(mechanism, STEPS);
    private final StageDigLine line =
            new StageDigLine(StageSweep.of(front, grid, front.tip()).orElseThrow(), false);
    private final DigRun run = new DigRun(STEPS);
    private final int[] outer = new int[2];
    private final double[][] matrix;
    private final double[] side;
    private final double[] one = new double[STEPS];
    private final double[] two = new double[STEPS];
    private final double[] sum = new double[STEPS];
    private int next;

    public PoseBench() {
        SplittableRandom random = new SplittableRandom(1);
        for (int i = 0; i < strokes.length; i++) {
            fractions[i] = random.doubles(mechanism.cylinders()).toArray();
            strokes[i] = fractions[i].clone();
            for (int c = 0; c < strokes[i].length; c++) {
                strokes[i][c] *= mechanism.stroke(c);
            }
        }
        staged.solve(strokes[0], pose);
        front.masses().addWeights(pose, loads);
        int size = 2 * mechanism.bearings() + mechanism.cylinders();
        matrix = new double[size][size];
        for (double[] row : matrix) {
            System.arraycopy(random.doubles(size, -1, 1).toArray(), 0, row, 0, size);
        }
        side = random.doubles(size).toArray();
        for (int i = 0; i < STEPS; i++) {
            one[i] = random.nextDouble(1, 2);
            two[i] = random.nextDouble(1, 2);
        }
    }

    @Benchmark
    public int positionsInClosedForm() {
        return staged.solve(strokes[next++ & 63], pose);
    }

    @Benchmark
    public int positionsByNewton() {
        return dense.solve(strokes[next++ & 63], pose);
    }

    @Benchmark
    public ForceBuffer forcesByMoments() {
        stagedForces.solve(pose, loads, forces);
        return forces;
    }

    @Benchmark
    public ForceBuffer forcesByDenseSystem() {
        denseForces.solve(pose, loads, forces);
        return forces;
    }

    @Benchmark
    public double[] sameSizeByGeneralLibrary() {
        return new LUDecomposition(new Array2DRowRealMatrix(matrix, false))
                .getSolver()
                .solve(new ArrayRealVector(side, false))
                .toArray();
    }

    @Benchmark
    public double curlForceByGeneralSolvers() {
        return curl.force(fractions[next++ & 63]);
    }

    /** Curl and crowd with weights and all limits; one operation is one pose. */
    @Benchmark
    @OperationsPerInvocation(STEPS)
    public double[] bothForcesInASweep() {
        grid.outer(next++ % grid.lines(), outer);
        line.forces(outer, run);
        return run.curl;
    }

    /** As above, with the limits named; one operation is one pose. */
    @Benchmark
    @OperationsPerInvocation(STEPS)
    public double[] bothForcesWithLimits() {
        grid.outer(next++ % grid.lines(), outer);
        line.run(outer, run);
        return run.curl;
    }

    /**
     * The arithmetic of {@link #bothForcesInASweep} without its meaning: as many sums, products, comparisons and divisions a
     * pose, over as short arrays in as short loops; one operation is one pose.
     */
    @Benchmark
    @OperationsPerInvocation(STEPS)
    public double[] sameOperationsAlone() {
        for (int pass = 0; pass < SUMS / 4; pass++) {
            double a = 1e-3 * pass;
            for (int i = 0; i < STEPS; i++) {
                sum[i] = sum[i] + a * one[i] + (1 - a) * two[i];
            }
        }
        for (int pass = 0; pass < COMPARISONS; pass++) {
            for (int i = 0; i < STEPS; i++) {
                sum[i] = Math.max(sum[i], one[i]);
            }
        }
        for (int pass = 0; pass < DIVISIONS; pass++) {
            for (int i = 0; i < STEPS; i++) {
                sum[i] = one[i] / sum[i];
            }
        }
        return sum;
    }
}
