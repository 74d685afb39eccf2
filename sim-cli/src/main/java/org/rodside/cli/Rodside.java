package org.rodside.cli;

import java.util.concurrent.Callable;
import picocli.CommandLine;
import picocli.CommandLine.Command;

/** The command {@code rodside} with its subcommands. */
@Command(name = "rodside", mixinStandardHelpOptions = true, description = "Front-equipment answers from one drawing.")
public final class Rodside implements Callable<Integer> {

    static int run(String... args) {
        return new CommandLine(new Rodside()).execute(args);
    }

    @Override
    public Integer call() {
        CommandLine.usage(this, System.out);
        return 2;
    }
}
