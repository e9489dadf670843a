package plateledger;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static java.util.Map.entry;
import static org.junit.jupiter.api.Assertions.assertThrows;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** The arrows between packages, as DEVELOPERS.md draws them. One table; the last two rules guard the table itself. */
@AnalyzeClasses(packages = "plateledger", importOptions = ImportOption.DoNotIncludeTests.class)
final class ArchitectureTest {
    private static final Set<String> UP_TO_SAFETY = Set.of(
            "quantity",
            "finding",
            "numeric",
            "expression",
            "keyfile",
            "uncertainty",
            "fluid",
            "log",
            "rig",
            "campaign",
            "sensor",
            "steady",
            "theory",
            "ledger",
            "fit",
            "safety");

    private static final Map<String, Set<String>> MAY_USE = Map.ofEntries(
            entry("quantity", Set.of()),
            entry("finding", Set.of()),
            entry("fluid", Set.of("quantity", "numeric", "finding")),
            entry("numeric", Set.of()),
            entry("uncertainty", Set.of("quantity", "numeric", "finding")),
            entry("log", Set.of("quantity", "numeric", "finding")),
            entry("keyfile", Set.of("quantity", "finding")),
            entry("rig", Set.of("keyfile", "fluid", "uncertainty", "quantity", "finding")),
            entry(
                    "campaign",
                    Set.of("keyfile", "log", "rig", "fluid", "uncertainty", "expression", "quantity", "finding")),
            entry("theory", Set.of("expression", "fluid", "numeric", "quantity", "finding")),
            entry("sensor", Set.of("log", "rig", "fluid", "uncertainty", "numeric", "quantity", "finding")),
            entry("ledger", Set.of("rig", "fluid", "theory", "uncertainty", "numeric", "quantity", "finding")),
            entry(
                    "safety",
                    Set.of(
                            "campaign",
                            "rig",
                            "log",
                            "sensor",
                            "steady",
                            "fluid",
                            "theory",
                            "ledger",
                            "uncertainty",
                            "numeric",
                            "quantity",
                            "finding")),
            entry("steady", Set.of("log", "sensor", "rig", "uncertainty", "numeric", "quantity", "finding")),
            entry("fit", Set.of("expression", "uncertainty", "numeric", "quantity", "finding")),
            entry(
                    "reduce",
                    Set.of(
                            "quantity",
                            "finding",
                            "numeric",
                            "keyfile",
                            "uncertainty",
                            "fluid",
                            "log",
                            "rig",
                            "campaign",
                            "sensor",
                            "steady",
                            "theory",
                            "ledger",
                            "fit",
                            "safety")),
            entry("audit", with(UP_TO_SAFETY, "reduce")),
            entry("report", with(UP_TO_SAFETY, "reduce", "audit")),
            entry("cli", with(UP_TO_SAFETY, "reduce", "audit", "report")));

    @ArchTest
    static final ArchRule noCycles =
            slices().matching("plateledger.(*)..").should().beFreeOfCycles();

    @ArchTest
    static void eachPackageUsesOnlyWhatItMay(JavaClasses imported) {
        MAY_USE.forEach((from, to) -> check(imported, from, to));
    }

    @ArchTest
    static final ArchRule everyPackageIsInTheTable =
            classes().should().resideInAnyPackage(packagesOf(MAY_USE.keySet()));

    @ArchTest
    static void theCheckCanFail(JavaClasses imported) {
        assertThrows(AssertionError.class, () -> check(imported, "reduce", Set.of()));
    }

    private static void check(JavaClasses imported, String from, Set<String> to) {
        List<String> allowed = new ArrayList<>(List.of(
                "java..",
                "javax..",
                "org.jspecify..",
                "org.apache..",
                "de.siegmar..",
                "ch.randelshofer..",
                "org.jfree..",
                "freemarker..",
                "com.fasterxml..",
                "org.tomlj..",
                "picocli..",
                "org.w3c.."));
        allowed.add("plateledger." + from + "..");
        to.forEach(name -> allowed.add("plateledger." + name + ".."));
        classes()
                .that()
                .resideInAPackage("plateledger." + from + "..")
                .should()
                .onlyDependOnClassesThat()
                .resideInAnyPackage(allowed.toArray(String[]::new))
                .check(imported);
    }

    private static Set<String> with(Set<String> names, String... more) {
        Set<String> all = new HashSet<>(names);
        all.addAll(List.of(more));
        return all;
    }

    private static String[] packagesOf(Set<String> names) {
        return names.stream().map(name -> "plateledger." + name + "..").toArray(String[]::new);
    }
}
