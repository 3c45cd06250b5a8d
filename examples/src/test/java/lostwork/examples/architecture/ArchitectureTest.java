package lostwork.examples.architecture;

import static com.tngtech.archunit.base.DescribedPredicate.alwaysTrue;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideOutsideOfPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideOutsideOfPackages;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noFields;
import static com.tngtech.archunit.library.GeneralCodingRules.ACCESS_STANDARD_STREAMS;
import static com.tngtech.archunit.library.GeneralCodingRules.USE_JAVA_UTIL_LOGGING;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaCodeUnit;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.lang.ArchCondition;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.lang.ConditionEvents;
import com.tngtech.archunit.lang.SimpleConditionEvent;
import java.io.File;
import java.lang.module.ModuleDescriptor;
import java.lang.module.ModuleFinder;
import java.lang.module.ModuleReference;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import lostwork.fluid.MixturePoint;
import lostwork.fluid.StatePoint;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * What may depend on what, and what every public type is, checked on the compiled classes of all modules.
 *
 * <p>The modules see each other one way already, since Maven compiles them so; the rules here hold inside them.
 */
class ArchitectureTest {
    /** The packages that no module exports, each for use by the package above it only. */
    private static final Set<String> INTERNAL = Set.of("lostwork.plant.kernel");

    private static final JavaClasses ALL = new ClassFileImporter()
            .withImportOption(new ImportOption.DoNotIncludeTests())
            .importPackages("lostwork");

    private static final JavaClasses LIBRARY =
            ALL.that(resideOutsideOfPackages("lostwork.examples..", "lostwork.testing.."));

    /** Package, and the packages of this library that it may use besides itself and java, separated by blanks. */
    @ParameterizedTest
    @CsvSource({
        "lostwork.quantity,",
        "lostwork.solve,",
        "lostwork.exergy, lostwork.quantity lostwork.solve",
        "lostwork.fluid, lostwork.quantity lostwork.solve lostwork.exergy",
        "lostwork.fluid.gas, lostwork.quantity lostwork.solve lostwork.exergy lostwork.fluid",
        "lostwork.fluid.water, lostwork.quantity lostwork.solve lostwork.exergy lostwork.fluid",
        "lostwork.report, lostwork.quantity",
        "lostwork.plant.kernel, lostwork.quantity lostwork.solve lostwork.fluid",
        "lostwork.plant, lostwork.quantity lostwork.solve lostwork.exergy lostwork.fluid lostwork.plant.kernel"
                + " lostwork.report",
        "lostwork.component, lostwork.quantity lostwork.solve lostwork.exergy lostwork.fluid lostwork.plant",
        "lostwork.process, lostwork.quantity lostwork.solve lostwork.exergy lostwork.fluid lostwork.report",
        "lostwork.ledger, lostwork.quantity lostwork.exergy lostwork.fluid lostwork.plant lostwork.report",
    })
    void packagesPointOneWay(String name, String allowed) {
        final String[] used = allowed == null ? new String[0] : allowed.split(" ");
        classes()
                .that()
                .resideInAPackage(name)
                .should()
                .onlyDependOnClassesThat(
                        resideInAPackage(name).or(resideInAnyPackage(used)).or(resideOutsideOfPackage("lostwork..")))
                .because("the arrows between packages point one way; see the table in README.md")
                .allowEmptyShould(true)
                .check(LIBRARY);
    }

    @Test
    void everyPackageHasItsRule() throws NoSuchMethodException {
        final Set<String> ruled = Arrays.stream(ArchitectureTest.class
                        .getDeclaredMethod("packagesPointOneWay", String.class, String.class)
                        .getAnnotation(CsvSource.class)
                        .value())
                .map(line -> line.substring(0, line.indexOf(',')))
                .collect(Collectors.toCollection(TreeSet::new));
        final Set<String> unruled = packages(LIBRARY);
        unruled.removeAll(ruled);
        assertEquals(Set.of(), unruled);
    }

    @Test
    void packagesHaveNoCycles() {
        slices().matching("lostwork.(**)").should().beFreeOfCycles().check(ALL);
    }

    @Test
    void theUnitLibraryStaysBehindTheQuantities() {
        noClasses()
                .that()
                .resideOutsideOfPackage("lostwork.quantity")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("javax.measure..", "tech.units..")
                .check(LIBRARY);
    }

    @Test
    void noSignatureShowsTheMathematicsLibrary() {
        classes()
                .that()
                .arePublic()
                .should(showNoType(
                        "of Commons Math", type -> type.getPackageName().startsWith("org.apache.")))
                .check(LIBRARY);
    }

    @Test
    void whatIsPublicIsClosedOrMadeToBeExtended() {
        classes()
                .that()
                .arePublic()
                .should(satisfy(
                        "be final, abstract, sealed, an interface, an enum or a record",
                        type -> type.isInterface()
                                || type.isEnum()
                                || type.isRecord()
                                || type.getModifiers().contains(JavaModifier.FINAL)
                                || type.getModifiers().contains(JavaModifier.ABSTRACT)
                                || type.reflect().isSealed()))
                .check(LIBRARY);
    }

    @Test
    void exceptionsAreUncheckedAndNamedSo() {
        classes()
                .that()
                .areAssignableTo(Throwable.class)
                .and()
                .resideOutsideOfPackages(INTERNAL.toArray(String[]::new))
                .should()
                .beAssignableTo(RuntimeException.class)
                .andShould()
                .haveSimpleNameEndingWith("Exception")
                .check(LIBRARY);
    }

    @Test
    void nothingGlobalCanChange() {
        noFields().that().areStatic().should().notBeFinal().check(ALL);
        fields().that()
                .arePublic()
                .and()
                .areNotDeclaredIn(StatePoint.class)
                .and()
                .areNotDeclaredIn(MixturePoint.class)
                .should()
                .beFinal()
                .because("only what a fluid model writes its results into may change")
                .check(LIBRARY);
    }

    @Test
    void theLibraryNeitherPrintsNorLogsNorEnds() {
        noClasses().should(ACCESS_STANDARD_STREAMS).check(LIBRARY);
        noClasses().should(USE_JAVA_UTIL_LOGGING).check(ALL);
        noClasses().should().callMethod(System.class, "exit", int.class).check(LIBRARY);
    }

    @Test
    void internalsAreUsedFromTheirOwnPackageOnly() {
        for (final String internal : INTERNAL) {
            noClasses()
                    .that()
                    .resideOutsideOfPackages(internal, internal.substring(0, internal.lastIndexOf('.')))
                    .should()
                    .dependOnClassesThat()
                    .resideInAPackage(internal)
                    .check(ALL);
        }
    }

    @Test
    void modulesExportTheirPackagesAndHideInternals() {
        final Set<String> exported = modules()
                .flatMap(module -> module.exports().stream())
                .peek(export -> assertFalse(export.isQualified(), export.toString()))
                .map(ModuleDescriptor.Exports::source)
                .collect(Collectors.toCollection(TreeSet::new));
        final Set<String> expected = packages(LIBRARY);
        expected.removeAll(INTERNAL);
        assertEquals(expected, exported);
    }

    @Test
    void moduleNamesStay() {
        assertEquals(
                Set.of("lostwork.core", "lostwork.fluids", "lostwork.cycles"),
                modules().map(ModuleDescriptor::name).collect(Collectors.toSet()));
    }

    /** The rules bite: each of the two own ones fails on a class made for it. */
    @Test
    void theRulesBite() {
        final JavaClasses bad = new ClassFileImporter().importClasses(Shows.class);
        final ArchRule shows = classes().should(showNoType("of java.io", type -> type.isAssignableTo(File.class)));
        assertThrows(AssertionError.class, () -> shows.check(bad));
        final ArchRule closed =
                classes().should(satisfy("be final", type -> type.getModifiers().contains(JavaModifier.FINAL)));
        assertThrows(AssertionError.class, () -> closed.check(bad));
        assertFalse(LIBRARY.isEmpty());
        assertFalse(ALL.that(alwaysTrue()).isEmpty());
    }

    /** A class that breaks two rules. */
    static class Shows {
        public File[] files() {
            return new File[0];
        }
    }

    private static Set<String> packages(JavaClasses classes) {
        return classes.stream()
                .filter(type -> !type.getSimpleName().equals("package-info"))
                .map(JavaClass::getPackageName)
                .collect(Collectors.toCollection(TreeSet::new));
    }

    /** {@return the descriptors of the library's modules among the entries of the class path} */
    private static Stream<ModuleDescriptor> modules() {
        return ModuleFinder.of(Arrays.stream(
                                System.getProperty("java.class.path").split(File.pathSeparator))
                        .filter(entry -> entry.contains("core") || entry.contains("fluids") || entry.contains("cycles"))
                        .map(Path::of)
                        .toArray(Path[]::new))
                .findAll()
                .stream()
                .map(ModuleReference::descriptor)
                .filter(module -> module.name().startsWith("lostwork.") && !module.isAutomatic());
    }

    private static ArchCondition<JavaClass> satisfy(String description, Function<JavaClass, Boolean> property) {
        return new ArchCondition<>(description) {
            @Override
            public void check(JavaClass type, ConditionEvents events) {
                events.add(new SimpleConditionEvent(
                        type, property.apply(type), type.getName() + " should " + description));
            }
        };
    }

    private static ArchCondition<JavaClass> showNoType(String description, Function<JavaClass, Boolean> hidden) {
        return new ArchCondition<>("show no type " + description + " in a public or protected signature") {
            @Override
            public void check(JavaClass type, ConditionEvents events) {
                type.getCodeUnits().stream()
                        .filter(ArchitectureTest::isVisible)
                        .forEach(unit -> Stream.of(
                                        Stream.of(unit.getReturnType()),
                                        unit.getParameterTypes().stream(),
                                        unit.getExceptionTypes().stream())
                                .flatMap(types -> types)
                                .flatMap(shown -> shown.getAllInvolvedRawTypes().stream())
                                .filter(shown -> hidden.apply(shown.getBaseComponentType()))
                                .forEach(shown -> events.add(SimpleConditionEvent.violated(
                                        unit, unit.getFullName() + " shows " + shown.getName()))));
                type.getFields().stream()
                        .filter(field -> !field.getModifiers().contains(JavaModifier.PRIVATE))
                        .filter(field -> hidden.apply(field.getRawType().getBaseComponentType()))
                        .forEach(field -> events.add(SimpleConditionEvent.violated(field, field.getFullName())));
                Stream.concat(type.getRawInterfaces().stream(), type.getRawSuperclass().stream())
                        .filter(hidden::apply)
                        .forEach(above -> events.add(
                                SimpleConditionEvent.violated(type, type.getName() + " extends " + above.getName())));
            }
        };
    }

    private static boolean isVisible(JavaCodeUnit unit) {
        return unit.getModifiers().contains(JavaModifier.PUBLIC)
                || unit.getModifiers().contains(JavaModifier.PROTECTED);
    }
}
