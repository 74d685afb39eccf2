package org.rodside.house;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.core.domain.Dependency;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaMethod;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Holds the map of the house that DEVELOPERS.md draws: who may use whom, and which library lives where. */
class HouseMapTest {

    private static final String HOME = "org.rodside.";

    private static final JavaClasses CLASSES = new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
            .importPackages("org.rodside");

    private static final Set<String> ALL = Set.of(
            "units",
            "table",
            "model",
            "kinematics",
            "statics",
            "hydraulics",
            "fatigue",
            "soil",
            "study",
            "io",
            "chart",
            "report",
            "cli");

    /** Package to the packages it may use. */
    private static final Map<String, Set<String>> ARROWS = Map.ofEntries(
            Map.entry("units", Set.of()),
            Map.entry("table", Set.of("units")),
            Map.entry("model", Set.of()),
            Map.entry("kinematics", Set.of("model")),
            Map.entry("statics", Set.of("kinematics", "model")),
            Map.entry("hydraulics", Set.of("model")),
            Map.entry("fatigue", Set.of()),
            Map.entry("soil", Set.of()),
            Map.entry(
                    "study",
                    Set.of("units", "table", "model", "kinematics", "statics", "hydraulics", "fatigue", "soil")),
            Map.entry("io", Set.of("model", "units", "table")),
            Map.entry("chart", Set.of("table", "units")),
            // Beyond chart, study and table: a drawing of a linkage is made from pins (model), places (kinematics) and
            // lengths (units) as the studies hand them out; copying them into a second set of types would only hide
            // that.
            Map.entry("report", Set.of("chart", "study", "table", "model", "kinematics", "units", "io", "statics")),
            Map.entry("cli", ALL));

    /** Library to the packages that may use it. */
    private static final Map<String, Set<String>> FENCES = Map.of(
            "org.ejml.", Set.of("statics", "kinematics"),
            "org.apache.commons.math3.", Set.of("study", "hydraulics"),
            "com.fasterxml.", Set.of("io"),
            "org.knowm.", Set.of("chart"),
            "picocli.", Set.of("cli"));

    /** They may one day run inside a web page, so they stay away from what is not there. */
    private static final Set<String> PURE = Set.of("units", "model", "kinematics", "statics", "hydraulics");

    private static final List<String> NOT_PURE = List.of(
            "java.lang.reflect.",
            "java.io.",
            "java.nio.",
            "java.net.",
            "java.util.concurrent.",
            "java.util.Formatter",
            "java.lang.Thread");

    @Test
    void packagesUseOnlyWhatTheMapAllows() {
        assertEquals(Set.of(), strayArrows(ARROWS));
    }

    @Test
    void theCheckOfArrowsSeesAnArrow() {
        Map<String, Set<String>> narrower = new HashMap<>(ARROWS);
        narrower.put("io", Set.of("units", "table"));
        assertTrue(strayArrows(narrower).stream().anyMatch(s -> s.startsWith("io -> model")));
    }

    @Test
    void everyPackageIsOnTheMap() {
        Set<String> unknown = new TreeSet<>();
        CLASSES.forEach(c -> unknown.add(room(c)));
        unknown.removeAll(ALL);
        assertEquals(Set.of(), unknown);
    }

    @Test
    void noPackagesUseEachOtherInACircle() {
        assertEquals(Map.of(), circles(arrows()));
    }

    @Test
    void theCheckOfCirclesSeesACircle() {
        Map<String, Set<String>> bent = arrows();
        bent.get("units").add("study");
        assertTrue(circles(bent).keySet().containsAll(Set.of("units", "study")), bent::toString);
    }

    @Test
    void librariesStayBehindTheirFences() {
        assertEquals(Set.of(), climbedFences(FENCES));
    }

    @Test
    void theCheckOfFencesSeesALibrary() {
        Map<String, Set<String>> narrower = new HashMap<>(FENCES);
        narrower.put("org.knowm.", Set.of());
        assertTrue(climbedFences(narrower).stream().anyMatch(s -> s.startsWith("chart")));
    }

    @Test
    void noLibraryShowsInAPublicSignature() {
        Set<String> shown = new TreeSet<>();
        for (JavaClass c : CLASSES) {
            if (!c.getModifiers().contains(JavaModifier.PUBLIC)) {
                continue;
            }
            c.getMethods().stream()
                    .filter(HouseMapTest::seenFromOutside)
                    .forEach(method -> involved(method)
                            .filter(type -> FENCES.keySet().stream().anyMatch(type::startsWith))
                            .forEach(type -> shown.add(method.getFullName() + " shows " + type)));
        }
        assertEquals(Set.of(), shown);
    }

    @Test
    void whatMayRunInAPageUsesNoFilesThreadsOrReflection() {
        Set<String> faults = new TreeSet<>();
        for (JavaClass c : CLASSES) {
            if (PURE.contains(room(c))) {
                faults.addAll(impure(c));
            }
        }
        assertEquals(Set.of(), faults);
    }

    @Test
    void theCheckOfPurePackagesSeesFilesAndFormats() {
        Set<String> faults = new TreeSet<>();
        CLASSES.stream().filter(c -> Set.of("io", "chart").contains(room(c))).forEach(c -> faults.addAll(impure(c)));
        assertTrue(faults.stream().anyMatch(s -> s.contains("java.nio.")), faults::toString);
        assertTrue(faults.stream().anyMatch(s -> s.contains("String.format")), faults::toString);
    }

    /** Every package to the others that it uses. */
    private static Map<String, Set<String>> arrows() {
        Map<String, Set<String>> arrows = new TreeMap<>();
        for (JavaClass c : CLASSES) {
            Set<String> used = arrows.computeIfAbsent(room(c), room -> new TreeSet<>());
            for (Dependency d : c.getDirectDependenciesFromSelf()) {
                JavaClass target = d.getTargetClass().getBaseComponentType();
                if (target.getName().startsWith(HOME) && !room(target).equals(room(c))) {
                    used.add(room(target));
                }
            }
        }
        return arrows;
    }

    /** What is left when packages that use none of those left are taken away, until none is: only circles and what leads to them. */
    private static Map<String, Set<String>> circles(Map<String, Set<String>> arrows) {
        Map<String, Set<String>> left = new TreeMap<>(arrows);
        while (left.values().removeIf(used -> used.stream().noneMatch(left::containsKey))) {
            // once more, for others may use none of those left now
        }
        return left;
    }

    private static Set<String> strayArrows(Map<String, Set<String>> arrows) {
        Set<String> stray = new TreeSet<>();
        for (JavaClass c : CLASSES) {
            for (Dependency d : c.getDirectDependenciesFromSelf()) {
                JavaClass target = d.getTargetClass().getBaseComponentType();
                if (target.getName().startsWith(HOME)
                        && !room(target).equals(room(c))
                        && !arrows.getOrDefault(room(c), ALL).contains(room(target))) {
                    stray.add(room(c) + " -> " + room(target) + ": " + c.getName() + " uses " + target.getName());
                }
            }
        }
        return stray;
    }

    private static Set<String> climbedFences(Map<String, Set<String>> fences) {
        Set<String> climbed = new TreeSet<>();
        for (JavaClass c : CLASSES) {
            for (Dependency d : c.getDirectDependenciesFromSelf()) {
                String target = d.getTargetClass().getBaseComponentType().getName();
                fences.forEach((library, rooms) -> {
                    if (target.startsWith(library) && !rooms.contains(room(c))) {
                        climbed.add(room(c) + ": " + c.getName() + " uses " + target);
                    }
                });
            }
        }
        return climbed;
    }

    private static boolean seenFromOutside(JavaMethod method) {
        return method.getModifiers().contains(JavaModifier.PUBLIC)
                || method.getModifiers().contains(JavaModifier.PROTECTED);
    }

    private static Stream<String> involved(JavaMethod method) {
        return Stream.concat(
                        method.getReturnType().getAllInvolvedRawTypes().stream(),
                        method.getParameterTypes().stream().flatMap(type -> type.getAllInvolvedRawTypes().stream()))
                .map(JavaClass::getName);
    }

    private static Set<String> impure(JavaClass c) {
        Set<String> faults = new TreeSet<>();
        for (Dependency d : c.getDirectDependenciesFromSelf()) {
            String target = d.getTargetClass().getBaseComponentType().getName();
            if (NOT_PURE.stream().anyMatch(target::startsWith)) {
                faults.add(c.getName() + " uses " + target);
            }
        }
        c.getMethodCallsFromSelf().stream()
                .filter(call -> call.getTargetOwner().getName().equals("java.lang.String")
                        && Set.of("format", "formatted").contains(call.getName()))
                .forEach(call -> faults.add(c.getName() + " calls String.format"));
        c.getMethodCallsFromSelf().stream()
                .filter(call -> call.getTargetOwner().getName().equals("java.lang.Class")
                        && Set.of("forName", "getDeclaredMethods", "getDeclaredFields", "getMethod")
                                .contains(call.getName()))
                .forEach(call -> faults.add(c.getName() + " calls Class." + call.getName()));
        return faults;
    }

    private static String room(JavaClass c) {
        String name = c.getPackageName();
        if (!name.startsWith(HOME)) {
            return name;
        }
        String rest = name.substring(HOME.length());
        int dot = rest.indexOf('.');
        return dot < 0 ? rest : rest.substring(0, dot);
    }
}
