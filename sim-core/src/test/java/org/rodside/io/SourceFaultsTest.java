package org.rodside.io;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rodside.model.InputException;

/** Files that hold no linkage at all. */
class SourceFaultsTest {

    @TempDir
    Path folder;

    private static String fault(Path file) {
        List<String> faults = assertThrows(InputException.class, () -> LinkageReader.read(file, List.of()))
                .faults();
        assertEquals(1, faults.size(), faults::toString);
        return faults.get(0);
    }

    @Test
    void missingFolderEmptyOrHuge() throws IOException {
        Path missing = folder.resolve("none.json");
        assertEquals(missing + ": there is no such file; check the path", fault(missing));
        Path nowhere = folder.resolve("no-folder").resolve("none.json");
        assertEquals(
                nowhere + ": there is no such folder as " + nowhere.getParent() + "; check the path", fault(nowhere));
        assertEquals(folder + ": is a folder; give a file", fault(folder));
        Path empty = Files.write(folder.resolve("empty.json"), new byte[0]);
        assertEquals(empty + ": is empty; it must hold one JSON object", fault(empty));
        Path huge = Files.write(folder.resolve("huge.json"), new byte[SourceFile.MOST_BYTES + 1]);
        assertEquals(huge + ": is bigger than 16777216 bytes; is it the right file?", fault(huge));
    }

    @Test
    void byteOrderMarkIsTakenAndOtherEncodingsAreNamed() {
        assertEquals(List.of(), Drawn.faults("\uFEFF" + Drawn.exampleText()));
        assertEquals(
                List.of("x.json: is not UTF-8 text: byte fc (hexadecimal) at byte offset 11; save it as UTF-8"),
                Drawn.faults("{\"name\": \"Kübel\"}".getBytes(StandardCharsets.ISO_8859_1)));
        assertEquals(
                List.of("x.json: is not UTF-8 text: byte fe (hexadecimal) at byte offset 0; save it as UTF-8"),
                Drawn.faults("{}".getBytes(StandardCharsets.UTF_16)));
        // A two-byte letter cut in half at the end of the file.
        assertEquals(
                List.of("x.json: is not UTF-8 text: byte c3 (hexadecimal) at byte offset 2; save it as UTF-8"),
                Drawn.faults(new byte[] {'{', '"', (byte) 0xC3}));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            {"name": }                 | is not JSON at line 1, column 10: Unexpected character ('}'): expected a value
            {"name": 'x'}              | is not JSON at line 1, column 10: Unexpected character (''')
            {"name": "x",}             | is not JSON at line 1, column 14: Unexpected character ('}')
            {"name": "x"               | is not JSON at line 1, column 13: the text ends before the JSON is complete; a bracket, brace or quote is missing
            {"name": "x                | is not JSON at line 1
            // remark                  | is not JSON at line 1, column 1: comments are not part of JSON; put remarks into "note"
            {} {}                      | is not JSON at line 1, column 4: there is more text after the end of the JSON value
            {} x                       | is not JSON at line 1
            {"a": 01}                  | is not JSON at line 1
            {"a": .5}                  | is not JSON at line 1
            {"a": nan}                 | is not JSON at line 1
            [1, 2]                     | must be an object in braces, found a list of 2; a linkage file is one object
            "text"                     | must be an object in braces, found the text "text"; a linkage file is one object
            null                       | must be an object in braces, found null; a linkage file is one object
            NaN                        | must be an object in braces, found NaN; a linkage file is one object
            """)
    void notOneJsonObject(String text, String start) {
        List<String> faults = Drawn.faults(text);
        assertEquals(1, faults.size(), faults::toString);
        assertTrue(faults.get(0).startsWith("x.json: " + start), faults.get(0));
        assertTrue(!faults.get(0).contains("ALLOW") && !faults.get(0).contains("Feature"), faults.get(0));
    }

    @Test
    void deepNestingAndLongNumbers() {
        String deep = "{\"note\": " + "[".repeat(100_000) + "]".repeat(100_000) + "}";
        assertTrue(Drawn.faults(deep).get(0).contains("too long (at most 64 levels)"), Drawn.faults(deep)::toString);
        List<String> digits = Drawn.faults("{\"note\": " + "1".repeat(100_000) + "}");
        assertTrue(digits.get(0).startsWith("x.json: is not JSON"), digits::toString);
    }

    @Test
    void syntaxIsPlacedByLineAndColumn() {
        List<String> faults = Drawn.faults(Drawn.exampleText().replace("\"bore\": 140,", "\"bore\": 140"));
        assertEquals(1, faults.size());
        int line = 1
                + Drawn.exampleText()
                        .substring(0, Drawn.exampleText().indexOf("\"bore\": 140,"))
                        .split("\n", -1)
                        .length;
        assertTrue(faults.get(0).startsWith("x.json: is not JSON at line " + line + ", column 4: "), faults.get(0));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            "bore": 125,      | "bore": NaN,        | cylinders.boom.bore: must be a finite number, found NaN; give the bore in mm
            "bore": 125,      | "bore": -Infinity,  | cylinders.boom.bore: must be a finite number, found -Infinity; give the bore in mm
            "bore": 125,      | "bore": 1e999,      | cylinders.boom.bore: must be a finite number, found 1e999; give the bore in mm
            "bore": 125,      | "bore": "125",      | cylinders.boom.bore: must be a number, found the text "125"; give the bore in mm
            "bore": 125,      | "bore": 1, "bore": 125, | cylinders.boom.bore: the key appears twice
            "boom": {         | "boom": {}, "boom": { | links.boom: the key appears twice
            "pins": [         | "pins": [], "pins": [ | frame.pins: the key appears twice
            """)
    void numbersThatAreNoneAndKeysTwice(String right, String wrong, String fault) {
        List<String> faults =
                Drawn.faults(Drawn.exampleText().replaceFirst(Pattern.quote(right), Matcher.quoteReplacement(wrong)));
        assertTrue(faults.stream().anyMatch(line -> line.startsWith("x.json: " + fault)), faults::toString);
    }
}
