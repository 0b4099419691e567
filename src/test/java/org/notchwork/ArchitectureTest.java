package org.notchwork;

import static com.tngtech.archunit.base.DescribedPredicate.not;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideOutsideOfPackages;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.type;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaAccess;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.notchwork.engine.BlindEngine;
import org.notchwork.engine.Circuit;
import org.notchwork.engine.Noise;
import org.notchwork.engine.SightedEngine;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Answer;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Network;
import org.notchwork.problem.NetworkFunction;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Part;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.problem.Unitary;
import org.notchwork.seed.SeedTree;

/** The rules of the house about who may use what, each named in words. */
class ArchitectureTest {

    private static final String ROOT = "org.notchwork.";

    /** The order in which data flows: a package may use those before it, never one after it. */
    private static final List<String> ORDER = List.of(
            "json",
            "exact",
            "bits",
            "seed",
            "problem",
            "certificate",
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
        slices().matching("org.notchwork.(**)").should().beFreeOfCycles().check(HOUSE);
    }

    @Test
    void aLawUsesExactNumbersAndNothingElseOfTheHouse() {
        noClasses()
                .that()
                .resideInAPackage("org.notchwork.law..")
                .should()
                .dependOnClassesThat(resideInAPackage("org.notchwork..")
                        .and(resideOutsideOfPackages("org.notchwork.law..", "org.notchwork.exact..")))
                .check(HOUSE);
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

    /** What a blind engine or a strategy is handed has no way on to the secret either. */
    @Test
    void whatIsHandedOutLeadsToNoSecret() {
        DescribedPredicate<JavaClass> secrets = JavaClass.Predicates.assignableTo(Answer.class)
                .or(JavaClass.Predicates.type(Instance.class))
                .or(JavaClass.Predicates.type(Problem.class))
                .as("answers, instances and problems");
        noClasses()
                .that()
                .belongToAnyOf(
                        Unitary.class,
                        Oracle.class,
                        Meter.class,
                        Part.class,
                        Network.class,
                        NetworkFunction.class,
                        BitFunction.class,
                        Promise.class)
                .should()
                .dependOnClassesThat(secrets)
                .check(HOUSE);
    }

    @Test
    void noEngineDrawsAnInstanceOrListsWhatMayBeHidden() {
        noClasses()
                .that()
                .resideInAPackage("org.notchwork.engine..")
                .should()
                .accessTargetWhere(method(Problem.class, "draw", "drawHiding", "answers", "control"))
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
    void aStrategyGetsNoInstanceNoUnitaryNoMeterNoBareFunctionAndNoSeed() {
        noClasses()
                .that()
                .resideInAPackage("org.notchwork.strategy..")
                .should()
                .dependOnClassesThat()
                .belongToAnyOf(Instance.class, Unitary.class, Meter.class, BitFunction.class, SeedTree.class)
                .check(HOUSE);
    }

    @Test
    void aStrategyKnowsOfEnginesOnlyTheOpenedSimulationItsCircuitAndItsNoise() {
        noClasses()
                .that()
                .resideInAPackage("org.notchwork.strategy..")
                .should()
                .dependOnClassesThat(resideInAPackage("org.notchwork.engine..")
                        .and(not(type(Simulation.class)))
                        .and(not(type(Circuit.class)))
                        .and(not(type(Noise.class))))
                .check(HOUSE);
    }

    /** The listed outcomes are for cross-checks: they are not counted, and they give the answer away. */
    @Test
    void aStrategyNeverReadsAnUncountedDistributionOrDrawsInstances() {
        noClasses()
                .that()
                .resideInAPackage("org.notchwork.strategy..")
                .should()
                .accessTargetWhere(method(Simulation.class, "outcomes", "phaseOutcomes", "amplifiedOutcomes"))
                .orShould()
                .accessTargetWhere(method(Problem.class, "draw", "drawHiding", "answers", "control"))
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

    /** Calls and method references alike. */
    private static DescribedPredicate<JavaAccess<?>> method(Class<?> owner, String... names) {
        return DescribedPredicate.describe(
                owner.getSimpleName() + "." + String.join("/", names),
                access -> access.getTargetOwner().isAssignableTo(owner)
                        && List.of(names).contains(access.getTarget().getName()));
    }
}
