package org.rodside.io;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.StreamWriteFeature;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.util.Map;

/**
 * Writes plain Java values as JSON text. Numbers are written with the fewest digits that read back as the same number,
 * the same on every Java version; NaN and infinities, for which JSON has no word, become null.
 */
public final class JsonWriter {

    private static final JsonFactory FACTORY = JsonFactory.builder()
            .enable(StreamWriteFeature.USE_FAST_DOUBLE_WRITER)
            .build();

    private JsonWriter() {}

    /**
     * One JSON object, indented, with a line break (LF) at its end.
     *
     * @param tree members in the order to be written: maps with text keys, iterables, texts, numbers, booleans, nulls
     * @throws IllegalArgumentException when the tree holds any other kind of value
     */
    public static String text(Map<String, ?> tree) {
        StringWriter text = new StringWriter();
        DefaultIndenter lines = new DefaultIndenter("  ", "\n");
        try (JsonGenerator out = FACTORY.createGenerator(text)) {
            out.setPrettyPrinter(new DefaultPrettyPrinter().withObjectIndenter(lines));
            write(out, tree);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return text.append('\n').toString();
    }

    private static void write(JsonGenerator out, Object value) throws IOException {
        if (value instanceof Map<?, ?> members) {
            out.writeStartObject();
            for (Map.Entry<?, ?> member : members.entrySet()) {
                out.writeFieldName(String.valueOf(member.getKey()));
                write(out, member.getValue());
            }
            out.writeEndObject();
        } else if (value instanceof Iterable<?> items) {
            out.writeStartArray();
            for (Object item : items) {
                write(out, item);
            }
            out.writeEndArray();
        } else if (value instanceof Double || value instanceof Float) {
            number(out, ((Number) value).doubleValue());
        } else if (value instanceof Integer || value instanceof Long) {
            out.writeNumber(((Number) value).longValue());
        } else if (value instanceof String text) {
            out.writeString(text);
        } else if (value instanceof Boolean flag) {
            out.writeBoolean(flag);
        } else if (value == null) {
            out.writeNull();
        } else {
            throw new IllegalArgumentException("no JSON for " + value.getClass().getName());
        }
    }

    private static void number(JsonGenerator out, double value) throws IOException {
        if (Double.isFinite(value)) {
            // Adding 0 turns -0 into 0.
            out.writeNumber(value + 0.0);
        } else {
            out.writeNull();
        }
    }
}
