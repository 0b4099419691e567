package org.notchwork.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.contentstream.operator.Operator;
import org.apache.pdfbox.cos.COSArray;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdfparser.PDFStreamParser;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDDocumentCatalog;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.documentinterchange.logicalstructure.PDStructureElement;
import org.apache.pdfbox.pdmodel.documentinterchange.logicalstructure.PDStructureNode;
import org.junit.jupiter.api.Test;
import org.notchwork.Studies;

/** What a reading program finds: marks, their owners, tables of whole rows, words for every chart. */
class StructureTest {

    private static final Set<String> PAINTING = Set.of("Tj", "TJ", "'", "\"", "Do", "S", "f", "B");

    private static PDDocument report() throws IOException {
        return Loader.loadPDF(Report.pdf(Samples.results(Studies.small()), Samples.SEAL, Samples.ENVIRONMENT));
    }

    @Test
    void everythingOnAPageIsMarkedAndEveryNumberedMarkHasAnOwner() throws IOException {
        try (PDDocument document = report()) {
            COSArray tree = (COSArray) document.getDocumentCatalog()
                    .getStructureTreeRoot()
                    .getCOSObject()
                    .getCOSDictionary(COSName.PARENT_TREE)
                    .getDictionaryObject(COSName.NUMS);
            for (PDPage page : document.getPages()) {
                int numbered = 0;
                int depth = 0;
                for (Object token : new PDFStreamParser(page).parse()) {
                    if (token instanceof Operator operator) {
                        String name = operator.getName();
                        numbered += name.equals("BDC") ? 1 : 0;
                        depth += Set.of("BDC", "BMC").contains(name) ? 1 : name.equals("EMC") ? -1 : 0;
                        assertTrue(depth > 0 || !PAINTING.contains(name), name);
                    }
                }
                assertEquals(0, depth);
                COSArray owners = (COSArray) tree.getObject(2 * page.getStructParents() + 1);
                assertEquals(numbered, owners.size());
                for (int i = 0; i < owners.size(); i++) {
                    assertNotNull(((COSDictionary) owners.getObject(i)).getNameAsString(COSName.S));
                }
            }
        }
    }

    @Test
    void everyRowOfATableHasAsManyCellsAsItHasHeadings() throws IOException {
        try (PDDocument document = report()) {
            List<PDStructureElement> tables = all(document.getDocumentCatalog().getStructureTreeRoot(), "Table");
            assertTrue(tables.size() > 8);
            for (PDStructureElement table : tables) {
                int headings = all(table, "TH").size();
                assertTrue(headings > 1);
                List<PDStructureElement> rows = all(table, "TR");
                assertEquals(headings, all(rows.get(0), "TH").size());
                rows.subList(1, rows.size())
                        .forEach(r -> assertEquals(headings, all(r, "TD").size()));
            }
        }
    }

    @Test
    void everyChartHasWordsThatStandForIt() throws IOException {
        try (PDDocument document = report()) {
            List<PDStructureElement> figures = all(document.getDocumentCatalog().getStructureTreeRoot(), "Figure");
            assertEquals(2, figures.size());
            assertEquals(
                    "Chart: mean queries of a trial against width, for experiment all at widths 3, 5. Strategies:"
                            + " sequential-scan, random-draws, difference-cover, fourier-sampling@statevector (blind),"
                            + " fourier-sampling@fibre (blind), fourier-sampling@annihilator (sighted). Every number of"
                            + " the chart stands in the tables that follow.",
                    figures.get(0).getAlternateDescription());
        }
    }

    /** ISO 19005-2, 6.2.3, 6.6.4, 6.7 and ISO 14289-1, 5: what a file that claims conformance says of itself. */
    @Test
    void theDocumentSaysWhatItConformsTo() throws IOException {
        try (PDDocument document = report()) {
            PDDocumentCatalog catalog = document.getDocumentCatalog();
            assertEquals("en", catalog.getLanguage());
            assertTrue(catalog.getMarkInfo().isMarked());
            assertEquals(1, catalog.getOutputIntents().size());
            String xmp = new String(catalog.getMetadata().toByteArray(), StandardCharsets.UTF_8);
            assertTrue(xmp.contains("<pdfaid:part>2</pdfaid:part><pdfaid:conformance>A</pdfaid:conformance>"), xmp);
            assertTrue(xmp.contains("<pdfuaid:part>1</pdfuaid:part>"), xmp);
            assertTrue(xmp.contains("<xmp:CreateDate>2026-01-02T03:04:00+00:00</xmp:CreateDate>"), xmp);
            assertEquals(
                    1_767_323_040_000L,
                    document.getDocumentInformation().getCreationDate().getTimeInMillis());
            assertFalse(document.isEncrypted());
        }
    }

    private static List<PDStructureElement> all(PDStructureNode node, String type) {
        List<PDStructureElement> found = new ArrayList<>();
        for (Object kid : node.getKids()) {
            if (kid instanceof PDStructureElement element) {
                if (element.getStructureType().equals(type)) {
                    found.add(element);
                }
                found.addAll(all(element, type));
            }
        }
        return found;
    }
}
