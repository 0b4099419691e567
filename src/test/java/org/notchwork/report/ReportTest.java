package org.notchwork.report;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
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
import org.junit.jupiter.api.Test;
import org.notchwork.Studies;
import org.notchwork.bundle.Results;
import org.notchwork.check.CheckKind;
import org.notchwork.check.CheckOutcome;
import org.notchwork.check.CrossCheck;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.QueryFigures;
import org.notchwork.figure.RatioFigures;

class ReportTest {

    @Test
    void theFirstPageHasTheSealTheClaimsAndTheEnginesWithTheirSight() throws IOException {
        String first = text(Report.pdf(Samples.results(Studies.small()), Samples.SEAL, Samples.ENVIRONMENT), 1);
        assertTrue(first.contains("01234567 89abcdef 00112233 44556677"), first);
        assertTrue(first.contains("8899aabb ccddeeff 00112233 44556677"), first);
        assertTrue(first.contains(Samples.SEAL), first);
        assertTrue(first.contains("All cross-checks that could be made agree."), first);
        assertTrue(first.contains("statevector blind"), first);
        assertTrue(first.contains("fibre blind"), first);
        assertTrue(first.contains("annihilator sighted"), first);
    }

    @Test
    void everyCellEveryClaimAndEveryLawStandsInTheReport() throws IOException {
        Results results = Samples.results(Studies.small());
        String all =
                text(Report.pdf(results, Samples.SEAL, Samples.ENVIRONMENT), 0).replaceAll("\\s+", " ");
        results.claims()
                .forEach(c -> assertTrue(
                        all.contains(c.claim().id() + ": "), c.claim().id()));
        results.summary()
                .cells()
                .forEach(c -> assertTrue(
                        all.contains(c.cell().width() + " " + c.cell().label()),
                        c.cell().id()));
        assertTrue(all.contains("What is not covered"));
        assertTrue(all.contains("told the secret"));
        assertTrue(all.contains("cut/6/sequential-scan"));
    }

    @Test
    void everyFigureOfACellStandsInOneRow() throws IOException {
        Results results = Samples.results(Studies.small());
        String all =
                text(Report.pdf(results, Samples.SEAL, Samples.ENVIRONMENT), 0).replaceAll("\\s+", " ");
        for (CellFigures cell : results.summary().cells()) {
            String outcomes = String.join(
                    " ",
                    Integer.toString(cell.cell().width()),
                    cell.cell().label(),
                    cell.sight().orElse("–"),
                    Long.toString(cell.trials()),
                    Long.toString(cell.solved()),
                    Long.toString(cell.wrong()),
                    Long.toString(cell.censored()),
                    places(cell.success(), 6),
                    places(cell.successInterval().low(), 6),
                    places(cell.successInterval().high(), 6),
                    Long.toString(cell.confirming()));
            assertTrue(all.contains(outcomes), outcomes);
            QueryFigures queries = cell.queries();
            String costs = String.join(
                    " ",
                    Integer.toString(cell.cell().width()),
                    cell.cell().label(),
                    (cell.censored() > 0 ? "≥ " : "") + places(queries.mean(), 3),
                    places(queries.interval().orElseThrow().low(), 3),
                    places(queries.interval().orElseThrow().high(), 3),
                    places(queries.deviation().orElseThrow(), 3),
                    Long.toString(queries.min()),
                    Long.toString(queries.lowerQuartile()),
                    Long.toString(queries.median()),
                    Long.toString(queries.upperQuartile()),
                    Long.toString(queries.max()));
            assertTrue(all.contains(costs), costs);
        }
    }

    @Test
    void theLawStandsBesideTheObservedMeanWithItsDistanceInStandardErrors() throws IOException {
        Results results = Samples.results(Studies.small());
        String all =
                text(Report.pdf(results, Samples.SEAL, Samples.ENVIRONMENT), 0).replaceAll("\\s+", " ");
        // 3.333333 = 10/3: the sum of 1/(1 - 2^-i) for i = 1, 2 (Simon 1997).
        CrossCheck check = results.checks().stream()
                .filter(c -> c.kind() == CheckKind.THEORY_MEAN && c.subject().equals("all/3/fourier-sampling@fibre"))
                .findFirst()
                .orElseThrow();
        String observed = check.observed().replace("mean ", "").replace(", standard error", "");
        String row = "3 fourier-sampling@fibre 8 3.333333 = 10/3 " + observed + " "
                + check.standardErrors().orElseThrow() + " agrees";
        assertTrue(all.contains(row), row);
    }

    @Test
    void everyClaimHasItsVerdictItsValueAndTheReason() throws IOException {
        Results results = Samples.results(Studies.small());
        String all =
                text(Report.pdf(results, Samples.SEAL, Samples.ENVIRONMENT), 0).replaceAll("\\s+", " ");
        assertEquals(4, results.claims().size());
        results.claims().forEach(c -> {
            String verdict = c.claim().id() + ": " + c.verdict().word().toUpperCase(Locale.ROOT);
            assertTrue(all.contains(verdict), verdict);
            assertTrue(all.contains("Found: " + places(c.value(), 6) + ". Reason: " + held(c.reason())), c.reason());
        });
        assertTrue(all.contains("Claimed: queries-mean of cut/6/sequential-scan at least 8.5."));
    }

    @Test
    void ratiosWithCensoredPairsSayHowMany() throws IOException {
        Results results = Samples.results(Studies.small());
        RatioFigures cut = results.summary().ratios().stream()
                .filter(r -> r.of().experiment().equals("cut"))
                .findFirst()
                .orElseThrow();
        assertTrue(cut.censored() > 0);
        String all =
                text(Report.pdf(results, Samples.SEAL, Samples.ENVIRONMENT), 0).replaceAll("\\s+", " ");
        String row = "cut 6 sequential-scan fourier-sampling@fibre 12 " + cut.censored() + " " + places(cut.ratio(), 3);
        assertTrue(all.contains(row), row);
    }

    @Test
    void aFailedCrossCheckIsOnTheFirstPageAndGoesFirstInItsTable() throws IOException {
        Results honest = Samples.results(Studies.small());
        List<CrossCheck> checks = new ArrayList<>(honest.checks());
        checks.add(new CrossCheck(
                CheckKind.PROMISE, "all/5", 8, "two inputs", "three inputs", Optional.empty(), CheckOutcome.DIFFERS));
        Results failed = new Results(honest.study(), honest.summary(), checks, honest.claims());
        byte[] pdf = Report.pdf(failed, Samples.SEAL, Samples.ENVIRONMENT);
        String first = text(pdf, 1).replaceAll("\\s+", " ");
        assertTrue(first.contains("CROSS-CHECKS FAILED: 1 of "), first);
        assertTrue(first.contains("DIFFERS: promise on all/5. Expected: two inputs. Observed: three inputs."), first);
        String all = text(pdf, 0);
        int table = all.indexOf("Those that DIFFER");
        assertTrue(table > 0);
        assertTrue(all.lastIndexOf("three inputs") > table);
        assertTrue(all.lastIndexOf("three inputs") < all.indexOf("promise: the promise"));
    }

    @Test
    void allFontsAreEmbedded() throws IOException {
        try (PDDocument document =
                Loader.loadPDF(Report.pdf(Samples.results(Studies.small()), Samples.SEAL, Samples.ENVIRONMENT))) {
            Set<String> names = new HashSet<>();
            for (PDPage page : document.getPages()) {
                fonts(page.getResources(), names);
            }
            assertEquals(3, names.size(), names.toString());
        }
    }

    @Test
    void theSameResultsGiveTheSameBytes() {
        Results results = Samples.results(Studies.small());
        assertArrayEquals(
                Report.pdf(results, Samples.SEAL, Samples.ENVIRONMENT),
                Report.pdf(results, Samples.SEAL, Samples.ENVIRONMENT));
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

    private static String places(BigDecimal value, int places) {
        return value.setScale(places, RoundingMode.HALF_EVEN).toPlainString();
    }

    /** A per cent sign is set with a blank at which no line breaks. */
    private static String held(String text) {
        return text.replace(" %", "\u00a0%");
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
