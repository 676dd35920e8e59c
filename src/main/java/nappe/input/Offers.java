package nappe.input;

import nappe.method.Declared;
import nappe.unit.Unit;

/** What cells of a blank offer and take, by what is declared. */
final class Offers {
    private final DropDowns lists;

    Offers(DropDowns lists) {
        this.lists = lists;
    }

    /** The range with the units that will do in place of one. */
    String units(Unit unit) {
        String measured = UnitOffer.measured(unit);
        return lists.range(
                "Units of " + measured,
                UnitOffer.offered(unit).stream().map(Unit::text).sorted().toList());
    }

    void standing(BlankSheet sheet, int firstRow, int lastRow, int column) {
        sheet.offer(firstRow, lastRow, column, lists.range("Standing", Layout.STANDINGS), true);
    }

    /** Takes only what can be typed for a declared entry. */
    void entry(BlankSheet sheet, int firstRow, int lastRow, int column, Declared declared) {
        if (declared.words().isEmpty()) {
            String prompt = declared.label() + ". " + (declared.optional() ? "May stay blank. " : "") + "Write "
                    + UnitOffer.measured(declared.unit()) + ", "
                    + declared.sign().words() + ".";
            sheet.number(firstRow, lastRow, column, declared.sign(), declared.symbol(), prompt);
        } else {
            sheet.offer(firstRow, lastRow, column, lists.range(declared.symbol(), declared.words()), true);
        }
    }
}
