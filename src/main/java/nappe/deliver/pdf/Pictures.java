package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import nappe.calculation.Block;
import nappe.results.Bars;
import nappe.results.Curve;
import nappe.results.Drawing;
import nappe.results.Figure;
import nappe.results.Results;

/** The pictures of a package, made as its sheets are printed, by the id under which the page asks for them. */
final class Pictures {
    private static final double UPRIGHT_HEIGHT = 165;
    private static final double WIDE_HEIGHT = 95;
    private static final double CURVE_HEIGHT = 112;

    private static final Pattern SYMBOL = Pattern.compile("\\b[A-Za-z]+_\\w+");

    private final Results results;
    private final Map<String, Picture> made = new LinkedHashMap<>();

    Pictures(Results results) {
        this.results = results;
    }

    /** All that were made, by id. */
    Map<String, Picture> made() {
        return made;
    }

    /** What is printed for a figure: its pictures, and below them what they leave unsaid. */
    List<View.Part> parts(Block.Figure block, double width, boolean wide) {
        Figure figure = results.figures().get(block.key());
        double height = wide ? WIDE_HEIGHT : UPRIGHT_HEIGHT;
        List<View.Part> parts = new ArrayList<>();
        parts.add(new View.Paragraph(
                "tabletitle", View.Text.plain("", "Figure: " + (figure == null ? block.title() : figure.title()))));
        if (figure instanceof Drawing drawing) {
            parts.add(picture(DrawingPicture.of(results, drawing, width, height)));
            drawing.notes().forEach(note -> parts.add(note(note)));
        } else if (figure instanceof Curve curve) {
            parts.add(picture(CurvePicture.of(results, curve, width, Math.min(CURVE_HEIGHT, height))));
            parts.add(
                    note(
                            "Both scales are logarithmic. Circles: the flow cases. Dashed: the ends of the ranges of head and flow."));
            curve.missing().forEach(note -> parts.add(note(note)));
        } else if (figure instanceof Bars bars) {
            return bars(bars, parts, width, height);
        } else {
            parts.add(note("Nothing to draw: the figure has no values."));
        }
        return List.of(new View.Together(parts));
    }

    private List<View.Part> bars(Bars bars, List<View.Part> title, double width, double height) {
        List<View.Part> parts = new ArrayList<>();
        int most = BarsPicture.perPicture(height);
        for (int from = 0; from < bars.bars().size(); from += most) {
            int to = Math.min(bars.bars().size(), from + most);
            List<View.Part> together = new ArrayList<>(from == 0 ? title : List.of());
            together.add(
                    picture(BarsPicture.of(results, bars.title(), bars.bars().subList(from, to), width)));
            if (to == bars.bars().size()) {
                together.add(note(
                        "Grey: what is left to the limit, as a share of its scale. Hatched: what is missing. An arrow: the bar"
                                + " is longer than the figure. No bar: there is no margin,"
                                + " or it is a length."));
            }
            parts.add(new View.Together(together));
        }
        return parts;
    }

    private View.Part picture(Picture picture) {
        String id = "picture-" + (made.size() + 1);
        made.put(id, picture);
        return new View.Picture(id, XmlText.safe(picture.words()), picture.width(), picture.height());
    }

    /** A sentence, its symbols set as such. */
    private static View.Part note(String text) {
        List<Piece> pieces = new ArrayList<>();
        Matcher symbol = SYMBOL.matcher(text);
        int from = 0;
        while (symbol.find()) {
            pieces.add(Piece.plain(text.substring(from, symbol.start())));
            pieces.addAll(SymbolPrint.pieces(symbol.group()));
            from = symbol.end();
        }
        pieces.add(Piece.plain(text.substring(from)));
        return new View.Paragraph("under", View.Text.of("", pieces));
    }
}
