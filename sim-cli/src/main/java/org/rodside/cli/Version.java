package org.rodside.cli;

import picocli.CommandLine.IVersionProvider;

/** The version as the jar's manifest has it. */
final class Version implements IVersionProvider {

    @Override
    public String[] getVersion() {
        String built = Rodside.class.getPackage().getImplementationVersion();
        return new String[] {
            "rodside " + (built == null ? "(not from a jar)" : built),
            "Java " + System.getProperty("java.version") + ", " + System.getProperty("java.vendor")
        };
    }
}
