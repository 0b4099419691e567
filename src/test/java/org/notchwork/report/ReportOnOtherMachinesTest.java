package org.notchwork.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeFalse;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.notchwork.ChildJvm;

/** The report made by other Java processes: another version, another language, no screen, no fonts. */
class ReportOnOtherMachinesTest {

    /** A display that nothing answers; X servers are numbered from 0 and hardly ever reach this number. */
    private static final Map<String, String> DEAD_DISPLAY = Map.of("DISPLAY", ":65123");

    @TempDir
    private Path folder;

    @Test
    void aDisplayThatDoesNotAnswerIsNotAskedFor() throws Exception {
        assertEquals(
                PrintedDigest.digest() + System.lineSeparator(),
                run(ChildJvm.running().java(), DEAD_DISPLAY));
    }

    @Test
    void languageAndTimeZoneDoNotChangeTheReport() throws Exception {
        assertEquals(
                PrintedDigest.digest() + System.lineSeparator(),
                run(
                        ChildJvm.running().java(),
                        Map.of(),
                        "-Duser.language=tr",
                        "-Duser.country=TR",
                        "-Duser.timezone=Pacific/Kiritimati",
                        "-Dfile.encoding=ISO-8859-1"));
    }

    @Test
    void everyOtherJavaMakesTheSameReport() throws Exception {
        List<ChildJvm> others = ChildJvm.others();
        assumeFalse(others.isEmpty(), "no other Java from 17 on is on this machine");
        for (ChildJvm other : others) {
            assertEquals(
                    PrintedDigest.digest() + System.lineSeparator(),
                    run(other.java(), Map.of()),
                    other.java().toString());
        }
    }

    /** With a configuration that names no font, the platform's font classes cannot start. */
    @Test
    void aMachineWithoutFontsIsToldWhatIsMissing() throws Exception {
        assumeTrue(System.getProperty("os.name").equals("Linux"), "fonts are configured in another way here");
        Path configuration = folder.resolve("fonts.conf");
        Files.writeString(
                configuration,
                "<?xml version=\"1.0\"?><!DOCTYPE fontconfig SYSTEM \"fonts.dtd\"><fontconfig></fontconfig>");
        String out = run(
                ChildJvm.running().java(),
                Map.of("FONTCONFIG_FILE", configuration.toString()),
                "-Duser.home=" + folder);
        assertTrue(out.contains("IllegalStateException: charts cannot be drawn: this Java has no working fonts"), out);
    }

    private String run(Path java, Map<String, String> environment, String... flags)
            throws IOException, InterruptedException, NoSuchAlgorithmException {
        Path out = folder.resolve("out.txt");
        List<String> command = new ArrayList<>(List.of(java.toString()));
        command.addAll(List.of(flags));
        // The class path of the tests holds a logging interface without a logger, which would say so.
        command.addAll(List.of("-Dslf4j.internal.verbosity=ERROR", "-cp", System.getProperty("java.class.path")));
        command.add(PrintedDigest.class.getName());
        ProcessBuilder builder =
                new ProcessBuilder(command).redirectErrorStream(true).redirectOutput(out.toFile());
        builder.environment().putAll(environment);
        builder.start().waitFor();
        return Files.readString(out, StandardCharsets.UTF_8);
    }
}
