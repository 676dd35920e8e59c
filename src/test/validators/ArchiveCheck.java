import java.io.FileInputStream;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.verapdf.gf.foundry.VeraGreenfieldFoundryProvider;
import org.verapdf.pdfa.Foundries;
import org.verapdf.pdfa.PDFAParser;
import org.verapdf.pdfa.PDFAValidator;
import org.verapdf.pdfa.flavours.PDFAFlavour;
import org.verapdf.pdfa.results.TestAssertion;
import org.verapdf.pdfa.results.ValidationResult;

/**
 * Checks files against PDF/A-3u and writes, into the file named first, one line each: "compliant" or "not compliant", the
 * rules broken below it. Run as a source file in a Java of its own, since the validator brings an XML transformer that would take the place of the JDK's.
 */
public final class ArchiveCheck {
    public static void main(String[] arguments) throws Exception {
        VeraGreenfieldFoundryProvider.initialise();
        PDFAFlavour flavour = PDFAFlavour.PDFA_3_U;
        StringBuilder said = new StringBuilder();
        for (String file : List.of(arguments).subList(1, arguments.length)) {
            try (InputStream in = new FileInputStream(file);
                    PDFAParser parser = Foundries.defaultInstance().createParser(in, flavour);
                    PDFAValidator validator = Foundries.defaultInstance().createValidator(flavour, false)) {
                ValidationResult result = validator.validate(parser);
                said.append(result.isCompliant() ? "compliant " : "not compliant ")
                        .append(file + " " + result.getPDFAFlavour() + " " + result.getTotalAssertions() + " checks\n");
                result.getTestAssertions().stream()
                        .filter(assertion -> assertion.getStatus() == TestAssertion.Status.FAILED)
                        .map(assertion -> "  " + assertion.getRuleId().getClause() + "-"
                                + assertion.getRuleId().getTestNumber() + " " + assertion.getMessage() + "\n")
                        .distinct()
                        .forEach(said::append);
            }
        }
        Files.writeString(Path.of(arguments[0]), said);
    }
}
