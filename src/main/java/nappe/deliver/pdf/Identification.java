package nappe.deliver.pdf;

import com.lowagie.text.pdf.PdfDictionary;
import com.lowagie.text.pdf.PdfName;
import com.lowagie.text.pdf.PdfString;
import java.nio.charset.StandardCharsets;

/**
 * What the file says of itself to archives, as XMP: that it keeps to PDF/A-3u, and title, author, dates and programs, equal
 * to the information dictionary, as ISO 19005-3, 6.6.3 wants.
 */
final class Identification {
    private static final String FORM = """
            <?xpacket begin="\uFEFF" id="W5M0MpCehiHzreSzNTczkc9d"?>
            <x:xmpmeta xmlns:x="adobe:ns:meta/">
            <rdf:RDF xmlns:rdf="http://www.w3.org/1999/02/22-rdf-syntax-ns#">
            <rdf:Description rdf:about=""
             xmlns:dc="http://purl.org/dc/elements/1.1/" xmlns:xmp="http://ns.adobe.com/xap/1.0/"
             xmlns:pdf="http://ns.adobe.com/pdf/1.3/" xmlns:pdfaid="http://www.aiim.org/pdfa/ns/id/">
            <pdfaid:part>3</pdfaid:part>
            <pdfaid:conformance>U</pdfaid:conformance>
            <dc:format>application/pdf</dc:format>
            <dc:title><rdf:Alt><rdf:li xml:lang="x-default">%s</rdf:li></rdf:Alt></dc:title>
            <dc:creator><rdf:Seq><rdf:li>%s</rdf:li></rdf:Seq></dc:creator>
            <dc:description><rdf:Alt><rdf:li xml:lang="x-default">%s</rdf:li></rdf:Alt></dc:description>
            <dc:language><rdf:Bag><rdf:li>en</rdf:li></rdf:Bag></dc:language>
            <pdf:Producer>%s</pdf:Producer>
            <xmp:CreatorTool>%s</xmp:CreatorTool>
            <xmp:CreateDate>%6$s</xmp:CreateDate>
            <xmp:ModifyDate>%6$s</xmp:ModifyDate>
            </rdf:Description>
            </rdf:RDF>
            </x:xmpmeta>
            <?xpacket end="r"?>
            """;

    private Identification() {}

    /**
     * @param info the information dictionary
     * @param date the date in it, as ISO 8601 writes it
     */
    static byte[] xmp(PdfDictionary info, String date) {
        return FORM.formatted(
                        text(info, PdfName.TITLE),
                        text(info, PdfName.AUTHOR),
                        text(info, PdfName.SUBJECT),
                        text(info, PdfName.PRODUCER),
                        text(info, PdfName.CREATOR),
                        date)
                .getBytes(StandardCharsets.UTF_8);
    }

    private static String text(PdfDictionary info, PdfName key) {
        String text = info.get(key) instanceof PdfString string ? string.toUnicodeString() : "";
        return XmlText.escaped(text);
    }
}
