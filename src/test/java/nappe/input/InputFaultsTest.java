package nappe.input;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.nio.file.Path;
import org.apache.poi.ss.usermodel.FormulaError;
import org.apache.poi.ss.util.CellRangeAddress;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What is typed wrong is told at its cell, with the remedy; all of it at once. */
class InputFaultsTest {
    @TempDir
    Path folder;

    private String faults(Filler filler) throws IOException {
        Path file = filler.save(folder.resolve("headworks.xlsx"));
        InputRefused refused = catchThrowableOfType(InputRefused.class, () -> InputReader.read(file, Samples.METHODS));
        assertThat(refused).as("refused").isNotNull();
        return refused.getMessage();
    }

    private String fault(String sheet, String cell, Object value) throws IOException {
        return faults(Samples.filled().set(sheet, cell, value));
    }

    @Test
    void decimalCommaIsNotANumber() throws IOException {
        assertThat(fault("Flows", "D10", "12,5"))
                .isEqualTo("headworks.xlsx, sheet Flows, cell D10: \"12,5\" is not a number; write 12.5 "
                        + "(fault: number-expected)");
    }

    @Test
    void numberStoredAsTextIsNotANumber() throws IOException {
        assertThat(fault("F1", "C9", "48"))
                .isEqualTo("headworks.xlsx, sheet F1, cell C9: \"48\" is not a number; it is stored as text; set the "
                        + "format of the cell to a plain number and write 48 again (fault: number-expected)");
    }

    @Test
    void missingEntryIsTold() throws IOException {
        assertThat(fault("F1", "C9", ""))
                .isEqualTo("headworks.xlsx, sheet F1, cell C9: D (width of the approach) is missing; write a number, "
                        + "greater than zero, of m, ft, mm, cm, km, in, yd or mi (fault: entry-missing)");
    }

    @Test
    void unknownUnitIsTold() throws IOException {
        assertThat(fault("Flows", "E10", "mgd"))
                .isEqualTo("headworks.xlsx, sheet Flows, cell E10: \"mgd\" is not a known unit; did you mean MGD? "
                        + "(fault: unit-unknown)");
        assertThat(fault("F1", "D9", "m^99999999999")).contains("(fault: unit-unknown)");
        assertThat(fault("F1", "D9", "m^(1/0)")).contains("(fault: unit-unknown)");
    }

    @Test
    void unitOfAnotherDimensionIsTold() throws IOException {
        assertThat(fault("F1", "D9", "psi"))
                .isEqualTo(
                        "headworks.xlsx, sheet F1, cell D9: \"psi\" stands for a pressure, but D (width of the "
                                + "approach) asks for a length; write one such as m, ft, mm, cm, km, in, yd or mi (fault: unit-dimension)");
    }

    @Test
    void angleIsNoPureNumber() throws IOException {
        assertThat(fault("R1", "D8", "deg"))
                .isEqualTo("headworks.xlsx, sheet R1, cell D8: \"deg\" stands for an angle, but S_0 (slope of the "
                        + "invert) asks for a pure number; write one such as 1 or % (fault: unit-dimension)");
    }

    @Test
    void pureNumberUnitTypedAsNumberIsTaken() throws IOException {
        Path file = Samples.filled().set("R1", "D8", 1).save(folder.resolve("headworks.xlsx"));
        assertThat(InputReader.read(file, Samples.METHODS)).isNotNull();
    }

    @Test
    void choiceOutsideTheListIsTold() throws IOException {
        assertThat(fault("F1", "C7", "12 ft"))
                .isEqualTo(
                        "headworks.xlsx, sheet F1, cell C7: \"12 ft\" is not a choice for size (nominal size); choose "
                                + "1, 2 or 3 ft (fault: word-unknown)");
    }

    @Test
    void choiceTypedAsNumberIsTaken() throws IOException {
        Path file = Samples.filled().set("F1", "C7", 2).save(folder.resolve("headworks.xlsx"));
        assertThat(InputReader.read(file, Samples.METHODS)
                        .elements()
                        .get(0)
                        .typed()
                        .get("size")
                        .value())
                .isEqualTo(nappe.formula.Value.word("2"));
    }

    @Test
    void caseNameOrTagGivenTwiceIsTold() throws IOException {
        assertThat(fault("Flows", "A11", "PEAK  hour"))
                .isEqualTo("headworks.xlsx, sheet Flows, cell A11: \"PEAK hour\" is the name of the case in A10 too; "
                        + "give each case its own (fault: case-twice)");
        assertThat(fault("Project", "A27", "F1"))
                .contains("cell A27: the tag F1 stands here a second time; give each "
                        + "element its own (fault: tag-twice)");
    }

    @Test
    void sameFlowTwiceIsLegal() throws IOException {
        Path file = Samples.filled().save(folder.resolve("headworks.xlsx"));
        var cases = InputReader.read(file, Samples.METHODS).cases();
        assertThat(cases.get(1).flow().value()).isEqualTo(cases.get(2).flow().value());
    }

    @Test
    void impossibleSignIsTold() throws IOException {
        assertThat(fault("F1", "C9", -48))
                .isEqualTo(
                        "headworks.xlsx, sheet F1, cell C9: -48 can't be D (width of the approach); it must be greater "
                                + "than zero (fault: sign-impossible)");
        assertThat(fault("Flows", "D9", 0)).contains("0 can't be the flow; it must be greater than zero");
        assertThat(fault("R1", "C7", 1e200)).contains("(fault: number-out-of-reach)");
    }

    @Test
    void formulaWithoutItsValueIsTold() throws IOException {
        Filler filler = Samples.filled();
        filler.cell("R1", "C7").setCellFormula("100+20");
        String plain = faults(filler.change(
                w -> w.getSheet("R1").getRow(6).getCell(2).getCTCell().unsetV()));
        assertThat(plain)
                .isEqualTo(
                        "headworks.xlsx, sheet R1, cell C7: the formula here was saved without its value, so L (length) "
                                + "is not known; open the workbook in a spreadsheet program and save it, or write the value "
                                + "(fault: formula-without-value)");
    }

    @Test
    void errorValueIsTold() throws IOException {
        Filler filler = Samples.filled();
        filler.cell("R1", "C7").setCellErrorValue(FormulaError.DIV0.getCode());
        assertThat(faults(filler))
                .isEqualTo("headworks.xlsx, sheet R1, cell C7: the cell gives the error \"#DIV/0!\" where L (length) "
                        + "belongs; mend or replace it (fault: cell-error)");
    }

    @Test
    void formulaThatGivesTextIsTold() throws IOException {
        Filler filler = Samples.filled();
        filler.cell("R1", "C7").setCellFormula("\"12\"&\"0\"");
        filler.set("R1", "C7", "120");
        assertThat(faults(filler))
                .isEqualTo(
                        "headworks.xlsx, sheet R1, cell C7: the formula here gives \"120\", which is not a number; let "
                                + "it give a number (fault: number-expected)");
    }

    @Test
    void dateWhereANumberBelongsIsTold() throws IOException {
        assertThat(faults(Samples.filled().set("R1", "C7", 45000).format("R1", "C7", "d/m/yy")))
                .isEqualTo("headworks.xlsx, sheet R1, cell C7: a date or time stands where L (length) belongs; set the "
                        + "format of the cell to a plain number and write the number again (fault: date-in-number)");
    }

    @Test
    void percentFormatIsTold() throws IOException {
        assertThat(faults(Samples.filled().set("R1", "C8", 0.05).format("R1", "C8", "0%")))
                .isEqualTo(
                        "headworks.xlsx, sheet R1, cell C8: the cell shows 5 % and holds 0.05; set its format to a plain "
                                + "number, then write 5 with the unit % or 0.05 with the unit 1 (fault: percent-format)");
    }

    @Test
    void formatThatShowsAUnitIsTold() throws IOException {
        assertThat(faults(Samples.filled().format("R1", "C7", "0.00 \"mm\"")))
                .isEqualTo(
                        "headworks.xlsx, sheet R1, cell C7: the format of the cell shows words or a scale beside the "
                                + "number 120; set it to a plain number and give the unit in the unit column "
                                + "(fault: format-with-words)");
    }

    @Test
    void unknownSymbolAndMissingRowAreTold() throws IOException {
        assertThat(fault("F1", "A10", "d_x"))
                .isEqualTo(
                        "headworks.xlsx, sheet F1, cell A10: \"d_x\" is not asked for by the method trough; did you mean "
                                + "d? (fault: symbol-unknown)");
        assertThat(fault("F1", "A13", "q"))
                .isEqualTo(
                        "headworks.xlsx, sheet F1, cell A13: \"q\" is not asked for by the method trough; it asks for "
                                + "size, z_f, D, d, u_r, theta (fault: symbol-unknown)");
        assertThat(fault("F1", "A13", "h_g"))
                .isEqualTo(
                        "headworks.xlsx, sheet F1, cell A13: h_g is typed for each case on the sheet Flows, not here "
                                + "(fault: symbol-per-case)");
        assertThat(faults(Samples.filled()
                        .change(w -> w.getSheet("F1").removeRow(w.getSheet("F1").getRow(9)))))
                .isEqualTo(
                        "headworks.xlsx, sheet F1: there is no row for d (depth of the recess); write that symbol in the "
                                + "column Symbol and leave its value blank (fault: row-missing)");
    }

    @Test
    void unknownMethodIsToldAndItsSheetIsNotComplainedAbout() throws IOException {
        assertThat(fault("Project", "B26", "trouhg"))
                .isEqualTo("headworks.xlsx, sheet Project, cell B26: \"trouhg\" is not a known method; did you mean "
                        + "trough? (fault: method-unknown)");
    }

    @Test
    void tagThatCantBeOneIsTold() throws IOException {
        assertThat(fault("Project", "A26", "f 1"))
                .contains("\"f 1\" is not a tag; write one capital letter and up to "
                        + "seven capitals or digits: F1 (fault: tag-odd)");
        assertThat(fault("Project", "A26", "FLOWS"))
                .contains("\"FLOWS\" can't be a tag, because a sheet has that name");
    }

    @Test
    void noCasesIsTold() throws IOException {
        Filler filler = Samples.filled().project("Case worked in full", "");
        for (int row = 9; row <= 11; row++) {
            for (String column : new String[] {"A", "B", "C", "D", "F", "H", "I", "J", "L"}) {
                filler.cell("Flows", column + row).setBlank();
            }
        }
        assertThat(faults(filler))
                .isEqualTo(
                        "headworks.xlsx, sheet Flows: there is no flow case; write name, flow and unit of at least one "
                                + "below the head row (fault: cases-missing)");
    }

    @Test
    void entryThatCantBeSeenIsTold() throws IOException {
        assertThat(faults(Samples.filled()
                        .change(w -> w.getSheet("F1").addMergedRegion(CellRangeAddress.valueOf("E8:E9")))))
                .isEqualTo(
                        "headworks.xlsx, sheet F1, cell E9: \"invented drawing 1\" can't be seen: it is covered by the "
                                + "merged cells E8:E9; split them and check what stands there (fault: entry-unseen)");
        assertThat(faults(
                        Samples.filled().change(w -> w.getSheet("F1").getRow(8).setZeroHeight(true))))
                .contains("cell C9: 48 can't be seen: row 9 is hidden; show it");
        assertThat(faults(Samples.filled().change(w -> w.getSheet("F1").setColumnHidden(4, true))))
                .contains("cell E7: \"invented\" can't be seen: its column is hidden; show it");
        assertThat(faults(Samples.filled().change(w -> w.setSheetHidden(w.getSheetIndex("F1"), true))))
                .isEqualTo("headworks.xlsx, sheet F1: the sheet is hidden; show it and check what stands there "
                        + "(fault: sheet-hidden)");
    }

    @Test
    void hiddenRowOfABlankEntryIsLegal() throws IOException {
        Path file = Samples.filled()
                .change(w -> w.getSheet("F1").getRow(9).setZeroHeight(true))
                .save(folder.resolve("headworks.xlsx"));
        assertThat(InputReader.read(file, Samples.METHODS)).isNotNull();
    }

    @Test
    void oddCharactersAndLongTextsAreTold() throws IOException {
        assertThat(fault("Flows", "A10", "Peak\u200Bhour"))
                .contains("the name of the case holds a character that can't be seen or printed: \"Peak<U+200B>hour\"; "
                        + "type it again without U+200B (fault: odd-character)");
        assertThat(fault("References", "A7", "a_x0007_b")).contains("<U+0007>").contains("(fault: odd-character)");
        assertThat(fault("References", "A7", "a\u202Eb")).contains("(fault: odd-character)");
        assertThat(fault("References", "A7", "x".repeat(2001)))
                .isEqualTo(
                        "headworks.xlsx, sheet References, cell A7: the reference has 2001 characters; at most 2000 can "
                                + "be printed, shorten it (fault: text-too-long)");
        assertThat(fault("Flows", "A9", "y".repeat(41))).contains("has 41 characters; at most 40 can be printed");
    }

    @Test
    void missingSheetHeadOrLabelIsTold() throws IOException {
        assertThat(faults(Samples.filled().change(w -> w.removeSheetAt(w.getSheetIndex("Demands")))))
                .isEqualTo(
                        "headworks.xlsx, sheet Demands: there is no sheet of this name; it was removed or renamed, name "
                                + "it Demands again or start from a new blank (fault: sheet-missing)");
        assertThat(fault("F1", "C6", "Size"))
                .isEqualTo(
                        "headworks.xlsx, sheet F1: the head row 6 has no column \"Value\"; write that word above its "
                                + "column (fault: head-word-missing)");
        assertThat(fault("F1", "G6", "value")).contains("cell G6: the head row has two columns \"Value\"; remove one");
        assertThat(fault("References", "A6", "Books"))
                .isEqualTo(
                        "headworks.xlsx, sheet References: there is no head row; write a row with the words Reference "
                                + "above the entries (fault: head-row-missing)");
        assertThat(fault("Project", "A15", "System"))
                .isEqualTo(
                        "headworks.xlsx, sheet Project: there is no row labelled \"Unit system\"; write that label and "
                                + "its value above the list of elements (fault: label-missing)");
    }

    @Test
    void sheetOfNoElementIsToldAndOthersAreLegal() throws IOException {
        assertThat(faults(Samples.filled().change(w -> w.cloneSheet(w.getSheetIndex("R1"), "R2"))))
                .isEqualTo(
                        "headworks.xlsx, sheet R2: the sheet has entries, but no element has this tag; name it in the "
                                + "list of elements on the sheet Project, or remove the sheet (fault: sheet-stray)");
        Path file = Samples.filled()
                .change(w -> w.createSheet("Scratch").createRow(0).createCell(0).setCellValue("my sums"))
                .save(folder.resolve("headworks.xlsx"));
        assertThat(InputReader.read(file, Samples.METHODS)).isNotNull();
    }

    @Test
    void realDateIsTakenAndAnAmbiguousOneIsNot() throws IOException {
        Path file = Samples.filled()
                .set("Project", "B13", 47514)
                .format("Project", "B13", "d/m/yy")
                .save(folder.resolve("headworks.xlsx"));
        assertThat(InputReader.read(file, Samples.METHODS).project().date()).isEqualTo("2030-01-31");
        assertThat(fault("Project", "B13", "3/4/2030"))
                .isEqualTo(
                        "headworks.xlsx, sheet Project, cell B13: \"3/4/2030\" is not a date for Revision date; write "
                                + "year-month-day as 2030-01-31 (fault: date-expected)");
        assertThat(fault("Project", "B13", 47514)).contains("47514 is not a date");
    }

    @Test
    void demandOfAnUnknownElementIsTold() throws IOException {
        assertThat(fault("Demands", "A8", "F7"))
                .isEqualTo("headworks.xlsx, sheet Demands, cell A8: \"F7\" is the tag of no element; write F1 or R1 "
                        + "(fault: tag-unknown)");
    }

    @Test
    void caseWorkedInFullMustBeACase() throws IOException {
        assertThat(faults(Samples.filled().project("Case worked in full", "Peek hour")))
                .isEqualTo(
                        "headworks.xlsx, sheet Project, cell B20: \"Peek hour\" is not a case of the sheet Flows; did you "
                                + "mean Peak hour? (fault: case-unknown)");
    }

    @Test
    void allFaultsComeAtOnceSheetBySheet() throws IOException {
        Filler filler = Samples.filled()
                .set("F1", "D9", "psi")
                .set("F1", "C8", "99.5 ft")
                .set("Project", "B14", "draft")
                .set("Flows", "J9", "")
                .set("Flows", "D9", "1,500");
        assertThat(faults(filler)).isEqualTo("""
                        headworks.xlsx, sheet Project, cell B14: "draft" is not a choice for Status; choose preliminary, for checking, issued or superseded (fault: word-unknown)
                        headworks.xlsx, sheet Flows, cell D9: "1,500" is not a number; write 1500 or 1.500, whichever is meant (fault: number-expected)
                        headworks.xlsx, sheet Flows, cell J9: the standing is missing; choose known or assumed (fault: entry-missing)
                        headworks.xlsx, sheet F1, cell C8: "99.5 ft" is not a number; write 99.5 here and "ft" as its unit (fault: number-expected)
                        headworks.xlsx, sheet F1, cell D9: "psi" stands for a pressure, but D (width of the approach) asks for a length; write one such as m, ft, mm, cm, km, in, yd or mi (fault: unit-dimension)""");
    }

    @Test
    void untouchedBlankTellsWhatIsOwed() throws IOException {
        String faults = faults(new Filler(Samples.blank()));
        assertThat(faults).contains("Calculation number is missing").contains("(fault: cases-missing)");
        assertThat(faults.lines()).allMatch(line -> line.endsWith("-missing)"));
    }

    @Test
    void fiveHundredFaultsAreEnough() throws IOException {
        Filler filler = Samples.filled();
        for (int row = 10; row < 700; row++) {
            filler.set("References", "A" + row, "x".repeat(2001));
        }
        Path file = filler.save(folder.resolve("headworks.xlsx"));
        assertThatThrownBy(() -> InputReader.read(file, Samples.METHODS))
                .hasMessageEndingWith(
                        "headworks.xlsx: more than 499 faults; the rest was not read (fault: too-many-faults)");
    }
}
