package org.rodside.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.rodside.fatigue.MeanRule;
import org.rodside.io.CsvReader;
import org.rodside.io.CsvWriter;
import org.rodside.io.JsonWriter;
import org.rodside.model.InputException;
import org.rodside.report.CyclesReport;
import org.rodside.study.CycleCount;
import org.rodside.study.CycleCountAccumulator;
import org.rodside.study.CycleOptions;
import org.rodside.study.CycleTables;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Rainflow counts and equivalent ranges of any columns of any CSV file. */
@Command(
        name = "cycles",
        description = "Rainflow counts (ASTM E1049) and equivalent ranges of recordings.",
        mixinStandardHelpOptions = true,
        sortOptions = false,
        footer = {
            "",
            "Examples:",
            "  rodside cycles results/pass/history/history.csv --columns boom.force_kN,stick.force_kN",
            "  rodside cycles strain.csv.gz --slopes 3,5 --curve 71 --hours 10000 --blocks 8"
        })
final class CyclesCommand implements Runnable {

    private static final String TIME = "time_s";

    @Mixin
    private CommonOptions common;

    @Parameters(
            arity = "1..*",
            paramLabel = "HISTORY.csv",
            description = "Recordings in their order; .gz is read, - is standard input.")
    private List<String> files;

    @Option(names = "--columns", split = ",", paramLabel = "NAME", description = "Channels. Default: all but time_s")
    private List<String> columns = List.of();

    @Option(names = "--slopes", split = ",", paramLabel = "M", description = "Slopes m of S-N lines. Default: 3,5")
    private List<Double> slopes = List.of(3.0, 5.0);

    @Option(names = "--reference", paramLabel = "N", description = "Cycles of the equivalent range. Default: counted")
    private double reference;

    @Option(names = "--repeat", description = "The recordings repeat without end: full cycles only.")
    private boolean repeat;

    @Option(
            names = "--separate",
            description = "Each file stands alone: counts add. Default: each goes on where the one before ended")
    private boolean separate;

    @Option(names = "--gate", paramLabel = "G", description = "Pass over swings below G, unit of the channel.")
    private double gate;

    @Option(names = "--bins", paramLabel = "N", description = "Write a range-mean matrix of N by N classes.")
    private int bins;

    @Option(
            names = "--curve",
            paramLabel = "S-N",
            description = "Damage sum: 71 (category of EN 1993-1-9, MPa) or m=3,range=71,cycles=2e6[,knee=5e6[,m2=5"
                    + "[,cutoff=1e8]]], range in the unit of the channel.")
    private String curve;

    @Option(names = "--hours", paramLabel = "H", description = "Scale counts from the recorded time to H hours.")
    private double hours;

    @Option(names = "--blocks", paramLabel = "8", description = "Write the eight-level program spectrum.")
    private int blocks;

    @Option(
            names = "--mean",
            paramLabel = "RULE",
            description = "Means in the spectrum: kept, or goodman=STRENGTH in the unit of the channel. Default: kept")
    private String mean = "kept";

    @Override
    public void run() {
        CycleOptions options = options();
        CycleCount count = count(options);
        Optional<Path> folder = common.folder(Path.of(files.get(0)));
        folder.ifPresent(f -> write(f, count));
        CyclesReport report = new CyclesReport(count);
        report.notes().forEach(common::note);
        common.out().print(common.json() ? JsonWriter.text(report.json()) : report.text());
        if (!common.json()) {
            folder.ifPresent(f -> common.out().println("Written to " + f));
        }
    }

    private CycleOptions options() {
        List<String> faults = new ArrayList<>();
        for (double slope : slopes) {
            require(slope >= 1 && slope <= 30, "--slopes", slope, "from 1 to 30", faults);
        }
        require(reference >= 0 && reference <= 1e30, "--reference", reference, "from 0 to 1e30", faults);
        require(gate >= 0 && gate <= 1e30, "--gate", gate, "from 0 to 1e30", faults);
        require(hours >= 0 && hours <= 1e9, "--hours", hours, "from 0 to 1e9", faults);
        require(bins >= 0 && bins <= 1000, "--bins", bins, "from 1 to 1000", faults);
        require(blocks == 0 || blocks == 8, "--blocks", blocks, "8, the only spectrum there is", faults);
        if (!faults.isEmpty()) {
            throw new InputException(faults);
        }
        return new CycleOptions(
                slopes,
                reference,
                repeat,
                separate,
                gate,
                hours,
                curve == null ? null : CurveText.read(curve),
                bins,
                blocks == 0 ? null : rule());
    }

    private static void require(boolean good, String option, double found, String wanted, List<String> faults) {
        if (!good) {
            faults.add(option + ": " + found + " was given; wanted is a number " + wanted);
        }
    }

    private MeanRule rule() {
        if (mean.equals("kept")) {
            return MeanRule.KEPT;
        }
        try {
            double strength = Double.parseDouble(mean.replaceFirst("^goodman=", ""));
            if (mean.startsWith("goodman=") && strength > 0) {
                return new MeanRule(strength);
            }
        } catch (IllegalArgumentException e) {
            // told below
        }
        throw new InputException("--mean: '" + mean + "' was given; wanted is kept or goodman=STRENGTH");
    }

    private CycleCount count(CycleOptions options) {
        CycleCountAccumulator counter = null;
        List<String> channels = columns;
        for (String file : files) {
            try (CsvReader reader = CsvReader.open(file)) {
                if (counter == null) {
                    channels = channels.isEmpty() ? without(reader.header()) : channels;
                    counter = new CycleCountAccumulator(channels, options);
                }
                counter.begin(reader::where);
                read(reader, channels, counter);
            }
        }
        return counter.finish();
    }

    private static List<String> without(List<String> header) {
        List<String> channels = new ArrayList<>(header);
        channels.remove(TIME);
        if (channels.isEmpty()) {
            throw new InputException("there is no channel to count: the only column is " + TIME);
        }
        return channels;
    }

    private static void read(CsvReader reader, List<String> channels, CycleCountAccumulator counter) {
        boolean timed = reader.header().contains(TIME) && !channels.contains(TIME);
        List<String> wanted = new ArrayList<>(channels);
        if (timed) {
            wanted.add(TIME);
        }
        reader.choose(wanted);
        double[] row = new double[wanted.size()];
        while (reader.next(row)) {
            counter.row(row, timed ? row[row.length - 1] : Double.NaN);
        }
    }

    private void write(Path folder, CycleCount count) {
        CycleTables tables = new CycleTables(count);
        CsvWriter.write(folder.resolve("cycles.csv"), tables.cycleColumns(), common.units(), tables::cycles);
        if (bins > 0) {
            CsvWriter.write(folder.resolve("matrix.csv"), tables.matrixColumns(), common.units(), tables::matrix);
        }
        if (blocks > 0) {
            CsvWriter.write(folder.resolve("blocks.csv"), tables.blockColumns(), common.units(), tables::blocks);
        }
    }
}
