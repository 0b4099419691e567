package org.notchwork.report;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.time.ZoneOffset;
import java.time.ZonedDateTime;
import java.util.GregorianCalendar;
import org.apache.pdfbox.cos.COSArray;
import org.apache.pdfbox.cos.COSDictionary;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.cos.COSString;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDDocumentInformation;
import org.apache.pdfbox.pdmodel.common.PDMetadata;
import org.apache.pdfbox.pdmodel.common.PDStream;
import org.apache.pdfbox.pdmodel.interactive.viewerpreferences.PDViewerPreferences;
import org.notchwork.bundle.Environment;

/**
 * Makes a document self-contained and accessible in the sense of PDF/A-2a (ISO 19005-2) and PDF/UA-1 (ISO 14289-1):
 * colour profile, metadata, fixed identity.
 *
 * <p>The colour profile is embedded as it stands; the usual way through the platform's colour classes changes its
 * bytes between Java versions.
 */
final class Metadata {

    private static final String PRODUCER = "notchwork";

    /** Describes the one property that PDF/A does not know: ISO 19005-2, 6.6.2.3.3 asks for it. */
    private static final String EXTENSION = """
            <rdf:Description rdf:about="" xmlns:pdfaExtension="http://www.aiim.org/pdfa/ns/extension/"
             xmlns:pdfaSchema="http://www.aiim.org/pdfa/ns/schema#"
             xmlns:pdfaProperty="http://www.aiim.org/pdfa/ns/property#">
            <pdfaExtension:schemas><rdf:Bag><rdf:li rdf:parseType="Resource">
            <pdfaSchema:schema>PDF/UA identification schema</pdfaSchema:schema>
            <pdfaSchema:namespaceURI>http://www.aiim.org/pdfua/ns/id/</pdfaSchema:namespaceURI>
            <pdfaSchema:prefix>pdfuaid</pdfaSchema:prefix>
            <pdfaSchema:property><rdf:Seq><rdf:li rdf:parseType="Resource">
            <pdfaProperty:name>part</pdfaProperty:name>
            <pdfaProperty:valueType>Integer</pdfaProperty:valueType>
            <pdfaProperty:category>internal</pdfaProperty:category>
            <pdfaProperty:description>part of ISO 14289 that the file conforms to</pdfaProperty:description>
            </rdf:li></rdf:Seq></pdfaSchema:property>
            </rdf:li></rdf:Bag></pdfaExtension:schemas>
            </rdf:Description>
            """;

    private Metadata() {}

    /** Adds everything; dates come from the environment, the identity from the seal. */
    static void add(PDDocument document, String title, String seal, Environment environment) throws IOException {
        document.setDocumentId(Long.parseUnsignedLong(seal.substring(0, 16), 16));
        document.getDocumentCatalog().setLanguage("en");
        PDViewerPreferences preferences = new PDViewerPreferences(new COSDictionary());
        preferences.setDisplayDocTitle(true);
        document.getDocumentCatalog().setViewerPreferences(preferences);
        ZonedDateTime when = Instant.parse(environment.finished()).atZone(ZoneOffset.UTC);
        PDDocumentInformation information = new PDDocumentInformation();
        information.setTitle(title);
        information.setProducer(PRODUCER);
        information.setCreator(environment.program());
        information.setCreationDate(GregorianCalendar.from(when));
        information.setModificationDate(GregorianCalendar.from(when));
        document.setDocumentInformation(information);
        profile(document);
        PDMetadata metadata = new PDMetadata(document);
        metadata.importXMPMetadata(xmp(title, environment, when).getBytes(StandardCharsets.UTF_8));
        document.getDocumentCatalog().setMetadata(metadata);
    }

    private static void profile(PDDocument document) throws IOException {
        try (InputStream in = Metadata.class.getResourceAsStream("/report/sRGB.icc")) {
            if (in == null) {
                throw new IllegalStateException("not in the program: /report/sRGB.icc");
            }
            PDStream stream = new PDStream(document, in, COSName.FLATE_DECODE);
            stream.getCOSObject().setInt(COSName.N, 3);
            COSDictionary intent = new COSDictionary();
            intent.setItem(COSName.TYPE, COSName.OUTPUT_INTENT);
            intent.setItem(COSName.S, COSName.GTS_PDFA1);
            intent.setItem(COSName.OUTPUT_CONDITION_IDENTIFIER, new COSString("sRGB"));
            intent.setItem(COSName.INFO, new COSString("sRGB"));
            intent.setItem(COSName.DEST_OUTPUT_PROFILE, stream);
            COSArray intents = new COSArray();
            intents.add(intent);
            document.getDocumentCatalog().getCOSObject().setItem(COSName.OUTPUT_INTENTS, intents);
        }
    }

    private static String xmp(String title, Environment environment, ZonedDateTime when) {
        String date = when.toOffsetDateTime().toString().replace("Z", "+00:00");
        String seconds = date.matches(".*T\\d\\d:\\d\\d\\+.*") ? date.replace("+00:00", ":00+00:00") : date;
        return "<?xpacket begin=\"\uFEFF\" id=\"W5M0MpCehiHzreSzNTczkc9d\"?>\n"
                + "<x:xmpmeta xmlns:x=\"adobe:ns:meta/\"><rdf:RDF"
                + " xmlns:rdf=\"http://www.w3.org/1999/02/22-rdf-syntax-ns#\">\n"
                + "<rdf:Description rdf:about=\"\" xmlns:pdfaid=\"http://www.aiim.org/pdfa/ns/id/\""
                + " xmlns:dc=\"http://purl.org/dc/elements/1.1/\" xmlns:xmp=\"http://ns.adobe.com/xap/1.0/\""
                + " xmlns:pdf=\"http://ns.adobe.com/pdf/1.3/\" xmlns:pdfuaid=\"http://www.aiim.org/pdfua/ns/id/\">\n"
                + "<pdfaid:part>2</pdfaid:part><pdfaid:conformance>A</pdfaid:conformance>\n"
                + "<pdfuaid:part>1</pdfuaid:part>\n"
                + "<dc:title><rdf:Alt><rdf:li xml:lang=\"x-default\">" + xml(title) + "</rdf:li></rdf:Alt></dc:title>\n"
                + "<xmp:CreateDate>" + seconds + "</xmp:CreateDate><xmp:ModifyDate>" + seconds + "</xmp:ModifyDate>\n"
                + "<xmp:CreatorTool>" + xml(environment.program()) + "</xmp:CreatorTool>\n"
                + "<pdf:Producer>" + PRODUCER + "</pdf:Producer>\n"
                + "</rdf:Description>\n" + EXTENSION + "</rdf:RDF></x:xmpmeta>\n<?xpacket end=\"w\"?>";
    }

    private static String xml(String text) {
        return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
    }
}
