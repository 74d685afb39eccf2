package org.rodside.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.util.Arrays;
import java.util.concurrent.Callable;
import org.junit.jupiter.api.Test;
import org.rodside.model.Linkage;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/** The pieces that every command on a linkage is put together from, on a real file. */
class LinkageCommandTest {

    private static final String FRONT = "../linkages/sallow-22.json";

    private final StringWriter out = new StringWriter();
    private final StringWriter err = new StringWriter();

    @Command(name = "probe")
    static final class Probe implements Callable<Integer> {

        @Mixin
        private CommonOptions common;

        @Mixin
        private LinkageFile file;

        @Mixin
        private PoseArgument pose;

        @Override
        public Integer call() {
            Linkage linkage = file.read(common);
            String at = pose.fractions(linkage).map(Arrays::toString).orElse("no pose");
            common.out()
                    .println(linkage.cylinders().get(0).bore() + " " + at + " "
                            + Arrays.toString(pose.fractions(linkage, 0.5)));
            return ExitStatus.DONE;
        }
    }

    @Test
    void fileOverridesAndPoseComeTogether() {
        assertEquals(0, run(FRONT, "--set", "cylinders.boom.bore=130", "--at", "bucket=0.3,boom=0.4,stick=1"));
        assertEquals("0.13 [0.4, 1.0, 0.3] [0.4, 1.0, 0.3]", out.toString().strip());
        out.getBuffer().setLength(0);
        assertEquals(0, run(FRONT));
        assertEquals("0.125 no pose [0.5, 0.5, 0.5]", out.toString().strip());
    }

    @Test
    void faultsOfFileAndPoseEndInStatusTwo() {
        assertEquals(2, run("../linkages/none.json"));
        assertTrue(err.toString().startsWith("rodside: ../linkages/none.json"), err.toString());
        err.getBuffer().setLength(0);
        assertEquals(2, run(FRONT, "--at", "bom=0.4,stick=1,bucket=2"));
        assertEquals(3, err.toString().lines().count(), err.toString());
        assertTrue(err.toString().lines().allMatch(line -> line.startsWith("rodside: --at: ")), err.toString());
    }

    private int run(String... args) {
        String[] all = new String[args.length + 1];
        all[0] = "probe";
        System.arraycopy(args, 0, all, 1, args.length);
        CommandLine line =
                Rodside.configure(new CommandLine(new Rodside()).addSubcommand("probe", new CommandLine(new Probe())));
        return Rodside.run(line, new PrintWriter(out), new PrintWriter(err), all);
    }
}
