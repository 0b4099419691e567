package org.notchwork.report;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDResources;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.pdmodel.graphics.form.PDFormXObject;
import org.apache.pdfbox.text.PDFTextStripper;
import org.apache.pdfbox.text.TextPosition;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.Studies;
import org.notchwork.bundle.Environment;
import org.notchwork.bundle.Results;
import org.notchwork.check.CheckKind;
import org.notchwork.check.CheckOutcome;
import org.notchwork.check.CrossCheck;
import org.notchwork.check.CrossChecker;
import org.notchwork.check.InstanceTally;
import org.notchwork.check.LineChecks;
import org.notchwork.claim.Judge;
import org.notchwork.figure.Summary;
import org.notchwork.figure.SummaryBuilder;
import org.notchwork.seed.SeedTree;
import org.notchwork.study.Claim;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.study.Study;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRunner;

class ReportTest {

    private static final String SEAL = "0123456789abcdef00112233445566778899aabbccddeeff0011223344556677";
    private static final Environment ENVIRONMENT = new Environment(
            "notchwork test",
            "2026-01-02T03:04:05Z",
            "2026-01-02T03:04:00Z",
            1,
            2,
            "Java of a test",
            "System of a test");

    @Test
    void theFirstPageHasTheSealTheClaimsAndTheEnginesWithTheirSight() throws IOException {
        String first = text(Report.pdf(results(Studies.small()), SEAL, ENVIRONMENT), 1);
        assertTrue(first.contains("01234567 89abcdef 00112233 44556677"), first);
        assertTrue(first.contains("8899aabb ccddeeff 00112233 44556677"), first);
        assertTrue(first.contains(SEAL), first);
        assertTrue(first.contains("All cross-checks that could be made agree."), first);
        assertTrue(first.contains("statevector blind"), first);
        assertTrue(first.contains("fibre blind"), first);
        assertTrue(first.contains("annihilator sighted"), first);
    }

    @Test
    void everyCellEveryClaimAndEveryLawStandsInTheReport() throws IOException {
        Results results = results(Studies.small());
        String all = text(Report.pdf(results, SEAL, ENVIRONMENT), 0).replaceAll("\\s+", " ");
        results.claims()
                .forEach(c -> assertTrue(
                        all.contains(c.claim().id() + ": "), c.claim().id()));
        results.summary()
                .cells()
                .forEach(c -> assertTrue(
                        all.contains(c.cell().width() + " " + c.cell().label()),
                        c.cell().id()));
        assertTrue(all.contains("standard errors apart"));
        assertTrue(all.contains("What is not covered"));
        assertTrue(all.contains("told the secret"));
        assertTrue(all.contains("cut/6/sequential-scan"));
    }

    @Test
    void aFailedCrossCheckIsOnTheFirstPageAndGoesFirstInItsTable() throws IOException {
        Results honest = results(Studies.small());
        List<CrossCheck> checks = new ArrayList<>(honest.checks());
        checks.add(new CrossCheck(
                CheckKind.PROMISE, "all/5", 8, "two inputs", "three inputs", Optional.empty(), CheckOutcome.DIFFERS));
        Results failed = new Results(honest.study(), honest.summary(), checks, honest.claims());
        byte[] pdf = Report.pdf(failed, SEAL, ENVIRONMENT);
        assertTrue(text(pdf, 1).contains("CROSS-CHECKS FAILED: 1 of "));
        String all = text(pdf, 0);
        assertTrue(all.indexOf("three inputs") > 0);
        assertTrue(all.indexOf("three inputs") < all.indexOf("closed-form"));
    }

    @Test
    void allFontsAreEmbedded() throws IOException {
        try (PDDocument document = Loader.loadPDF(Report.pdf(results(Studies.small()), SEAL, ENVIRONMENT))) {
            Set<String> names = new HashSet<>();
            for (PDPage page : document.getPages()) {
                fonts(page.getResources(), names);
            }
            assertEquals(3, names.size(), names.toString());
        }
    }

    @Test
    void theSameResultsGiveTheSameBytes() {
        Results results = results(Studies.small());
        assertArrayEquals(Report.pdf(results, SEAL, ENVIRONMENT), Report.pdf(results, SEAL, ENVIRONMENT));
    }

    /** One strategy at one width with one trial; twelve choices of strategy at many widths; long and odd texts. */
    @ParameterizedTest
    @ValueSource(strings = {"one", "many", "long"})
    void nothingRunsOffThePage(String size) throws IOException {
        Study study = switch (size) {
            case "one" -> one();
            case "many" -> many();
            default -> longTexts();
        };
        byte[] pdf = Report.pdf(results(study), SEAL, ENVIRONMENT);
        try (PDDocument document = Loader.loadPDF(pdf)) {
            Inside inside = new Inside();
            inside.getText(document);
            assertTrue(inside.glyphs > 500);
            assertEquals(List.of(), inside.outside);
        }
    }

    private static void fonts(PDResources resources, Set<String> names) throws IOException {
        for (COSName name : resources.getFontNames()) {
            PDFont font = resources.getFont(name);
            assertTrue(font.isEmbedded(), font.getName());
            names.add(font.getName());
        }
        for (COSName name : resources.getXObjectNames()) {
            if (resources.getXObject(name) instanceof PDFormXObject form) {
                fonts(form.getResources(), names);
            }
        }
    }

    /** Collects glyphs that are not inside the margins of their page. */
    private static final class Inside extends PDFTextStripper {

        private final List<String> outside = new ArrayList<>();
        private int glyphs;

        @Override
        protected void processTextPosition(TextPosition text) {
            glyphs++;
            float right = text.getXDirAdj() + text.getWidthDirAdj();
            float width = text.getPageWidth();
            float bottom = text.getYDirAdj();
            boolean sideways = text.getDir() != 0;
            if (!sideways
                    && (text.getXDirAdj() < 40
                            || right > width - 40
                            || bottom < 20
                            || bottom > text.getPageHeight() - 20)) {
                outside.add(text.getUnicode() + " at " + text.getXDirAdj() + ", " + bottom);
            }
            super.processTextPosition(text);
        }
    }

    private static Study one() {
        return Studies.of("""
                {"format":"notchwork-study/1","title":"One cell (invented)","question":"?","seed":"a seed of one cell only",
                 "experiments":[{"id":"one","problem":{"kind":"xor-period"},"widths":[2],
                   "strategies":[{"name":"random-draws"}],"trials":1,"query-limit":1}]}
                """);
    }

    private static Study many() {
        Study small = Studies.small();
        Experiment first = small.experiments().get(0);
        List<StrategyChoice> choices = new ArrayList<>(first.strategies());
        List<Integer> widths = List.of(2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12);
        Experiment wide =
                new Experiment("many-widths-and-a-long-name-0123456789", first.problem(), widths, choices, 3, 100_000);
        return new Study(small.title(), small.question(), small.seed(), List.of(wide), 0, List.of());
    }

    private static Study longTexts() {
        Study small = Studies.small();
        String odd = "W".repeat(90) + " \u6f22\u5b57 \u202e turned \u0007 bell \ud83d\ude00 ";
        return new Study(
                (odd + "x".repeat(200)).substring(0, 200),
                odd.repeat(12),
                small.seed(),
                small.experiments(),
                3,
                small.claims().stream()
                        .map(c -> new Claim(c.id(), odd.repeat(8), c.quantity(), c.bound()))
                        .toList());
    }

    private static Results results(Study study) {
        TrialRunner runner = new TrialRunner(new SeedTree(study.seed()));
        SummaryBuilder figures = new SummaryBuilder(study);
        LineChecks lines = new LineChecks(study);
        for (Experiment experiment : study.experiments()) {
            for (int width : experiment.widths()) {
                for (long trial = 0; trial < experiment.trials(); trial++) {
                    TrialGroup group = runner.run(experiment, width, trial);
                    figures.add(group);
                    lines.add(group);
                }
            }
        }
        Summary summary = figures.summary();
        Map<String, InstanceTally> none = new LinkedHashMap<>();
        return new Results(
                study, summary, new CrossChecker(study).all(none, lines, summary), Judge.judge(study, summary));
    }

    private static String text(byte[] pdf, int page) throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf)) {
            PDFTextStripper stripper = new PDFTextStripper();
            if (page > 0) {
                stripper.setStartPage(page);
                stripper.setEndPage(page);
            }
            return stripper.getText(document);
        }
    }
}
