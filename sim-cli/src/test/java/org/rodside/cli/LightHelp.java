package org.rodside.cli;

import java.io.PrintWriter;
import java.io.Writer;

/** Prints every help text there is and exits: what a child process runs to see which classes that takes. */
final class LightHelp {

    private LightHelp() {}

    public static void main(String[] args) {
        PrintWriter nowhere = new PrintWriter(Writer.nullWriter());
        int worst = Rodside.run(nowhere, nowhere, "--help");
        for (String command : Rodside.commandLine().getSubcommands().keySet()) {
            worst = Math.max(worst, Rodside.run(nowhere, nowhere, command, "--help"));
        }
        System.exit(worst);
    }
}
