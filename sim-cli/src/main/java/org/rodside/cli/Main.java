package org.rodside.cli;

/** Entry of the command line. */
public final class Main {

    private Main() {}

    public static void main(String[] args) {
        System.setProperty("java.awt.headless", "true");
        System.exit(new Rodside().run(args));
    }
}
