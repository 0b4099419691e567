package org.notchwork.report;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.notchwork.bundle.Environment;
import org.notchwork.bundle.Results;
import org.notchwork.json.Printable;

/** Makes the report. */
public final class Report {

    private static final int FOOT_TITLE = 60;
    private static final int FOOT_SEAL = 16;
    private static final String HEADLESS = "java.awt.headless";

    private Report() {}

    /**
     * Returns the report as the bytes of a PDF.
     *
     * @param results what the study came to
     * @param seal the seal, 64 hexadecimal digits
     * @param environment where and when it ran; the only source of dates
     * @throws IllegalStateException if this Java cannot handle fonts, which the charts need
     */
    public static byte[] pdf(Results results, String seal, Environment environment) {
        withoutScreen();
        try (PDDocument document = new PDDocument()) {
            Fonts fonts = Fonts.load(document);
            String title = Printable.escape(results.study().title());
            try (Flow flow = new Flow(document, fonts)) {
                new CoverSection(results, seal, environment).set(flow);
                new ClaimsSection(results.claims()).set(flow);
                new FiguresSection(results).set(flow);
                new PartsSection(results).set(flow);
                new NoiseSection(results).set(flow);
                new ControlsSection(results).set(flow);
                new RatiosSection(results).set(flow);
                new CalibrationSection(results.checks()).set(flow);
                new ChecksSection(results.checks()).set(flow);
                new LimitsSection(results).set(flow);
                flow.finish("seal " + seal.substring(0, FOOT_SEAL) + "… · " + Printable.escape(environment.program())
                        + " · " + Printable.cut(title, FOOT_TITLE));
            }
            Metadata.add(document, title, seal, environment);
            ByteArrayOutputStream bytes = new ByteArrayOutputStream();
            document.save(bytes);
            return bytes.toByteArray();
        } catch (IOException e) {
            throw new UncheckedIOException("the report cannot be made: " + e.getMessage(), e);
        }
    }

    /**
     * Keeps the platform's drawing classes away from the screen, unless the user said otherwise. They would else ask
     * for one even if charts go to a file, and fail where the environment names a display that does not answer.
     */
    static void withoutScreen() {
        if (System.getProperty(HEADLESS) == null) {
            System.setProperty(HEADLESS, "true");
        }
    }
}
