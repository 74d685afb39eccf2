package org.rodside.io;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.rodside.model.InputException;

class WholeFileTest {

    private static final byte[] OLD = "old".getBytes(StandardCharsets.UTF_8);
    private static final byte[] NEW = "new and longer".getBytes(StandardCharsets.UTF_8);

    @TempDir
    Path folder;

    private List<String> names() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(file -> file.getFileName().toString()).sorted().toList();
        }
    }

    @Test
    void foldersAreMadeAndFilesReplaced() throws IOException {
        Path file = folder.resolve("a/b/c.csv");
        WholeFile.write(file, OLD);
        WholeFile.write(file, NEW);
        assertEquals("new and longer", Files.readString(file));
        assertEquals(1, file.getParent().toFile().list().length);
    }

    @Test
    void theFileAppearsWhenClosedAndNotBefore() throws IOException {
        Path file = folder.resolve("c.csv");
        try (WholeFile whole = new WholeFile(file)) {
            whole.write(NEW);
            whole.write('!');
            whole.flush();
            assertFalse(Files.exists(file));
        }
        assertEquals("new and longer!", Files.readString(file));
        assertEquals(List.of("c.csv"), names());
    }

    @Test
    void anAbortedFileLeavesTheOldOne() throws IOException {
        Path file = folder.resolve("c.csv");
        WholeFile.write(file, OLD);
        try (WholeFile whole = new WholeFile(file)) {
            whole.write(NEW);
            whole.abort();
            assertThrows(IOException.class, () -> whole.write(1));
        }
        assertEquals("old", Files.readString(file));
        assertEquals(List.of("c.csv"), names());
    }

    @Test
    void contentThatFailsLeavesNothing() throws IOException {
        Path file = folder.resolve("c.csv");
        IllegalStateException ours = new IllegalStateException("half way");
        assertEquals(
                ours,
                assertThrows(
                        IllegalStateException.class,
                        () -> WholeFile.write(file, out -> {
                            out.write(NEW);
                            throw ours;
                        })));
        InputException full = assertThrows(
                InputException.class,
                () -> WholeFile.write(file, out -> {
                    throw new IOException("no space left");
                }));
        assertEquals(file + ": cannot be written: no space left; give another place", full.getMessage());
        assertEquals(List.of(), names());
    }

    @Test
    void whatIsInTheWayIsSaid() throws IOException {
        Path taken = Files.createDirectory(folder.resolve("taken"));
        String inTheWay = assertThrows(InputException.class, () -> WholeFile.write(taken, NEW))
                .getMessage();
        assertEquals(
                taken + ": cannot be written: something that is not a file is in the way; give another place",
                inTheWay);
        Path file = Files.write(folder.resolve("file"), OLD);
        Path below = file.resolve("c.csv");
        String notAFolder = assertThrows(InputException.class, () -> WholeFile.write(below, NEW))
                .getMessage();
        assertTrue(notAFolder.startsWith(below + ": cannot be written: "), notAFolder);
        assertEquals(List.of("file", "taken"), names());
    }

    @Test
    void aLinkStaysALink() throws IOException {
        Path file = Files.write(folder.resolve("file"), OLD);
        Path link = Files.createSymbolicLink(folder.resolve("link"), file);
        WholeFile.write(link, NEW);
        assertTrue(Files.isSymbolicLink(link));
        assertEquals("new and longer", Files.readString(file));
    }
}
