package org.rodside.fatigue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CycleAccumulatorTest {

    /** Rounding of a few powers and sums. */
    private static final double ROUNDING = 1e-12;

    /** EN 1993-1-9, category 71 (factors 0.737 and 0.549 of the standard seen; lives computed from the rule). */
    @ParameterizedTest
    @CsvSource({"100, 715822", "80, 1398090", "40, 19130593", "71, 2000000"})
    void livesOfCategory71(double range, double cycles) {
        assertEquals(cycles, SnCurve.category(71).life(range), 0.5);
    }

    @Test
    void limitsOfCategory71() {
        SnCurve curve = SnCurve.category(71);
        // The standard prints 0.737 and 0.549·0.737 = 0.404: three digits.
        assertEquals(0.737, curve.kneeRange() / 71, 0.0005);
        assertEquals(0.404, curve.cutoffRange() / 71, 0.001);
        assertEquals(Double.POSITIVE_INFINITY, curve.life(28));
        assertEquals(5e6, curve.life(curve.kneeRange()), 1e-3);
        assertEquals(5e6, curve.life(curve.kneeRange() * (1 - 1e-12)), 1e-3);
        assertEquals(1e8, curve.life(curve.cutoffRange()), 1);
    }

    @Test
    void otherCurves() {
        double none = Double.POSITIVE_INFINITY;
        SnCurve straight = new SnCurve(4, 10, 1e6, none, none, none);
        assertEquals(1e10, straight.life(1), 1);
        assertEquals(0, straight.damage(0));
        SnCurve limit = new SnCurve(3, 71, 2e6, 5e6, none, none);
        assertEquals(none, limit.life(52));
        assertEquals(5e6 * 71 * 71 * 71 * 0.4 / (53.0 * 53 * 53), limit.life(53), 1);
        SnCurve endless = new SnCurve(3, 71, 2e6, 5e6, 5, none);
        assertEquals(SnCurve.category(71).kneeRange(), endless.kneeRange());
        assertTrue(endless.life(1) < none);
        assertThrows(IllegalArgumentException.class, () -> new SnCurve(0, 71, 2e6, none, none, none));
        assertThrows(IllegalArgumentException.class, () -> new SnCurve(3, 71, 2e6, 5e6, 5, 1e6));
    }

    /** By hand: 2 cycles of 3 and half a cycle of 4: Σ n r³ = 54 + 32 = 86, N = 2.5. */
    @Test
    void equivalentRangeAndDamageByHand() {
        CycleAccumulator sum = new CycleAccumulator(new double[] {3, 5}, new SnCurve(3, 4, 100, 1e9, 3, 1e9), 100);
        assertEquals(0, sum.equivalent(0, 1, 0));
        sum.cycle(3, 1, 1);
        sum.cycle(4, 0, 0.5);
        sum.cycle(3, 1, 1);
        assertEquals(Math.cbrt(86 / 2.5), sum.equivalent(0, 1, 0), ROUNDING);
        assertEquals(Math.pow((2 * 243 + 512) / 2.5, 0.2), sum.equivalent(1, 1, 0), ROUNDING);
        assertEquals(Math.cbrt(86 * 10 / 1000.0), sum.equivalent(0, 10, 1000), ROUNDING);
        assertEquals(sum.equivalent(0, 1, 0), sum.equivalent(0, 7, 0), ROUNDING);
        assertEquals(86 / 64.0 / 100, sum.damage(), ROUNDING);
        assertEquals(2.5, sum.cycles());
        assertEquals(4, sum.maxRange());
        assertEquals(
                java.util.List.of(new CycleTable.Row(4, 0, 0.5), new CycleTable.Row(3, 1, 2)),
                sum.table().rows());
    }

    @Test
    void longTablesAreBinnedAndLoseNoCycle() {
        long seed = 11;
        SplittableRandom random = new SplittableRandom(seed);
        int limit = 500;
        CycleAccumulator exact = new CycleAccumulator(new double[] {3, 5}, null, 1_000_000);
        CycleAccumulator binned = new CycleAccumulator(new double[] {3, 5}, null, limit);
        double[][] cycles = new double[20_000][];
        for (int i = 0; i < cycles.length; i++) {
            cycles[i] = new double[] {random.nextDouble() * 100, random.nextDouble() * 40 - 20};
            exact.cycle(cycles[i][0], cycles[i][1], 1);
            binned.cycle(cycles[i][0], cycles[i][1], 1);
        }
        assertEquals(0, exact.table().width());
        assertEquals(20_000, exact.table().rows().size());
        double width = binned.table().width();
        assertTrue(width > 0 && binned.table().rows().size() <= limit, "width " + width);
        assertEquals(20_000, binned.table().cycles());
        // Sums are of the single cycles, whatever the table holds.
        assertEquals(exact.equivalent(1, 1, 0), binned.equivalent(1, 1, 0), 1e-12 * 100);
        // Half a width uniformly spread: the table's own moment is near, not equal.
        assertEquals(1, binned.table().moment(3) / exact.table().moment(3), 0.01);
        // Narrowest bins within the limit: the next narrower would be too many.
        assertTrue(distinct(cycles, width / 2) > limit && distinct(cycles, width) <= limit, "width " + width);
    }

    private static long distinct(double[][] cycles, double width) {
        return Arrays.stream(cycles)
                .map(c -> Math.floor(c[0] / width) + " " + Math.floor(c[1] / width))
                .distinct()
                .count();
    }

    @Test
    void combiningEqualsCountingTogether() {
        long seed = 3;
        SplittableRandom random = new SplittableRandom(seed);
        for (int limit : new int[] {100, 100_000}) {
            CycleAccumulator all = new CycleAccumulator(new double[] {3, 4.5}, SnCurve.category(71), limit);
            CycleAccumulator[] part = {
                new CycleAccumulator(new double[] {3, 4.5}, SnCurve.category(71), limit),
                new CycleAccumulator(new double[] {3, 4.5}, SnCurve.category(71), limit)
            };
            for (int i = 0; i < 5000; i++) {
                double range = random.nextInt(1, 200);
                double mean = random.nextInt(100) * 0.5;
                all.cycle(range, mean, 0.5);
                part[i % 2].cycle(range, mean, 0.5);
            }
            part[0].combine(part[1]);
            assertEquals(all.cycles(), part[0].cycles());
            assertEquals(1, part[0].damage() / all.damage(), ROUNDING);
            assertEquals(1, part[0].equivalent(1, 1, 0) / all.equivalent(1, 1, 0), ROUNDING);
            assertEquals(all.table().cycles(), part[0].table().cycles());
            if (limit > 5000) {
                assertEquals(all.table(), part[0].table());
            }
        }
    }

    @Test
    void matrixHoldsEveryCycleInItsClass() {
        CycleAccumulator sum = new CycleAccumulator(new double[] {3}, null, 100);
        sum.cycle(10, 5, 1);
        sum.cycle(2.4, -5, 2);
        sum.cycle(2.5, 0, 4);
        RangeMeanMatrix matrix = RangeMeanMatrix.of(sum.table(), 4);
        assertEquals(2.5, matrix.rangeStep());
        assertEquals(-5, matrix.meanLow());
        assertEquals(2.5, matrix.meanStep());
        assertEquals(1, matrix.counts()[3][3]);
        assertEquals(2, matrix.counts()[0][0]);
        assertEquals(4, matrix.counts()[1][2]);
    }

    @Test
    void eightLevelsKeepCountsAndTellTheDamage() {
        CycleAccumulator sum = new CycleAccumulator(new double[] {3}, null, 10_000);
        for (int i = 1; i <= 1000; i++) {
            sum.cycle(i * 0.1, 10, 1001 - i);
        }
        BlockSpectrum kept = BlockSpectrum.of(sum.table(), MeanRule.KEPT);
        assertEquals(8, kept.levels().size());
        assertEquals(
                sum.cycles(),
                kept.leftOut()
                        + kept.levels().stream()
                                .mapToDouble(BlockSpectrum.Level::count)
                                .sum());
        // Ranges 97.5 … 100 are nearest to 1.0; below 5 none: 49 ranges 0.1 … 4.9 with counts 1000 … 952.
        assertEquals(26 * 27 / 2, kept.levels().get(0).count());
        assertEquals((1000 + 952) * 49 / 2, kept.leftOut());
        assertEquals(10, kept.levels().get(7).mean());
        double moment = kept.levels().stream()
                .mapToDouble(l -> l.count() * Math.pow(l.range(), 3))
                .sum();
        assertEquals(moment / sum.table().moment(3), kept.kept(r -> r * r * r), ROUNDING);

        BlockSpectrum goodman = BlockSpectrum.of(sum.table(), new MeanRule(50));
        assertEquals(100 / (1 - 10 / 50.0), goodman.levels().get(0).range(), 1e-9);
        assertEquals(0, goodman.levels().get(0).mean());
        assertEquals(kept.levels().get(0).count(), goodman.levels().get(0).count());
        assertThrows(IllegalArgumentException.class, () -> BlockSpectrum.of(sum.table(), new MeanRule(10)));
        assertEquals(7, new MeanRule(50).range(7, -20));
    }
}
