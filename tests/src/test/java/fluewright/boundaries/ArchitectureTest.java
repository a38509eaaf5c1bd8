package fluewright.boundaries;

import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.lang.syntax.elements.ClassesShouldConjunction;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;

/** Who may know whom. Arrows run down only; each rule gives its reason. */
@AnalyzeClasses(packages = "fluewright", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {

    private static final String ENGINE = "fluewright.engine.";

    @ArchTest
    static final ArchRule MESSAGE = may("message").because("messages are said by all and so must know nobody");

    @ArchTest
    static final ArchRule DATA = may("data").because("reading a table needs no knowledge of what stands in it");

    @ArchTest
    static final ArchRule QUANTITY = may("quantity", "message", "data").because("units are the same whatever is calculated");

    @ArchTest
    static final ArchRule SPECIES = may("species", "message", "data").because("properties of substances are doubles in SI, without units");

    @ArchTest
    static final ArchRule CALCULATION = may("calculation", "message", "quantity")
            .because("the catalog knows no calculation by name: built-in ones and plugins register alike");

    @ArchTest
    static final ArchRule FUEL = may("fuel", "species", "calculation", "quantity", "message", "data")
            .because("a fuel is what it is made of, whatever is done with it");

    @ArchTest
    static final ArchRule COMBUSTION = may("combustion", "fuel", "species", "calculation", "quantity", "message", "data")
            .because("the flue gas does not depend on what is made of it");

    @ArchTest
    static final ArchRule DEW_POINT = mayAboveCombustion("dewpoint");

    @ArchTest
    static final ArchRule LOSS = mayAboveCombustion("loss");

    @ArchTest
    static final ArchRule EMISSION = mayAboveCombustion("emission");

    @ArchTest
    static final ArchRule ENGINE_KNOWS_NO_USER = noClasses().that().resideInAPackage("fluewright.engine..")
            .should().dependOnClassesThat().resideInAnyPackage("fluewright.fuels..", "fluewright.repl..")
            .because("the engine is used by the shell and by fuel files, not the other way round");

    /** Empty while the module is: it bites from the first class on. */
    @ArchTest
    static final ArchRule FUELS_KNOW_THE_ENGINE = noClasses().that().resideInAPackage("fluewright.fuels..")
            .should().dependOnClassesThat().resideInAPackage("fluewright.repl..").allowEmptyShould(true)
            .because("fuel files are a plugin of the engine and have to work without the shell");

    @ArchTest
    static final ArchRule ENGINE_IS_SILENT = noClasses().that().resideInAPackage("fluewright.engine..")
            .should().accessField(System.class, "out").orShould().accessField(System.class, "err")
            .orShould().dependOnClassesThat().resideInAnyPackage("java.util.logging..", "org.slf4j..", "org.apache.logging..")
            .because("what the engine has to say stands in results and exceptions, for callers to show");

    @ArchTest
    static final ArchRule ENGINE_OPENS_NO_FILES = noClasses().that().resideInAPackage("fluewright.engine..")
            .should().dependOnClassesThat(files()).because("the engine reads only its own data, through its classes");

    @ArchTest
    static final ArchRule NO_CYCLES = slices().matching("fluewright.(**)").should().beFreeOfCycles()
            .because("packages in a circle are one package that nobody can take apart");

    private static ArchRule mayAboveCombustion(String name) {
        return may(name, "combustion", "fuel", "species", "calculation", "quantity", "message", "data")
                .because("dew point, losses and emissions are plugins of one catalog and must stand without one another");
    }

    /** The classes of an engine package depend, among the project's, on these packages only. */
    private static ClassesShouldConjunction may(String name, String... below) {
        String[] allowed = Stream.concat(Stream.of(name), Stream.of(below)).map(n -> ENGINE + n + "..").toArray(String[]::new);
        DescribedPredicate<JavaClass> foreign = resideInAPackage("fluewright..").and(DescribedPredicate.not(resideInAnyPackage(allowed)));
        return noClasses().that().resideInAPackage(ENGINE + name + "..").should()
                .dependOnClassesThat(foreign.as("reside in a package of the project that is not " + name + " or below it"));
    }

    private static DescribedPredicate<JavaClass> files() {
        return DescribedPredicate.describe("open files", type -> Set.of("java.io.File", "java.io.FileInputStream", "java.io.FileReader",
                "java.io.FileOutputStream", "java.io.FileWriter", "java.io.RandomAccessFile", "java.nio.file.Files", "java.nio.file.Path",
                "java.nio.file.Paths").contains(type.getName()));
    }

    /** A rule over nothing holds always: the scan must have seen the engine, and each of its packages must have a rule. */
    @ArchTest
    static void enough_is_scanned_and_every_package_has_a_rule(JavaClasses scanned) {
        Set<String> packages = new TreeSet<>();
        scanned.stream().map(JavaClass::getPackageName).filter(name -> name.startsWith(ENGINE)).forEach(packages::add);
        Set<String> ruled = new TreeSet<>(Set.of("message", "data", "quantity", "species", "calculation", "fuel", "combustion",
                "dewpoint", "loss", "emission"));
        assertEquals(ruled.stream().map(name -> ENGINE + name).toList(), packages.stream().toList());
        assertTrue(scanned.size() > 80, () -> "only " + scanned.size() + " classes");
    }

    /** The same rules refuse an arrow that runs up: a rule that allows everything would not be noticed otherwise. */
    @ArchTest
    static void a_rule_can_fail(JavaClasses scanned) {
        ArchRule upside = may("combustion", "message").because("nobody would want this rule");
        assertTrue(upside.evaluate(scanned).hasViolation());
    }
}
