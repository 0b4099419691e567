package org.notchwork.report;

import org.apache.pdfbox.cos.COSArray;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSInteger;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.common.PDNumberTreeNode;
import org.apache.pdfbox.pdmodel.documentinterchange.logicalstructure.PDMarkInfo;
import org.apache.pdfbox.pdmodel.documentinterchange.logicalstructure.PDMarkedContentReference;
import org.apache.pdfbox.pdmodel.documentinterchange.logicalstructure.PDParentTreeValue;
import org.apache.pdfbox.pdmodel.documentinterchange.logicalstructure.PDStructureElement;
import org.apache.pdfbox.pdmodel.documentinterchange.logicalstructure.PDStructureTreeRoot;

/**
 * The logical structure of a document: which marks on its pages make up a heading, a paragraph, a cell of a table, so
 * that a reading program can say them in order (ISO 32000-1:2008, section 14.7).
 */
final class Structure {

    private final PDStructureTreeRoot root = new PDStructureTreeRoot();
    private final PDStructureElement whole;
    private final COSArray owners = new COSArray();
    private COSArray ownersOnPage = new COSArray();
    private PDPage page;
    private int pages;

    /** Begins the structure of a document. */
    Structure(PDDocument document) {
        whole = new PDStructureElement("Document", root);
        root.appendKid(whole);
        PDMarkInfo marks = new PDMarkInfo();
        marks.setMarked(true);
        document.getDocumentCatalog().setMarkInfo(marks);
        document.getDocumentCatalog().setStructureTreeRoot(root);
    }

    /** From now on marks lie on this page. */
    void begin(PDPage next) {
        page = next;
        page.setStructParents(pages);
        page.getCOSObject().setItem(COSName.getPDFName("Tabs"), COSName.S);
        ownersOnPage = new COSArray();
        owners.add(COSInteger.get(pages));
        owners.add(ownersOnPage);
        pages++;
    }

    /** Returns a new element of the document, of a standard type such as {@code P} or {@code Table}. */
    PDStructureElement add(String type) {
        return add(whole, type);
    }

    /** Returns a new element inside another. */
    PDStructureElement add(PDStructureElement parent, String type) {
        PDStructureElement element = new PDStructureElement(type, parent);
        parent.appendKid(element);
        return element;
    }

    /** Returns the number, on this page, of a new mark that belongs to an element. */
    int mark(PDStructureElement element) {
        int number = ownersOnPage.size();
        ownersOnPage.add(element.getCOSObject());
        PDMarkedContentReference reference = new PDMarkedContentReference();
        reference.setPage(page);
        reference.setMCID(number);
        element.appendKid(reference);
        return number;
    }

    /** Notes for every mark whose it is; nothing may be marked afterwards. */
    void finish() {
        COSDictionary tree = new COSDictionary();
        tree.setItem(COSName.NUMS, owners);
        root.setParentTree(new PDNumberTreeNode(tree, PDParentTreeValue.class));
        root.setParentTreeNextKey(pages);
    }
}
