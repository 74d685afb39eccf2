package org.rodside.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.File;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Help must come at once: a child process prints every help text and lists the classes it loaded for that. */
class LightHelpTest {

    private static final List<String> HEAVY = List.of("com.fasterxml.", "org.knowm.", "java.awt.", "org.ejml.");

    @Test
    void helpLoadsNoReaderNoPlotsAndNoGraphics() throws Exception {
        String java = Path.of(System.getProperty("java.home"), "bin", "java").toString();
        String classPath = System.getProperty("java.class.path", "") + File.pathSeparator + location();
        Process child = new ProcessBuilder(java, "-Xlog:class+load", "-cp", classPath, LightHelp.class.getName())
                .redirectErrorStream(true)
                .start();
        List<String> loaded;
        try (Stream<String> lines = child.inputReader().lines()) {
            loaded = lines.toList();
        }
        assertEquals(0, child.waitFor(), () -> "child failed: " + loaded.get(loaded.size() - 1));
        assertTrue(loaded.stream().anyMatch(line -> line.contains("org.rodside.cli.Rodside ")), "no class list came");
        List<String> heavy = loaded.stream()
                .filter(line -> HEAVY.stream().anyMatch(name -> line.contains(" " + name)))
                .toList();
        assertEquals(List.of(), heavy);
    }

    private static String location() throws Exception {
        return Path.of(LightHelp.class
                        .getProtectionDomain()
                        .getCodeSource()
                        .getLocation()
                        .toURI())
                .toString();
    }
}
