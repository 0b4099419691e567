package org.notchwork;

import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.time.Clock;
import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.ZonedDateTime;
import java.util.List;
import java.util.Random;
import java.util.concurrent.ThreadLocalRandom;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.notchwork.engine.BlindEngine;
import org.notchwork.engine.SightedEngine;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Unitary;
import org.notchwork.seed.SeedTree;

/** The rules of the house, each named in words. */
class ArchitectureTest {

    private static final String ROOT = "org.notchwork.";

    /** The order in which data flows: a package may use those before it, never one after it. */
    private static final List<String> ORDER = List.of(
            "json",
            "exact",
            "bits",
            "seed",
            "problem",
            "engine",
            "strategy",
            "law",
            "catalogue",
            "study",
            "trial",
            "figure",
            "check",
            "claim",
            "bundle",
            "verify",
            "report",
            "run",
            "cli");

    private static final JavaClasses HOUSE = new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
            .importPackages("org.notchwork");

    @TestFactory
    Stream<DynamicTest> noPackageUsesOneThatComesAfterIt() {
        return ORDER.stream()
                .limit(ORDER.size() - 1L)
                .map(name -> DynamicTest.dynamicTest(name, () -> {
                    String[] later = ORDER.subList(ORDER.indexOf(name) + 1, ORDER.size()).stream()
                            .map(n -> ROOT + n + "..")
                            .toArray(String[]::new);
                    noClasses()
                            .that()
                            .resideInAPackage(ROOT + name + "..")
                            .should()
                            .dependOnClassesThat()
                            .resideInAnyPackage(later)
                            .check(HOUSE);
                }));
    }

    @Test
    void everyPackageHasItsPlaceInTheOrder() {
        noClasses()
                .should()
                .resideOutsideOfPackages(
                        ORDER.stream().map(n -> ROOT + n + "..").toArray(String[]::new))
                .check(HOUSE);
    }

    @Test
    void packagesHaveNoCycles() {
        slices().matching("org.notchwork.(*)..").should().beFreeOfCycles().check(HOUSE);
    }

    @Test
    void aBlindEngineCannotReachASecret() {
        DescribedPredicate<JavaClass> secrets = JavaClass.Predicates.assignableTo(Answer.class)
                .or(JavaClass.Predicates.type(Instance.class))
                .as("answers and instances");
        noClasses()
                .that()
                .resideInAPackage("org.notchwork.engine..")
                .and()
                .resideOutsideOfPackage("org.notchwork.engine.annihilator..")
                .and()
                .doNotBelongToAnyOf(SightedEngine.class)
                .should()
                .dependOnClassesThat(secrets)
                .check(HOUSE);
    }

    @Test
    void aBlindEngineIsNotSightedAtTheSameTime() {
        noClasses()
                .that()
                .areAssignableTo(BlindEngine.class)
                .should()
                .beAssignableTo(SightedEngine.class)
                .check(HOUSE);
    }

    @Test
    void aStrategyGetsNoInstanceNoUnitaryNoSeedAndNoEngine() {
        noClasses()
                .that()
                .resideInAPackage("org.notchwork.strategy..")
                .should()
                .dependOnClassesThat()
                .belongToAnyOf(Instance.class, Unitary.class, SeedTree.class, BlindEngine.class, SightedEngine.class)
                .check(HOUSE);
    }

    @Test
    void cross_checksShareNothingWithTheStrategiesThatTheyCheck() {
        noClasses()
                .that()
                .resideInAPackage("org.notchwork.check..")
                .should()
                .dependOnClassesThat(
                        resideInAnyPackage("org.notchwork.strategy.classical..", "org.notchwork.strategy.quantum.."))
                .check(HOUSE);
    }

    @Test
    void chanceComesFromTheSeedTreeAlone() {
        noClasses()
                .that()
                .resideOutsideOfPackage("org.notchwork.seed..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("org.apache.commons.rng..")
                .check(HOUSE);
        noClasses()
                .should()
                .dependOnClassesThat()
                .belongToAnyOf(Random.class, ThreadLocalRandom.class)
                .orShould()
                .callMethod(Math.class, "random")
                .check(HOUSE);
    }

    @Test
    void theClockIsReadOnTheCommandLineOnly() {
        noClasses()
                .that()
                .resideOutsideOfPackage("org.notchwork.cli..")
                .should()
                .callMethod(System.class, "currentTimeMillis")
                .orShould()
                .callMethod(System.class, "nanoTime")
                .orShould()
                .callMethod(Instant.class, "now")
                .orShould()
                .callMethod(LocalDate.class, "now")
                .orShould()
                .callMethod(LocalDateTime.class, "now")
                .orShould()
                .callMethod(ZonedDateTime.class, "now")
                .orShould()
                .dependOnClassesThat()
                .areAssignableTo(Clock.class)
                .check(HOUSE);
    }

    @Test
    void nothingDependsOnTheMachinesLocaleOrCharset() {
        noClasses()
                .should()
                .callMethod(String.class, "format", String.class, Object[].class)
                .orShould()
                .callMethod(String.class, "formatted", Object[].class)
                .orShould()
                .callMethod(String.class, "toLowerCase")
                .orShould()
                .callMethod(String.class, "toUpperCase")
                .orShould()
                .callMethod(String.class, "getBytes")
                .orShould()
                .callConstructor(String.class, byte[].class)
                .check(HOUSE);
    }

    @Test
    void thereIsNoMutableStaticState() {
        fields().that().areStatic().should().beFinal().check(HOUSE);
    }
}
