package org.notchwork;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.AccessTarget.CodeUnitAccessTarget;
import com.tngtech.archunit.core.domain.JavaAccess;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.nio.charset.Charset;
import java.time.Clock;
import java.time.format.FormatStyle;
import java.util.Arrays;
import java.util.Calendar;
import java.util.Date;
import java.util.Locale;
import java.util.Random;
import java.util.TimeZone;
import java.util.TreeSet;
import java.util.concurrent.ThreadLocalRandom;
import org.junit.jupiter.api.Test;

/**
 * What differs from machine to machine or from run to run enters by one door or not at all, each rule named in words.
 * Method references count as calls do.
 */
class MachineIndependenceTest {

    private static final JavaClasses HOUSE = new ClassFileImporter()
            .withImportOption(ImportOption.Predefined.DO_NOT_INCLUDE_TESTS)
            .importPackages("org.notchwork");

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
                .dependOnClassesThat()
                .haveNameMatching("java\\.util\\.(random\\..*|SplittableRandom)")
                .orShould()
                .accessTargetWhere(uses("java.lang.Math", "random"))
                .orShould()
                .accessTargetWhere(uses("java.lang.StrictMath", "random"))
                .orShould()
                .accessTargetWhere(uses("java.util.UUID", "randomUUID"))
                .orShould()
                .accessTargetWhere(uses("java.util.Collections", "shuffle"))
                .check(HOUSE);
    }

    /** A referee's own seed must be unknown to the author; nothing else may differ from run to run. */
    @Test
    void onlyTheCommandLineMayAskTheMachineForASecret() {
        noClasses()
                .that()
                .resideOutsideOfPackage("org.notchwork.cli..")
                .should()
                .dependOnClassesThat()
                .haveFullyQualifiedName("java.security.SecureRandom")
                .check(HOUSE);
    }

    @Test
    void noResultDependsOnWhereAnObjectLies() {
        noClasses()
                .should()
                .accessTargetWhere(uses("java.lang.System", "identityHashCode"))
                .orShould()
                .dependOnClassesThat()
                .haveFullyQualifiedName("java.util.IdentityHashMap")
                .check(HOUSE);
    }

    @Test
    void theClockIsReadOnTheCommandLineOnly() {
        noClasses()
                .that()
                .resideOutsideOfPackage("org.notchwork.cli..")
                .should()
                .accessTargetWhere(uses("java.lang.System", "currentTimeMillis", "nanoTime"))
                .orShould()
                .accessTargetWhere(uses("java.time..", "now", "systemDefault"))
                .orShould()
                .dependOnClassesThat()
                .areAssignableTo(Clock.class)
                .orShould()
                .dependOnClassesThat()
                .belongToAnyOf(Date.class, Calendar.class, TimeZone.class, FormatStyle.class)
                .check(HOUSE);
    }

    @Test
    void nothingDependsOnTheMachinesLocale() {
        noClasses()
                .should()
                .accessTargetWhere(uses("java.lang.String", "format", "formatted", "toLowerCase", "toUpperCase")
                        .and(without(Locale.class)))
                .orShould()
                .accessTargetWhere(
                        uses("java.io.PrintStream", "printf", "format").and(without(Locale.class)))
                .orShould()
                .accessTargetWhere(
                        uses("java.io.PrintWriter", "printf", "format").and(without(Locale.class)))
                .orShould()
                .accessTargetWhere(uses("java.util.Formatter", "<init>").and(without(Locale.class)))
                .orShould()
                .accessTargetWhere(uses("java.util.Locale", "getDefault"))
                .orShould()
                .accessTargetWhere(uses("java.time.format.DateTimeFormatter", "ofPattern", "ofLocalizedDate")
                        .and(without(Locale.class)))
                .orShould()
                .accessTargetWhere(uses("java.text..", "<init>", "getInstance", "getNumberInstance"))
                .check(HOUSE);
    }

    @Test
    void nothingDependsOnTheMachinesCharset() {
        noClasses()
                .should()
                .accessTargetWhere(uses("java.lang.String", "getBytes").and(without(Charset.class)))
                .orShould()
                .accessTargetWhere(makesTextOfBytes().and(without(Charset.class)))
                .orShould()
                .accessTargetWhere(uses("java.nio.charset.Charset", "defaultCharset"))
                .orShould()
                .accessTargetWhere(uses("java.io.FileReader", "<init>").and(without(Charset.class)))
                .orShould()
                .accessTargetWhere(uses("java.io.FileWriter", "<init>").and(without(Charset.class)))
                .orShould()
                .accessTargetWhere(uses("java.io.InputStreamReader", "<init>").and(without(Charset.class)))
                .orShould()
                .accessTargetWhere(uses("java.io.OutputStreamWriter", "<init>").and(without(Charset.class)))
                .orShould()
                .accessTargetWhere(uses("java.io.PrintStream", "<init>").and(without(Charset.class)))
                .orShould()
                .accessTargetWhere(uses("java.util.Scanner", "<init>").and(without(Charset.class)))
                .check(HOUSE);
    }

    @Test
    void thereIsNoMutableStaticState() {
        fields().that().areStatic().should().beFinal().check(HOUSE);
    }

    /** A static array can be written to by whoever sees it. */
    @Test
    void aStaticArrayIsSeenByItsOwnClassOnly() {
        fields().that()
                .areStatic()
                .and()
                .haveRawType(DescribedPredicate.describe("an array", type -> type.isArray()))
                .and()
                .doNotHaveModifier(JavaModifier.SYNTHETIC)
                .should()
                .bePrivate()
                .check(HOUSE);
    }

    /** Accesses to methods of a class, or of all classes of a package given as {@code name..}. */
    private static DescribedPredicate<JavaAccess<?>> uses(String owner, String... names) {
        TreeSet<String> wanted = new TreeSet<>(Arrays.asList(names));
        return DescribedPredicate.describe(
                owner + "." + String.join("/", names),
                access -> fits(access.getTargetOwner().getName(), owner)
                        && wanted.contains(access.getTarget().getName()));
    }

    private static boolean fits(String name, String owner) {
        return owner.endsWith("..") ? name.startsWith(owner.substring(0, owner.length() - 1)) : name.equals(owner);
    }

    private static DescribedPredicate<JavaAccess<?>> makesTextOfBytes() {
        return DescribedPredicate.describe(
                "new String(byte[])",
                access -> access.getTargetOwner().isEquivalentTo(String.class)
                        && access.getTarget() instanceof CodeUnitAccessTarget unit
                        && unit.getName().equals("<init>")
                        && unit.getRawParameterTypes().stream().anyMatch(t -> t.isEquivalentTo(byte[].class)));
    }

    private static DescribedPredicate<JavaAccess<?>> without(Class<?> parameter) {
        return DescribedPredicate.describe(
                "without a " + parameter.getSimpleName(),
                access -> access.getTarget() instanceof CodeUnitAccessTarget unit
                        && unit.getRawParameterTypes().stream().noneMatch(t -> t.isEquivalentTo(parameter)));
    }
}
