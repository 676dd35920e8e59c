import java.io.InputStream;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.zip.ZipEntry;
import java.util.zip.ZipFile;
import org.apache.xmlbeans.SchemaTypeLoader;
import org.apache.xmlbeans.XmlBeans;
import org.apache.xmlbeans.XmlError;
import org.apache.xmlbeans.XmlException;
import org.apache.xmlbeans.XmlOptions;

/**
 * Holds each part of a workbook against the schemas of Open XML and prints {@code checked PART} or {@code fault in PART:
 * ...}. Run as a source file, with the jar of all schemas and XMLBeans on the class path. What these schemas do not
 * know: relations, content types, core properties.
 */
public final class ValidateOpenXml {
    private ValidateOpenXml() {}

    public static void main(String[] arguments) throws Exception {
        SchemaTypeLoader types = XmlBeans.typeLoaderUnion(
                org.apache.poi.schemas.ooxml.system.ooxml.TypeSystemHolder.typeSystem, XmlBeans.getBuiltinTypeSystem());
        try (ZipFile zip = new ZipFile(arguments[0])) {
            for (ZipEntry entry : Collections.list(zip.entries())) {
                String name = entry.getName();
                boolean isKnown = name.startsWith("xl/") || name.equals("docProps/app.xml") || name.equals("docProps/custom.xml");
                if (isKnown && name.endsWith(".xml")) {
                    try (InputStream part = zip.getInputStream(entry)) {
                        faults(types, part).forEach(fault -> System.out.println("fault in " + name + ": " + fault));
                    }
                    System.out.println("checked " + name);
                }
            }
        }
    }

    private static List<String> faults(SchemaTypeLoader types, InputStream part) throws Exception {
        List<XmlError> errors = new ArrayList<>();
        try {
            types.parse(part, null, new XmlOptions()).validate(new XmlOptions().setErrorListener(errors));
        } catch (XmlException e) {
            return List.of(String.valueOf(e.getMessage()));
        }
        List<String> faults = new ArrayList<>();
        for (XmlError error : errors) {
            String message = error.getMessage();
            // the schemas leave this attribute of XML itself out
            if (!message.contains("space@http://www.w3.org/XML/1998/namespace")) {
                faults.add(message);
            }
        }
        return faults;
    }
}
