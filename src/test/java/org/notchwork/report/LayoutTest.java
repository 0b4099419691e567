package org.notchwork.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.apache.pdfbox.text.TextPosition;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.Studies;
import org.notchwork.bundle.Results;

/** Where glyphs lie, for the smallest report, for one of twelve strategies at forty widths, and for odd texts. */
class LayoutTest {

    /** Two glyphs of one line cover one another if they share more than this part of the narrower one. */
    private static final float SHARED = 0.4f;

    private static Results results(String size) {
        return switch (size) {
            case "one" -> Samples.results(Samples.one());
            case "many" -> Samples.results(Samples.many());
            case "twelve" -> MadeUpResults.ofTwelveStrategiesAtFortyWidths();
            case "small" -> Samples.results(Studies.small());
            default -> Samples.results(Samples.longTexts());
        };
    }

    private static byte[] pdf(String size) {
        return Report.pdf(results(size), Samples.SEAL, Samples.ENVIRONMENT);
    }

    @ParameterizedTest
    @ValueSource(strings = {"one", "small", "many", "twelve", "long"})
    void nothingRunsOffThePageOrCoversSomethingElse(String size) throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf(size))) {
            Glyphs glyphs = new Glyphs();
            glyphs.getText(document);
            assertTrue(glyphs.count > 500);
            assertEquals(List.of(), glyphs.outside);
            assertEquals(List.of(), glyphs.covered);
            assertEquals(List.of(), glyphs.ligatures);
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"one", "small", "many", "twelve", "long"})
    void theSealAndTheWayToVerifyItStandOnTheFirstPage(String size) throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf(size))) {
            PDFTextStripper stripper = new PDFTextStripper();
            stripper.setEndPage(1);
            String first = stripper.getText(document);
            assertTrue(first.contains("01234567 89abcdef 00112233 44556677"), first);
            assertTrue(first.contains("8899aabb ccddeeff 00112233 44556677"), first);
            assertTrue(first.contains("verify FOLDER --expect " + Samples.SEAL), first);
            assertTrue(first.contains("sha256sum -c --strict --quiet tagmanifest-sha256.txt"), first);
        }
    }

    @Test
    void everyPageSaysItsNumberTheSealAndTheProgram() throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf("many"))) {
            int pages = document.getNumberOfPages();
            assertTrue(pages > 5);
            for (int page = 1; page <= pages; page++) {
                PDFTextStripper stripper = new PDFTextStripper();
                stripper.setStartPage(page);
                stripper.setEndPage(page);
                String text = stripper.getText(document);
                assertTrue(text.contains("page " + page + " of " + pages), text);
                assertTrue(text.contains("seal 0123456789abcdef… · notchwork test · A small study"), text);
            }
        }
    }

    @Test
    void longNumbersAreNeverBroken() throws IOException {
        try (PDDocument document = Loader.loadPDF(pdf("twelve"))) {
            String all = new PDFTextStripper().getText(document).replaceAll("\\s+", " ");
            // The largest mean of the made-up cells, its interval of a tenth either way, deviation and quartiles.
            assertTrue(
                    all.contains("41 made-up-5 4294967297 3865470567 4724464026 429496730"
                            + " 1 2147483648 4294967296 8589934592 17179869184"),
                    all.substring(all.indexOf("41 made-up-5")));
        }
    }

    /** Collects glyphs outside the margins of their page, pairs that cover one another, and ligatures. */
    private static final class Glyphs extends PDFTextStripper {

        private final List<String> outside = new ArrayList<>();
        private final List<String> covered = new ArrayList<>();
        private final List<String> ligatures = new ArrayList<>();
        private final List<TextPosition> onPage = new ArrayList<>();
        private int count;

        @Override
        protected void processTextPosition(TextPosition text) {
            count++;
            float right = text.getXDirAdj() + text.getWidthDirAdj();
            float bottom = text.getYDirAdj();
            if (text.getUnicode().chars().anyMatch(c -> c >= 0xFB00 && c <= 0xFB06)) {
                ligatures.add(text.getUnicode());
            }
            if (text.getDir() == 0) {
                if (!text.getUnicode().isBlank()) {
                    onPage.add(text);
                }
                if (text.getXDirAdj() < 40
                        || right > text.getPageWidth() - 40
                        || bottom < 20
                        || bottom > text.getPageHeight() - 20) {
                    outside.add(text.getUnicode() + " at " + text.getXDirAdj() + ", " + bottom);
                }
            }
            super.processTextPosition(text);
        }

        @Override
        protected void writePage() throws IOException {
            onPage.sort(Comparator.comparingDouble(TextPosition::getYDirAdj));
            for (int i = 0; i < onPage.size(); i++) {
                for (int j = i + 1; j < onPage.size() && near(onPage.get(i), onPage.get(j)); j++) {
                    compare(onPage.get(i), onPage.get(j));
                }
            }
            onPage.clear();
            super.writePage();
        }

        /** Whether the lower glyph's upper half reaches into the higher one's line. */
        private static boolean near(TextPosition high, TextPosition low) {
            return low.getYDirAdj() - high.getYDirAdj() < low.getFontSizeInPt() * 0.5;
        }

        private void compare(TextPosition a, TextPosition b) {
            float left = Math.max(a.getXDirAdj(), b.getXDirAdj());
            float right = Math.min(a.getXDirAdj() + a.getWidthDirAdj(), b.getXDirAdj() + b.getWidthDirAdj());
            if (right - left > SHARED * Math.min(a.getWidthDirAdj(), b.getWidthDirAdj())) {
                covered.add(a.getUnicode() + " and " + b.getUnicode() + " at " + left + ", " + a.getYDirAdj());
            }
        }
    }
}
