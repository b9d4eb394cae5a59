package org.wardon;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** The rooms of the house import only downwards, and never sideways but where named. */
class HouseTest {
    private static final JavaClasses HOUSE =
            new ClassFileImporter()
                    .withImportOption(new ImportOption.DoNotIncludeTests())
                    .importPackages("org.wardon");

    private static final Set<String> GROUND = Set.of("errors", "air", "produce");
    private static final Set<String> PARTS = Set.of("enclosure", "cooling", "lots");
    private static final Set<String> MODEL = Set.of("heat", "keeping", "sharing", "plan");

    /**
     * What those who talk to people may use: desk, shelf, the plan and the ground, never a part.
     */
    private static final Set<String> COUNTER =
            Set.of("errors", "air", "produce", "plan", "reference", "files", "advice");

    /** What each room may import besides itself; JSON, SQL and CSV are ruled below. */
    private static final Map<String, Set<String>> MAY_IMPORT =
            Map.ofEntries(
                    Map.entry("errors", Set.of()),
                    Map.entry("air", Set.of("errors")),
                    Map.entry("produce", Set.of("errors")),
                    Map.entry("enclosure", GROUND),
                    Map.entry("cooling", union(GROUND, Set.of("enclosure"))),
                    Map.entry("lots", GROUND),
                    Map.entry("heat", union(GROUND, PARTS)),
                    Map.entry("keeping", union(GROUND, Set.of("lots"))),
                    Map.entry("sharing", union(GROUND, Set.of("lots", "keeping"))),
                    Map.entry("plan", union(GROUND, PARTS)),
                    Map.entry("reference", union(GROUND, PARTS, MODEL)),
                    Map.entry("files", union(GROUND, PARTS, MODEL)),
                    Map.entry("advice", union(GROUND, PARTS, MODEL, Set.of("reference", "files"))),
                    Map.entry("logbook", union(GROUND, PARTS, MODEL, Set.of("reference", "files"))),
                    Map.entry("web", union(COUNTER, Set.of("logbook"))),
                    Map.entry("cli", union(COUNTER, Set.of("logbook", "web"))));

    private static final Set<String> PURE =
            Set.of(
                    "errors",
                    "air",
                    "produce",
                    "enclosure",
                    "cooling",
                    "lots",
                    "heat",
                    "keeping",
                    "sharing",
                    "plan");

    @SafeVarargs
    @SuppressWarnings("varargs")
    private static Set<String> union(Set<String>... sets) {
        return Stream.of(sets).flatMap(Set::stream).collect(Collectors.toSet());
    }

    @TestFactory
    Stream<DynamicTest> eachRoomImportsOnlyWhatIsNamed() {
        return MAY_IMPORT.entrySet().stream()
                .map(
                        room ->
                                DynamicTest.dynamicTest(
                                        room.getKey(),
                                        () -> {
                                            List<String> forbidden = new ArrayList<>();
                                            for (String other : MAY_IMPORT.keySet()) {
                                                if (!other.equals(room.getKey())
                                                        && !room.getValue().contains(other)) {
                                                    forbidden.add("org.wardon." + other + "..");
                                                }
                                            }
                                            noClasses()
                                                    .that()
                                                    .resideInAPackage(
                                                            "org.wardon." + room.getKey() + "..")
                                                    .should()
                                                    .dependOnClassesThat()
                                                    .resideInAnyPackage(
                                                            forbidden.toArray(String[]::new))
                                                    .allowEmptyShould(true)
                                                    .check(HOUSE);
                                        }));
    }

    @Test
    void noRoomIsUnknown() {
        for (JavaClass type : HOUSE) {
            String room = type.getPackageName().split("\\.")[2];
            assertTrue(MAY_IMPORT.containsKey(room), type.getName() + " lives in no known room");
        }
    }

    @Test
    void modelRoomsArePlainJava() {
        classes()
                .that(DescribedPredicate.describe("live in a pure room", HouseTest::pure))
                .should()
                .onlyDependOnClassesThat()
                .resideInAnyPackage(
                        "java.lang..",
                        "java.util..",
                        "java.time..",
                        "java.io",
                        "org.jspecify..",
                        "org.apache.commons.math3..",
                        "org.wardon..")
                .check(HOUSE);
        noClasses()
                .that(DescribedPredicate.describe("live in a pure room", HouseTest::pure))
                .should()
                .dependOnClassesThat()
                .haveFullyQualifiedName("java.time.Clock")
                .orShould()
                .callMethod(java.time.Instant.class, "now")
                .orShould()
                .callMethod(java.time.LocalDateTime.class, "now")
                .orShould()
                .callMethod(System.class, "currentTimeMillis")
                .orShould()
                .dependOnClassesThat()
                .haveFullyQualifiedName("java.io.File")
                .check(HOUSE);
    }

    @Test
    void solverUsesNothingButJavaAndKnowsNoRoom() {
        noClasses()
                .that()
                .resideInAPackage("org.wardon.heat.solver..")
                .should()
                .dependOnClassesThat(
                        DescribedPredicate.describe(
                                "are of another room or library",
                                type ->
                                        !type.getPackageName().startsWith("java.")
                                                && !type.getPackageName()
                                                        .startsWith("org.wardon.heat.solver")
                                                && !type.getPackageName().startsWith("org.jspecify")
                                                && !type.isPrimitive()
                                                && !type.isArray()))
                .allowEmptyShould(true)
                .check(HOUSE);
    }

    @Test
    void jsonStaysInFilesAndWeb() {
        noClasses()
                .that()
                .resideOutsideOfPackages("org.wardon.files..", "org.wardon.web..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("tools.jackson..", "com.fasterxml..", "com.networknt..")
                .check(HOUSE);
    }

    @Test
    void sqlStaysInReferenceAndLogbook() {
        noClasses()
                .that()
                .resideOutsideOfPackages("org.wardon.reference..", "org.wardon.logbook..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("java.sql..", "org.sqlite..", "javax.sql..")
                .check(HOUSE);
    }

    @Test
    void roomsHaveNoCycles() {
        slices().matching("org.wardon.(*)..").should().beFreeOfCycles().check(HOUSE);
    }

    @Test
    void everyPackageSaysWhatLivesThere() throws IOException {
        try (Stream<Path> files = Files.walk(Path.of("src/main/java"))) {
            List<Path> silent =
                    files.filter(path -> path.toString().endsWith(".java"))
                            .map(Path::getParent)
                            .distinct()
                            .filter(folder -> !Files.exists(folder.resolve("package-info.java")))
                            .toList();
            assertTrue(silent.isEmpty(), "no package-info.java in " + silent);
        }
    }

    private static boolean pure(JavaClass type) {
        String[] parts = type.getPackageName().split("\\.");
        return parts.length > 2 && parts[1].equals("wardon") && PURE.contains(parts[2]);
    }
}
