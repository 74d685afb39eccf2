package org.rodside.house;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.sun.source.tree.ClassTree;
import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.LineMap;
import com.sun.source.tree.MethodTree;
import com.sun.source.util.JavacTask;
import com.sun.source.util.SourcePositions;
import com.sun.source.util.TreeScanner;
import com.sun.source.util.Trees;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import javax.lang.model.element.Modifier;
import javax.tools.JavaCompiler;
import javax.tools.StandardJavaFileManager;
import javax.tools.ToolProvider;
import org.junit.jupiter.api.Test;

/** Walks the sources and holds the size budget: small files, small methods, few parameters. */
class SizeBudgetTest {

    private static final int FILE_LINES = 350;
    private static final int METHOD_LINES = 30;

    /** Longest method there may be at all, tests and methods with a reason included. */
    private static final int METHOD_LINES_HARD = 60;

    private static final int PARAMETERS = 6;

    /** Methods of main code over the budget, {@code Class.method}, each with the reason. Shorten rather than add. */
    private static final Map<String, String> LONGER_WITH_REASON = Map.of(
            "LinkageChecks.eyes", "one rule after the other on the same cylinder, read top to bottom",
            "LinkageChecks.sizes", "one rule after the other on the same cylinder, read top to bottom",
            "NumberReader.at", "the fast path of reading a number: one pass over its bytes",
            "StageDigLine.ground", "one loop over flat arrays that the compiler can turn into vector instructions");

    private static final List<Path> MAIN =
            List.of(Path.of("../sim-core/src/main/java"), Path.of("../sim-cli/src/main/java"));

    private static final List<Path> TEST =
            List.of(Path.of("../sim-core/src/test/java"), Path.of("../sim-cli/src/test/java"));

    @Test
    void filesMethodsAndParameterListsAreSmall() throws IOException {
        Set<String> over = new TreeSet<>(measure(sources(MAIN), METHOD_LINES));
        over.addAll(measure(sources(TEST), METHOD_LINES_HARD));
        assertEquals(Set.of(), over, () -> String.join("\n", over));
    }

    @Test
    void aMethodOrFileOverTheBudgetIsSeen() throws IOException {
        Path dir = Files.createTempDirectory("budget");
        Path file = dir.resolve("Long.java");
        Files.writeString(
                file,
                "public class Long { public void f(int a, int b, int c, int d, int e, int f, int g) {"
                        + "\n;".repeat(FILE_LINES) + "\n} }\n");
        Set<String> over = measure(List.of(file), METHOD_LINES);
        Files.delete(file);
        Files.delete(dir);
        assertEquals(3, over.size(), over::toString);
        assertTrue(over.stream().anyMatch(s -> s.contains("Long.f has 352 lines")), over::toString);
    }

    private static List<Path> sources(List<Path> roots) throws IOException {
        Stream<Path> all = Stream.empty();
        for (Path root : roots) {
            if (Files.isDirectory(root)) {
                try (Stream<Path> files = Files.walk(root)) {
                    all = Stream.concat(all, files.filter(f -> f.toString().endsWith(".java")).toList().stream());
                }
            }
        }
        return all.toList();
    }

    private static Set<String> measure(List<Path> files, int methodLines) throws IOException {
        assertTrue(!files.isEmpty(), "no sources found; the test must run in its module's folder");
        JavaCompiler compiler = ToolProvider.getSystemJavaCompiler();
        Set<String> over = new TreeSet<>();
        try (StandardJavaFileManager manager = compiler.getStandardFileManager(null, null, StandardCharsets.UTF_8)) {
            JavacTask task = (JavacTask) compiler.getTask(
                    null, manager, d -> {}, List.of("-proc:none"), null, manager.getJavaFileObjectsFromPaths(files));
            SourcePositions positions = Trees.instance(task).getSourcePositions();
            for (CompilationUnitTree unit : task.parse()) {
                Path name = Path.of(unit.getSourceFile().toUri()).getFileName();
                long lines = unit.getSourceFile()
                        .getCharContent(true)
                        .toString()
                        .lines()
                        .count();
                if (lines > FILE_LINES) {
                    over.add(name + " has " + lines + " lines, more than " + FILE_LINES);
                }
                unit.accept(new Measure(unit, positions, methodLines, over), "");
            }
        }
        return over;
    }

    /** Visits classes and methods; the second argument is the name of the class around. */
    private static final class Measure extends TreeScanner<Void, String> {

        private final CompilationUnitTree unit;
        private final SourcePositions positions;
        private final int methodLines;
        private final Set<String> over;

        Measure(CompilationUnitTree unit, SourcePositions positions, int methodLines, Set<String> over) {
            this.unit = unit;
            this.positions = positions;
            this.methodLines = methodLines;
            this.over = over;
        }

        @Override
        public Void visitClass(ClassTree type, String around) {
            String name = type.getSimpleName().toString();
            return super.visitClass(type, name.isEmpty() ? around : name);
        }

        @Override
        public Void visitMethod(MethodTree method, String type) {
            String name = type + "." + method.getName();
            boolean open = method.getModifiers().getFlags().contains(Modifier.PUBLIC);
            if (open && method.getReturnType() != null && method.getParameters().size() > PARAMETERS) {
                over.add(name + " has " + method.getParameters().size() + " parameters, more than " + PARAMETERS);
            }
            if (method.getBody() != null) {
                LineMap map = unit.getLineMap();
                long first = map.getLineNumber(positions.getStartPosition(unit, method.getBody()));
                long last = map.getLineNumber(positions.getEndPosition(unit, method.getBody()));
                long most = LONGER_WITH_REASON.containsKey(name) ? METHOD_LINES_HARD : methodLines;
                if (last - first + 1 > most) {
                    over.add(name + " has " + (last - first + 1) + " lines, more than " + most);
                }
            }
            return super.visitMethod(method, type);
        }
    }
}
