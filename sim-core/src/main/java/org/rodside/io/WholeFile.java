package org.rodside.io;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.AccessDeniedException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.NotDirectoryException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.concurrent.atomic.AtomicLong;
import org.rodside.model.InputException;

/**
 * A file that appears whole or not at all: it is written beside its place and renamed when complete, so that a reader
 * never sees half of it and a failed run leaves the old one. {@link #close} is the moment it appears; after
 * {@link #abort}, or when a write failed, it never does. Where the content may fail half way, use
 * {@link #write(Path, Content)}, which aborts then. Not safe for several threads.
 */
public final class WholeFile extends OutputStream {

    private static final AtomicLong SERIAL = new AtomicLong();

    private final Path target;
    private final Path part;
    private final OutputStream out;
    private boolean failed;
    private boolean closed;

    /** Something that writes a file's content and leaves the stream open. */
    @FunctionalInterface
    public interface Content {
        /** Writes everything to the stream. */
        void writeTo(OutputStream out) throws IOException;
    }

    /**
     * Starts a file; its folder is made where it is missing.
     *
     * @throws IOException when the folder or the file cannot be made, or the place is taken by something not a file
     */
    public WholeFile(Path target) throws IOException {
        // A link stays a link: the file it points to is replaced.
        Path place = (Files.exists(target) ? target.toRealPath() : target).toAbsolutePath();
        if (Files.exists(place) && !Files.isRegularFile(place)) {
            throw new FileAlreadyExistsException(target.toString(), null, "is there and is not a plain file");
        }
        Files.createDirectories(place.getParent());
        this.target = place;
        String name = "." + place.getFileName() + "." + ProcessHandle.current().pid() + "-" + SERIAL.incrementAndGet()
                + ".part";
        this.part = place.resolveSibling(name);
        this.out = new BufferedOutputStream(
                Files.newOutputStream(part, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE));
    }

    /**
     * Writes a whole file.
     *
     * @param bytes the content; not modified
     * @throws InputException when the place given by the user cannot be written
     */
    public static void write(Path target, byte[] bytes) {
        write(target, out -> out.write(bytes));
    }

    /**
     * Writes a whole file; when the content throws anything, nothing appears.
     *
     * @throws InputException when the place given by the user cannot be written
     */
    public static void write(Path target, Content content) {
        try (WholeFile file = new WholeFile(target)) {
            boolean complete = false;
            try {
                content.writeTo(file);
                complete = true;
            } finally {
                if (!complete) {
                    file.abort();
                }
            }
        } catch (IOException e) {
            throw refused(target, e);
        }
    }

    /** The fault to show a user when a file cannot be written. */
    public static InputException refused(Path target, IOException why) {
        String words;
        if (why instanceof AccessDeniedException) {
            words = "no permission";
        } else if (why instanceof FileAlreadyExistsException || why instanceof NotDirectoryException) {
            words = "something that is not " + (Files.isDirectory(target) ? "a file" : "a folder or plain file")
                    + " is in the way";
        } else {
            words = why.getMessage();
        }
        return new InputException(target + ": cannot be written: " + words + "; give another place");
    }

    @Override
    public void write(int b) throws IOException {
        write(new byte[] {(byte) b}, 0, 1);
    }

    @Override
    public void write(byte[] bytes, int from, int count) throws IOException {
        if (closed) {
            throw new IOException("the file is closed");
        }
        try {
            out.write(bytes, from, count);
        } catch (IOException e) {
            failed = true;
            throw e;
        }
    }

    @Override
    public void flush() throws IOException {
        if (!closed) {
            out.flush();
        }
    }

    /** Gives the file up: nothing appears, what was written is removed. Harmless after {@link #close}. */
    public void abort() {
        failed = true;
        try {
            close();
        } catch (IOException e) {
            // Nothing to add: whoever gives the file up is already dealing with the trouble that matters.
        }
    }

    /** Completes the file and puts it in its place, once; after a failed write it only removes what was written. */
    @Override
    public void close() throws IOException {
        if (closed) {
            return;
        }
        closed = true;
        try {
            out.close();
            if (!failed) {
                move();
            }
        } finally {
            Files.deleteIfExists(part);
        }
    }

    private void move() throws IOException {
        try {
            Files.move(part, target, StandardCopyOption.ATOMIC_MOVE);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(part, target, StandardCopyOption.REPLACE_EXISTING);
        }
    }
}
