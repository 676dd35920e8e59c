package nappe.deliver.xlsx;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.Date;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;
import nappe.calculation.Cell;
import nappe.calculation.Place;
import nappe.calculation.Sheet;
import nappe.results.Furniture;
import nappe.results.Results;
import org.apache.poi.ooxml.POIXMLProperties;
import org.apache.poi.util.LocaleUtil;
import org.apache.poi.xssf.usermodel.XSSFName;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.openxmlformats.schemas.spreadsheetml.x2006.main.CTCalcPr;
import org.openxmlformats.schemas.spreadsheetml.x2006.main.STCalcMode;

/**
 * Results into the workbook of the package: every number that is not typed is a live formula, and beside it stands the
 * value that was computed. The same results give the same bytes in any locale and time zone.
 */
public final class XlsxDelivery {
    private static final Pattern NOT_IN_A_NAME = Pattern.compile("[\\\\/?*\\[\\]:\\p{Cntrl}]");
    private static final int LONGEST_NAME = 31;

    static {
        System.setProperty("log4j.provider", "org.apache.logging.log4j.simple.internal.SimpleProvider");
        System.setProperty("org.apache.logging.log4j.simplelog.level", "OFF");
    }

    private final Results results;
    private final XSSFWorkbook workbook;
    private final Map<String, SheetRows> parts = new LinkedHashMap<>();
    private final Set<Cell> written = new HashSet<>();

    private XlsxDelivery(Results results, XSSFWorkbook workbook) {
        this.results = results;
        this.workbook = workbook;
    }

    /**
     * The workbook.
     *
     * @throws IllegalStateException where a text, a formula or a number is none that a workbook can hold, or a cell that
     *     others refer to stands on no sheet
     */
    public static byte[] render(Results results) {
        Locale before = LocaleUtil.getUserLocale();
        LocaleUtil.setUserLocale(Locale.US);
        try (XSSFWorkbook workbook = new XSSFWorkbook()) {
            XlsxDelivery delivery = new XlsxDelivery(results, workbook);
            delivery.build();
            ByteArrayOutputStream bytes = new ByteArrayOutputStream();
            workbook.write(bytes);
            return Splice.together(bytes.toByteArray(), delivery.parts);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } finally {
            LocaleUtil.setUserLocale(before);
        }
    }

    private void build() {
        checkNames();
        properties();
        calculation();
        Styles styles = new Styles(workbook);
        SharedTexts texts = new SharedTexts(workbook);
        for (Sheet sheet : results.sheets()) {
            SheetWriter writer = new SheetWriter(results, sheet, styles, texts).write();
            XSSFSheet frame = workbook.createSheet(sheet.name());
            new SheetFrame(workbook, frame, writer, results::value)
                    .set(results.furniture(), results.sheets().size());
            parts.put(
                    frame.getPackagePart().getPartName().getName(),
                    writer.canvas().rows());
            written.addAll(writer.canvas().written());
        }
        workbook.setActiveSheet(0);
        checkNothingIsMissing();
        CellNames.of(results.sheets()).forEach(this::name);
    }

    private void checkNames() {
        Set<String> taken = new HashSet<>();
        for (Sheet sheet : results.sheets()) {
            String name = sheet.name();
            boolean fits = !name.isBlank()
                    && name.length() <= LONGEST_NAME
                    && !NOT_IN_A_NAME.matcher(name).find()
                    && !name.startsWith("'")
                    && !name.endsWith("'")
                    && !name.equalsIgnoreCase("history")
                    && taken.add(name.toLowerCase(Locale.ROOT));
            if (!fits) {
                throw new IllegalStateException("no name for a workbook's sheet, or taken: " + name);
            }
        }
    }

    private void properties() {
        Furniture furniture = results.furniture();
        POIXMLProperties properties = workbook.getProperties();
        POIXMLProperties.CoreProperties core = properties.getCoreProperties();
        Optional<Date> date = Optional.of(
                Date.from(furniture.date().atStartOfDay(ZoneOffset.UTC).toInstant()));
        core.setTitle(furniture.project() + ", calculation " + furniture.number());
        core.setSubjectProperty(furniture.subject());
        core.setCreator(furniture.firm());
        core.setLastModifiedByUser(furniture.firm());
        core.setContentStatus(furniture.status());
        core.setCreated(date);
        core.setModified(date);
        properties.getExtendedProperties().setApplication("Nappe");
        properties.getCustomProperties().addProperty("Input fingerprint", furniture.fingerprint());
        properties.getCustomProperties().addProperty("Nappe version", furniture.version());
    }

    private void calculation() {
        CTCalcPr calculation = workbook.getCTWorkbook().addNewCalcPr();
        calculation.setCalcMode(STCalcMode.AUTO);
        calculation.setIterate(false);
        calculation.setFullCalcOnLoad(true);
    }

    private void name(String name, Cell cell) {
        XSSFName defined = workbook.createName();
        defined.setNameName(name);
        Place place = cell.place();
        String sheet = "'" + place.sheet().replace("'", "''") + "'";
        defined.setRefersToFormula(sheet + "!$" + Place.letters(place.column()) + "$" + (place.row() + 1));
    }

    /** A formula that refers to a place where nothing stands would quietly count it as zero. */
    private void checkNothingIsMissing() {
        List<Cell> missing = new ArrayList<>(results.cells());
        missing.removeAll(written);
        if (!missing.isEmpty()) {
            throw new IllegalStateException("on no sheet: " + missing.subList(0, Math.min(5, missing.size())));
        }
    }
}
