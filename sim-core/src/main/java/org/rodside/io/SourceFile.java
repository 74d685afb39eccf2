package org.rodside.io;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import org.rodside.model.InputException;

/** Gets the text of a user's file, or says in plain words why there is none. */
final class SourceFile {

    /** A linkage file is a few thousand bytes; more than this is some other file. */
    static final int MOST_BYTES = 16 * 1024 * 1024;

    private static final char BYTE_ORDER_MARK = '\uFEFF';

    private SourceFile() {}

    /**
     * The bytes of a file.
     *
     * @throws InputException when the file is missing, a folder, unreadable or too big
     */
    static byte[] bytes(Path file) {
        if (Files.isDirectory(file)) {
            throw new InputException(file + ": is a folder; give a file");
        }
        try (InputStream in = Files.newInputStream(file)) {
            byte[] bytes = in.readNBytes(MOST_BYTES + 1);
            if (bytes.length > MOST_BYTES) {
                throw new InputException(file + ": is bigger than " + MOST_BYTES + " bytes; is it the right file?");
            }
            return bytes;
        } catch (NoSuchFileException e) {
            Path folder = file.toAbsolutePath().getParent();
            boolean noFolder = folder != null && !Files.isDirectory(folder);
            throw new InputException(
                    file + ": there is no such " + (noFolder ? "folder as " + folder : "file") + "; check the path");
        } catch (AccessDeniedException e) {
            throw new InputException(file + ": may not be read: no permission");
        } catch (IOException e) {
            throw new InputException(file + ": cannot be read: " + e.getMessage());
        }
    }

    /** The bytes as UTF-8 text without a byte order mark; null, with a fault added, when they are not UTF-8 or empty. */
    static String text(byte[] bytes, FaultAccumulator faults) {
        ByteBuffer in = ByteBuffer.wrap(bytes);
        CharBuffer out = CharBuffer.allocate(bytes.length);
        CoderResult result = StandardCharsets.UTF_8
                .newDecoder()
                .onMalformedInput(CodingErrorAction.REPORT)
                .onUnmappableCharacter(CodingErrorAction.REPORT)
                .decode(in, out, true);
        if (result.isError()) {
            int offset = in.position();
            String found = Integer.toHexString(bytes[offset] & 0xFF);
            faults.add(
                    "",
                    "is not UTF-8 text: byte " + found + " (hexadecimal) at byte offset " + offset
                            + "; save it as UTF-8");
            return null;
        }
        String text = out.flip().toString();
        text = !text.isEmpty() && text.charAt(0) == BYTE_ORDER_MARK ? text.substring(1) : text;
        if (text.isBlank()) {
            faults.add("", "is empty; it must hold one JSON object");
            return null;
        }
        return text;
    }
}
