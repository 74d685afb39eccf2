package org.rodside.io;

import com.fasterxml.jackson.core.JacksonException;
import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import com.fasterxml.jackson.core.io.JsonEOFException;
import com.fasterxml.jackson.core.json.JsonReadFeature;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * JSON text as plain Java values: {@code Map<String, Object>} in file order, {@code List<Object>}, {@code String},
 * {@code Boolean}, {@link Number}, {@link Null}. A key that appears twice is a fault but does not end the reading, so
 * that it is reported together with all others. NaN and infinities are read as numbers and left to the caller to refuse
 * at their path.
 */
final class JsonTree {

    /** Our own formats are six levels deep at most; the limit keeps a hostile file from exhausting the stack. */
    static final int MOST_LEVELS = 64;

    /** Longest piece of a user's value shown in an error; in characters. */
    private static final int SHOWN_CHARACTERS = 40;

    private static final JsonFactory FACTORY = JsonFactory.builder()
            .streamReadConstraints(
                    StreamReadConstraints.builder().maxNestingDepth(MOST_LEVELS).build())
            .enable(JsonReadFeature.ALLOW_NON_NUMERIC_NUMBERS)
            .build();

    /**
     * A number.
     *
     * @param text as written in the file
     * @param value its value, possibly not finite
     */
    record Number(String text, double value) {}

    /** The value null. */
    enum Null {
        NULL
    }

    /**
     * What became of a text.
     *
     * @param root the value; null when the text is not JSON
     * @param trouble why it is not JSON; null when it is
     */
    record Parsed(Object root, String trouble) {}

    private final JsonParser parser;
    private final String startPath;
    private final FaultAccumulator faults;

    private JsonTree(JsonParser parser, String startPath, FaultAccumulator faults) {
        this.parser = parser;
        this.startPath = startPath;
        this.faults = faults;
    }

    /** Reads one JSON value; keys that appear twice are added to the faults under the start path. */
    static Parsed parse(String text, String startPath, FaultAccumulator faults) {
        try (JsonParser parser = FACTORY.createParser(text)) {
            JsonTree tree = new JsonTree(parser, startPath, faults);
            if (parser.nextToken() == null) {
                return new Parsed(null, "holds no JSON value");
            }
            Object root = tree.value(startPath);
            if (parser.nextToken() != null) {
                return new Parsed(
                        null,
                        where(parser.currentTokenLocation()) + "there is more text after the end of the JSON value");
            }
            return new Parsed(root, null);
        } catch (JacksonException e) {
            return new Parsed(null, where(e.getLocation()) + plainWords(e));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private Object value(String path) throws IOException {
        JsonToken token = parser.currentToken();
        return switch (token) {
            case START_OBJECT -> object(path);
            case START_ARRAY -> list(path);
            case VALUE_STRING -> parser.getText();
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> new Number(parser.getText(), parser.getDoubleValue());
            case VALUE_TRUE -> Boolean.TRUE;
            case VALUE_FALSE -> Boolean.FALSE;
            case VALUE_NULL -> Null.NULL;
            default -> throw new IllegalStateException("JSON token " + token);
        };
    }

    private Map<String, Object> object(String path) throws IOException {
        Map<String, Object> members = new LinkedHashMap<>();
        Map<String, Integer> lines = new HashMap<>();
        while (parser.nextToken() != JsonToken.END_OBJECT) {
            String key = parser.currentName();
            int line = parser.currentTokenLocation().getLineNr();
            String keyPath = join(path, key);
            parser.nextToken();
            Object value = value(keyPath);
            Integer first = lines.putIfAbsent(key, line);
            if (first == null) {
                members.put(key, value);
            } else {
                faults.add(keyPath, "the key appears twice, in line " + first + " and in line " + line + "; keep one");
            }
        }
        return members;
    }

    private List<Object> list(String path) throws IOException {
        List<Object> items = new ArrayList<>();
        while (parser.nextToken() != JsonToken.END_ARRAY) {
            items.add(value(join(path, String.valueOf(items.size()))));
        }
        return items;
    }

    /** The path of a member of the value at a path. */
    static String join(String path, String key) {
        return path.isEmpty() ? key : path + "." + key;
    }

    /** What a value is, for the word "found" of an error. */
    static String describe(Object node) {
        if (node instanceof Number number) {
            return shorten(number.text());
        } else if (node instanceof String text) {
            return "the text \"" + shorten(text) + "\"";
        } else if (node instanceof List<?> list) {
            return list.isEmpty() ? "an empty list" : "a list of " + list.size();
        } else if (node instanceof Map<?, ?> map) {
            return map.isEmpty() ? "an empty object" : "an object";
        } else if (node == Null.NULL) {
            return "null";
        }
        return String.valueOf(node);
    }

    static String shorten(String text) {
        return text.length() <= SHOWN_CHARACTERS ? text : text.substring(0, SHOWN_CHARACTERS) + "…";
    }

    private static String where(JsonLocation location) {
        return location == null
                ? "is not JSON: "
                : "is not JSON at line " + location.getLineNr() + ", column " + location.getColumnNr() + ": ";
    }

    /** The parser's complaint without its talk of settings that a user cannot reach. */
    private static String plainWords(JacksonException trouble) {
        if (trouble instanceof JsonEOFException) {
            return "the text ends before the JSON is complete; a bracket, brace or quote is missing";
        } else if (trouble instanceof StreamConstraintsException) {
            return "a name, a number or the nesting is too long (at most " + MOST_LEVELS + " levels)";
        }
        String words = trouble.getOriginalMessage();
        if (words.contains("comment")) {
            return "comments are not part of JSON; put remarks into \"note\"";
        }
        words = words.replaceAll("\\s+", " ").replaceAll(" ?\\((code|for non-standard)[^)]*\\)", "");
        int settings = words.indexOf(": enable");
        return JsonTree.shortenMessage(settings > 0 ? words.substring(0, settings) : words);
    }

    private static String shortenMessage(String words) {
        int most = 4 * SHOWN_CHARACTERS;
        return words.length() <= most ? words : words.substring(0, most) + "…";
    }
}
