package nappe.deliver.pdf;

import com.lowagie.text.pdf.PdfContentByte;
import com.lowagie.text.pdf.PdfDictionary;
import com.lowagie.text.pdf.PdfName;
import com.lowagie.text.pdf.PdfString;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;

/**
 * Equations drawn below one another, each as one marked span of text that copies and is found as its plain formula.
 *
 * @param box what is drawn; part by part the spans
 * @param texts the plain text of each part
 */
record Equation(Box box, List<String> texts) implements Drawn {
    private static final PdfName SPAN = new PdfName("Span");
    private static final PdfName ACTUAL_TEXT = new PdfName("ActualText");

    Equation {
        texts = texts.stream().map(XmlText::safe).toList();
        if (texts.size() != box.parts().size()) {
            throw new IllegalArgumentException(
                    texts.size() + " texts for " + box.parts().size() + " spans");
        }
    }

    /** Nothing that is seen, but it holds the line open so far above and below its baseline. */
    static Equation strut(double above, double below) {
        return new Equation(Box.empty(0, above, below), List.of());
    }

    @Override
    public double width() {
        return box.width();
    }

    @Override
    public double above() {
        return box.above();
    }

    @Override
    public double below() {
        return box.below();
    }

    /** How far it reaches below the baseline of the last of the equations. */
    double lastBelow() {
        return box.below() + box.parts().get(box.parts().size() - 1).y();
    }

    /** All plain texts, a line each. */
    String text() {
        return String.join("\n", texts);
    }

    @Override
    public Set<Integer> missing() {
        Set<Integer> missing = new TreeSet<>();
        texts.forEach(text -> text.codePoints()
                .filter(character -> Typefaces.isMissing(character, Typefaces.REGULAR))
                .forEach(missing::add));
        return missing;
    }

    @Override
    public void paint(PdfContentByte page, double x, double y) {
        page.saveState();
        page.setRGBColorFill(0, 0, 0);
        for (int i = 0; i < texts.size(); i++) {
            Box.Part part = box.parts().get(i);
            PdfDictionary span = new PdfDictionary();
            span.put(ACTUAL_TEXT, text(texts.get(i)));
            page.beginMarkedContentSequence(SPAN, span, true);
            BoxPainting.paint(page, part.box(), x + part.x(), y + part.y());
            page.endMarkedContentSequence();
        }
        page.restoreState();
    }

    private static PdfString text(String text) {
        boolean plain = text.chars().allMatch(character -> character >= ' ' && character <= '~');
        return plain ? new PdfString(text) : new PdfString(text, PdfString.TEXT_UNICODE);
    }
}
