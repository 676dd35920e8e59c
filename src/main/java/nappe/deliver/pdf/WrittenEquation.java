package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import nappe.formula.FormulaException;
import nappe.formula.FormulaParser;

/** Sets what the layout wrote about a line; of a root, {@code h where Q_s = Q, in trial rows}, with both its sides. */
final class WrittenEquation {
    private static final Pattern ROOT = Pattern.compile("(\\w+) where (.+?) = (.+?)((?:, in trial rows)?)");

    private WrittenEquation() {}

    static List<Piece> pieces(String written) {
        Matcher root = ROOT.matcher(written);
        if (!root.matches()) {
            return List.of(Piece.plain(written));
        }
        try {
            List<Piece> pieces = new ArrayList<>(SymbolPrint.pieces(root.group(1)));
            pieces.add(Piece.plain(" where "));
            pieces.addAll(side(root.group(2)));
            pieces.add(Piece.plain(" = "));
            pieces.addAll(side(root.group(3)));
            pieces.add(Piece.plain(root.group(4)));
            return pieces;
        } catch (FormulaException e) {
            return List.of(Piece.plain(written));
        }
    }

    private static List<Piece> side(String formula) {
        return TypesetReading.inSymbols(FormulaParser.parse(formula)).pieces();
    }
}
