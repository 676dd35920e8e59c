package nappe.deliver.xlsx;

import nappe.calculation.Sheet;
import nappe.results.Furniture;

/**
 * The texts in the margins of a printed sheet. Head and foot may each hold 255 characters; what is long is cut, and
 * cautions that find no room are left out, since each page repeats them at its top.
 */
final class Margins {
    private static final int LONGEST = 250;
    private static final String SMALL = "&8";
    private static final int FIELD = 60;

    private final Furniture furniture;
    private final Sheet sheet;
    private final int sheets;

    Margins(Furniture furniture, Sheet sheet, int sheets) {
        this.furniture = furniture;
        this.sheet = sheet;
        this.sheets = sheets;
    }

    String headLeft() {
        return SMALL + "Project " + field(furniture.project()) + "\nCalculation " + field(furniture.number());
    }

    String headRight() {
        return SMALL + "Revision " + field(furniture.revision()) + ", " + furniture.status() + "\nSheet "
                + sheet.number() + " of " + sheets + ", page &P of &N";
    }

    String footLeft() {
        StringBuilder text = new StringBuilder(SMALL + "Input fingerprint " + field(furniture.fingerprint())
                + ", Nappe " + field(furniture.version()));
        for (String caution : furniture.cautions()) {
            String line = "\n" + doubled(caution);
            if (text.length() + line.length() < LONGEST) {
                text.append(line);
            }
        }
        return text.toString();
    }

    private static String field(String text) {
        return doubled(text.length() > FIELD ? text.substring(0, FIELD - 1) + "\u2026" : text);
    }

    /** An ampersand would be taken as a sign of its own. */
    private static String doubled(String text) {
        return text.replace("&", "&&").replace('\n', ' ');
    }
}
