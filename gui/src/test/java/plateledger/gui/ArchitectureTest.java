package plateledger.gui;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static java.util.Map.entry;
import static org.junit.jupiter.api.Assertions.assertThrows;

import com.tngtech.archunit.core.domain.JavaCall;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.properties.HasOwner;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jfree.chart.axis.Axis;

/** The arrows inside the desktop program. The last two rules guard the table itself. */
@AnalyzeClasses(packages = "plateledger.gui", importOptions = ImportOption.DoNotIncludeTests.class)
final class ArchitectureTest {
    /** Packages of the reduction that results are made of. */
    private static final List<String> RESULTS = List.of(
            "plateledger.reduce..",
            "plateledger.report..",
            "plateledger.finding..",
            "plateledger.quantity..",
            "plateledger.campaign..",
            "plateledger.rig..",
            "plateledger.fit..",
            "plateledger.steady..",
            "plateledger.log..",
            "plateledger.uncertainty..");

    private static final String JAVA = "java..";
    private static final String SWING = "javax.swing..";

    private static final Map<String, Set<String>> MAY_USE = Map.ofEntries(
            entry("model", Set.of()),
            entry(
                    "chart",
                    Set.of(
                            "plateledger.gui.model..",
                            SWING,
                            "javax.imageio..",
                            "javax.xml..",
                            "org.w3c.dom..",
                            "org.jfree..",
                            "org.apache.batik..")),
            entry(
                    "view",
                    Set.of(
                            "plateledger.gui.model..",
                            "plateledger.gui.chart..",
                            SWING,
                            "javax.accessibility..",
                            "net.miginfocom..")),
            entry("task", Set.of("plateledger.gui.model..", SWING)),
            entry(
                    "app",
                    Set.of(
                            "plateledger.gui.model..",
                            "plateledger.gui.chart..",
                            "plateledger.gui.view..",
                            "plateledger.gui.task..",
                            "plateledger.cli..",
                            SWING,
                            "com.formdev.flatlaf..")));

    @ArchTest
    static void eachPackageUsesOnlyWhatItMay(JavaClasses imported) {
        MAY_USE.forEach((from, to) -> check(imported, from, to));
    }

    @ArchTest
    static final ArchRule modelKnowsNoScreen = noClasses()
            .that()
            .resideInAPackage("plateledger.gui.model..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("java.awt..", "javax.swing..");

    @ArchTest
    static final ArchRule swingIsComposedNotExtended = noClasses().should().beAssignableTo(java.awt.Component.class);

    @ArchTest
    static final ArchRule onlyChartsUseTheChartLibrary = noClasses()
            .that()
            .resideOutsideOfPackage("plateledger.gui.chart..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("org.jfree..");

    /** Axes come from the factory of the report alone; nothing here makes one. */
    @ArchTest
    static final ArchRule noAxisIsMadeHere = noClasses()
            .should()
            .callConstructorWhere(JavaCall.Predicates.target(
                    HasOwner.Predicates.With.owner(JavaClass.Predicates.assignableTo(Axis.class))));

    @ArchTest
    static final ArchRule everyPackageIsInTheTable = classes()
            .should()
            .resideInAnyPackage(MAY_USE.keySet().stream()
                    .map(name -> "plateledger.gui." + name + "..")
                    .toArray(String[]::new));

    @ArchTest
    static void theCheckCanFail(JavaClasses imported) {
        assertThrows(AssertionError.class, () -> check(imported, "view", Set.of()));
    }

    private static void check(JavaClasses imported, String from, Set<String> to) {
        List<String> allowed = new ArrayList<>(RESULTS);
        allowed.add(JAVA);
        allowed.add("org.jspecify..");
        allowed.add("plateledger.gui." + from + "..");
        allowed.addAll(to);
        classes()
                .that()
                .resideInAPackage("plateledger.gui." + from + "..")
                .should()
                .onlyDependOnClassesThat()
                .resideInAnyPackage(allowed.toArray(String[]::new))
                .check(imported);
    }
}
