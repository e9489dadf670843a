package plateledger.demo;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.junit.jupiter.api.Assertions.assertThrows;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/**
 * The simulated rig shares nothing with what it proves: of ours it may use the fluid's properties only (and through their
 * signatures nothing else).
 */
@AnalyzeClasses(packages = "plateledger.demo", importOptions = ImportOption.DoNotIncludeTests.class)
final class DemoArchitectureTest {
    @ArchTest
    static final ArchRule noCycles =
            slices().matching("plateledger.demo.(*)..").should().beFreeOfCycles();

    @ArchTest
    static void usesOnlyTheFluid(JavaClasses imported) {
        only("plateledger.demo.physics..", "plateledger.fluid..").check(imported);
        only("plateledger.demo.sensor..", "plateledger.fluid..", "plateledger.demo.physics..")
                .check(imported);
        only("plateledger.demo.app..", "plateledger.fluid..", "plateledger.demo..")
                .check(imported);
    }

    @ArchTest
    static void theCheckCanFail(JavaClasses imported) {
        assertThrows(
                AssertionError.class,
                () -> only("plateledger.demo.app..", "plateledger.demo.sensor..")
                        .check(imported));
    }

    private static ArchRule only(String in, String... others) {
        String[] allowed = new String[others.length + 3];
        allowed[0] = "java..";
        allowed[1] = "org.jspecify..";
        allowed[2] = in;
        System.arraycopy(others, 0, allowed, 3, others.length);
        return classes()
                .that()
                .resideInAPackage(in)
                .should()
                .onlyDependOnClassesThat()
                .resideInAnyPackage(allowed);
    }
}
