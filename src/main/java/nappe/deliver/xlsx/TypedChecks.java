package nappe.deliver.xlsx;

import java.util.List;
import java.util.Map;
import nappe.calculation.Allowed;
import nappe.calculation.Place;
import nappe.formula.Sign;
import org.apache.poi.ss.usermodel.DataValidation;
import org.apache.poi.ss.usermodel.DataValidationConstraint;
import org.apache.poi.ss.usermodel.DataValidationConstraint.OperatorType;
import org.apache.poi.ss.usermodel.DataValidationConstraint.ValidationType;
import org.apache.poi.ss.usermodel.DataValidationHelper;
import org.apache.poi.ss.util.CellRangeAddressList;
import org.apache.poi.xssf.usermodel.XSSFSheet;

/** The checks that a spreadsheet program makes on what is typed into a sheet. */
final class TypedChecks {
    private final XSSFSheet sheet;
    private final DataValidationHelper helper;

    TypedChecks(XSSFSheet sheet) {
        this.sheet = sheet;
        this.helper = sheet.getDataValidationHelper();
    }

    void set(Map<Allowed, List<Place>> places) {
        places.forEach((allowed, where) -> {
            if (allowed instanceof Allowed.Numbers numbers) {
                check(
                        where,
                        number(numbers.sign()),
                        "A number is expected",
                        "Type a number in the unit that stands beside it: "
                                + numbers.sign().words() + ".");
            } else if (allowed instanceof Allowed.Words words) {
                String range = words.run().fixedFrom(sheet.getSheetName());
                check(
                        where,
                        helper.createFormulaListConstraint(range),
                        "Not in the cited table",
                        "Choose one of the words in " + range + ".");
            }
        });
    }

    private DataValidationConstraint number(Sign sign) {
        return switch (sign) {
            case POSITIVE ->
                helper.createNumericConstraint(ValidationType.DECIMAL, OperatorType.GREATER_THAN, "0", null);
            case NOT_NEGATIVE ->
                helper.createNumericConstraint(ValidationType.DECIMAL, OperatorType.GREATER_OR_EQUAL, "0", null);
            case ANY ->
                helper.createNumericConstraint(ValidationType.DECIMAL, OperatorType.BETWEEN, "-1E+300", "1E+300");
        };
    }

    private void check(List<Place> places, DataValidationConstraint constraint, String title, String text) {
        CellRangeAddressList addresses = new CellRangeAddressList();
        places.forEach(
                place -> addresses.addCellRangeAddress(place.row(), place.column(), place.row(), place.column()));
        DataValidation validation = helper.createValidation(constraint, addresses);
        validation.setErrorStyle(DataValidation.ErrorStyle.STOP);
        validation.setShowErrorBox(true);
        // its name is the wrong way round: this shows the arrow
        validation.setSuppressDropDownArrow(true);
        validation.createErrorBox(title, text);
        sheet.addValidationData(validation);
    }
}
