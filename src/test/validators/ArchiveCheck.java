import java.io.FileInputStream;
import java.io.InputStream;
import org.verapdf.gf.foundry.VeraGreenfieldFoundryProvider;
import org.verapdf.pdfa.Foundries;
import org.verapdf.pdfa.PDFAParser;
import org.verapdf.pdfa.PDFAValidator;
import org.verapdf.pdfa.flavours.PDFAFlavour;
import org.verapdf.pdfa.results.TestAssertion;
import org.verapdf.pdfa.results.ValidationResult;

/**
 * Checks files against PDF/A-3u, one line each: "compliant" or "not compliant", the rules broken below it. Run as a source
 * file in a Java of its own, since the validator brings an XML transformer that would take the place of the JDK's.
 */
public final class ArchiveCheck {
    public static void main(String[] files) throws Exception {
        VeraGreenfieldFoundryProvider.initialise();
        PDFAFlavour flavour = PDFAFlavour.PDFA_3_U;
        for (String file : files) {
            try (InputStream in = new FileInputStream(file);
                    PDFAParser parser = Foundries.defaultInstance().createParser(in, flavour);
                    PDFAValidator validator = Foundries.defaultInstance().createValidator(flavour, false)) {
                ValidationResult result = validator.validate(parser);
                System.out.println((result.isCompliant() ? "compliant " : "not compliant ") + file + " "
                        + result.getPDFAFlavour() + " " + result.getTotalAssertions() + " checks");
                result.getTestAssertions().stream()
                        .filter(assertion -> assertion.getStatus() == TestAssertion.Status.FAILED)
                        .map(assertion -> "  " + assertion.getRuleId().getClause() + "-"
                                + assertion.getRuleId().getTestNumber() + " " + assertion.getMessage())
                        .distinct()
                        .forEach(System.out::println);
            }
        }
    }
}
