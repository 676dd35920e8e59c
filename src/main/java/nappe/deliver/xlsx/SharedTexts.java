package nappe.deliver.xlsx;

import java.util.HashMap;
import java.util.Map;
import org.apache.poi.ss.usermodel.Font;
import org.apache.poi.xssf.model.SharedStringsTable;
import org.apache.poi.xssf.usermodel.XSSFFont;
import org.apache.poi.xssf.usermodel.XSSFRichTextString;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** The workbook's table of texts: each text once, symbols with real subscripts. */
final class SharedTexts {
    private final SharedStringsTable table;
    private final Map<String, Integer> texts = new HashMap<>();
    private final Map<String, Integer> symbols = new HashMap<>();
    private final XSSFFont upright;
    private final XSSFFont italic;
    private final XSSFFont below;

    SharedTexts(XSSFWorkbook workbook) {
        table = workbook.getSharedStringSource();
        upright = Styles.font(workbook, Styles.POINTS, false);
        italic = Styles.font(workbook, Styles.POINTS, false);
        italic.setItalic(true);
        below = Styles.font(workbook, Styles.POINTS, false);
        below.setTypeOffset(Font.SS_SUB);
    }

    Filling.Shared text(String text) {
        return new Filling.Shared(texts.computeIfAbsent(
                text, key -> table.addSharedStringItem(new XSSFRichTextString(Texts.content(key)))));
    }

    Filling.Shared symbol(String symbol) {
        return new Filling.Shared(symbols.computeIfAbsent(symbol, key -> table.addSharedStringItem(rich(key))));
    }

    private XSSFRichTextString rich(String symbol) {
        SymbolText parts = SymbolText.of(symbol);
        XSSFRichTextString text = new XSSFRichTextString();
        text.append(Texts.content(parts.letter()), parts.slanted() ? italic : upright);
        if (!parts.subscript().isEmpty()) {
            text.append(Texts.content(parts.subscript()), below);
        }
        return text;
    }
}
