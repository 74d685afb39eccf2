package org.rodside.fatigue;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.Map;
import java.util.SplittableRandom;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;

class RainflowAccumulatorTest {

    private static final int LIMIT = 100_000;

    /** A signal counted and its cycles, by "range mean". */
    private record Counted(RainflowAccumulator flow, Map<String, Double> cycles) {

        static Counted of(double gate, double... signal) {
            Map<String, Double> cycles = new TreeMap<>();
            RainflowAccumulator flow = new RainflowAccumulator(gate, LIMIT, sink(cycles));
            for (double value : signal) {
                flow.accept(value);
            }
            return new Counted(flow, cycles);
        }

        Map<String, Double> single() {
            Map<String, Double> all = new TreeMap<>(cycles);
            flow.halves(sink(all));
            return all;
        }

        Map<String, Double> repeated() {
            Map<String, Double> all = new TreeMap<>(cycles);
            flow.repeated(sink(all));
            return all;
        }

        Counted then(Counted next) {
            flow.combine(next.flow);
            next.cycles.forEach((k, n) -> cycles.merge(k, n, Double::sum));
            return this;
        }
    }

    private static CycleSink sink(Map<String, Double> counts) {
        return (range, mean, n) -> counts.merge(PlainRainflow.key(range, mean), n, Double::sum);
    }

    /** ASTM E1049-85 (2017) Fig. 6 (seen): signal −2 1 −3 5 −1 3 −4 4 −2; the means follow from its table of ranges. */
    @Test
    void standardsExample() {
        Counted counted = Counted.of(0, -2, 1, -3, 5, -1, 3, -4, 4, -2);
        Map<String, Double> expected = new TreeMap<>(Map.of(
                "3.0 -0.5", 0.5, // A–B
                "4.0 -1.0", 0.5, // B–C
                "4.0 1.0", 1.0, // E–F
                "8.0 1.0", 0.5, // C–D
                "9.0 0.5", 0.5, // D–G
                "8.0 0.0", 0.5, // G–H
                "6.0 1.0", 0.5)); // H–I
        assertEquals(expected, counted.single());
    }

    private static double[] signal(SplittableRandom random) {
        double[] signal = new double[1 + random.nextInt(60)];
        int levels = 2 + random.nextInt(30);
        for (int i = 0; i < signal.length; i++) {
            // Few levels make many ties; eighths keep every mean exact.
            signal[i] = (random.nextInt(levels) - levels / 2) * 0.125;
        }
        return signal;
    }

    @Test
    void agreesWithTheStandardsStepsOnRandomSignals() {
        for (long seed = 0; seed < 20_000; seed++) {
            double[] signal = signal(new SplittableRandom(seed));
            Counted counted = Counted.of(0, signal);
            assertEquals(PlainRainflow.single(signal), counted.single(), "seed " + seed);
            assertEquals(PlainRainflow.repeated(signal), counted.repeated(), "repeated, seed " + seed);
        }
    }

    @Test
    void recordingsThatFollowEachOtherMergeToTheCountOfTheWhole() {
        int differentWhenAdded = 0;
        for (long seed = 0; seed < 20_000; seed++) {
            SplittableRandom random = new SplittableRandom(seed);
            double[] signal = signal(random);
            double gate = random.nextInt(3) * 0.25;
            int one = random.nextInt(signal.length + 1);
            int two = one + random.nextInt(signal.length - one + 1);
            Counted a = Counted.of(gate, Arrays.copyOfRange(signal, 0, one));
            Counted b = Counted.of(gate, Arrays.copyOfRange(signal, one, two));
            Counted c = Counted.of(gate, Arrays.copyOfRange(signal, two, signal.length));
            Map<String, Double> added = a.single();
            b.single().forEach((k, n) -> added.merge(k, n, Double::sum));
            c.single().forEach((k, n) -> added.merge(k, n, Double::sum));
            Map<String, Double> whole = Counted.of(gate, signal).single();
            boolean right = random.nextBoolean();
            Counted merged = right ? a.then(b.then(c)) : a.then(b).then(c);
            assertEquals(whole, merged.single(), "seed " + seed + " gate " + gate);
            differentWhenAdded += added.equals(whole) ? 0 : 1;
        }
        assertTrue(differentWhenAdded > 10_000, "adding alone should be wrong for most");
    }

    /** The gate passes over what it is wider than, and only that: closed cycles are those of the full count. */
    @Test
    void gateLeavesOutSmallCyclesOnly() {
        for (long seed = 0; seed < 5_000; seed++) {
            double[] signal = signal(new SplittableRandom(seed));
            Map<String, Double> large = Counted.of(0, signal).repeated();
            large.keySet().removeIf(k -> Double.parseDouble(k.split(" ")[0]) < 0.5);
            assertEquals(large, Counted.of(0.5, signal).repeated(), "seed " + seed);
        }
    }

    @Test
    void nothingAndOneValueAndAConstantHaveNoCycles() {
        assertTrue(Counted.of(0).single().isEmpty());
        assertTrue(Counted.of(0, 5).repeated().isEmpty());
        assertTrue(Counted.of(0, 5, 5, 5).single().isEmpty());
        assertEquals(Map.of("2.0 6.0", 0.5), Counted.of(0, 5, 5, 7, 7).single());
        assertEquals(Map.of("2.0 6.0", 1.0), Counted.of(0, 5, 5, 7, 7).repeated());
    }

    @Test
    void aSwingThatDiesAwayForEverMeetsTheLimit() {
        RainflowAccumulator flow = new RainflowAccumulator(0, 100, (r, m, n) -> {});
        RainflowAccumulator gated = new RainflowAccumulator(0.5, 100, (r, m, n) -> {});
        for (int i = 0; i < 100; i++) {
            flow.accept(Math.pow(-0.9, i));
            gated.accept(Math.pow(-0.9, i));
        }
        assertThrows(IllegalStateException.class, () -> flow.accept(0));
        gated.accept(0);
        assertTrue(gated.residue().length < 20);
    }
}
