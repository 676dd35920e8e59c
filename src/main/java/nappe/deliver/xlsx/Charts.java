package nappe.deliver.xlsx;

import java.util.function.Function;
import nappe.calculation.Block;
import nappe.calculation.Cell;
import nappe.calculation.Run;
import nappe.formula.Value;
import nappe.results.Digits;
import org.apache.poi.xddf.usermodel.XDDFColor;
import org.apache.poi.xddf.usermodel.XDDFLineProperties;
import org.apache.poi.xddf.usermodel.XDDFNoFillProperties;
import org.apache.poi.xddf.usermodel.XDDFShapeProperties;
import org.apache.poi.xddf.usermodel.XDDFSolidFillProperties;
import org.apache.poi.xddf.usermodel.chart.AxisCrosses;
import org.apache.poi.xddf.usermodel.chart.AxisPosition;
import org.apache.poi.xddf.usermodel.chart.ChartTypes;
import org.apache.poi.xddf.usermodel.chart.LegendPosition;
import org.apache.poi.xddf.usermodel.chart.MarkerStyle;
import org.apache.poi.xddf.usermodel.chart.ScatterStyle;
import org.apache.poi.xddf.usermodel.chart.XDDFDataSourcesFactory;
import org.apache.poi.xddf.usermodel.chart.XDDFNumericalDataSource;
import org.apache.poi.xddf.usermodel.chart.XDDFScatterChartData;
import org.apache.poi.xddf.usermodel.chart.XDDFValueAxis;
import org.apache.poi.xssf.usermodel.XSSFChart;
import org.apache.poi.xssf.usermodel.XSSFClientAnchor;
import org.apache.poi.xssf.usermodel.XSSFDrawing;
import org.apache.poi.xssf.usermodel.XSSFSheet;

/**
 * Charts that refer to cells. What they show until somebody recalculates are the values that were computed: a range of
 * cells cannot be given to the library, since the cells are not in its model. Black on white; a line is told from marks
 * by its shape.
 */
final class Charts {
    /** Figures of the greatest number of an axis; one more than its steps need, for a change in the workbook. */
    private static final int FIGURES = 3;

    private static final double LINE_POINTS = 1.5;
    private static final double GRID_POINTS = 0.5;

    /** By their numbers: Gnumeric does not know colours by name. */
    private static final byte[] BLACK = {0, 0, 0};

    private static final byte[] GREY = {(byte) 0xC8, (byte) 0xC8, (byte) 0xC8};

    private final XSSFSheet sheet;
    private final Function<Cell, Value> values;
    private final int width;

    /** @param width columns of the sheet; a chart ends before the last, since its frame would count as the next */
    Charts(XSSFSheet sheet, Function<Cell, Value> values, int width) {
        this.sheet = sheet;
        this.values = values;
        this.width = width;
    }

    void draw(Block.Chart block) {
        XSSFDrawing drawing = sheet.createDrawingPatriarch();
        XSSFClientAnchor anchor =
                drawing.createAnchor(0, 0, 0, 0, 0, block.row(), width - 1, block.row() + block.rows());
        XSSFChart chart = drawing.createChart(anchor);
        chart.getGraphicFrame().setName(block.title());
        chart.setAutoTitleDeleted(true);
        chart.getOrAddLegend().setPosition(LegendPosition.BOTTOM);
        XDDFValueAxis across = axis(chart, AxisPosition.BOTTOM, block.across(), greatest(block, Block.Series::across));
        XDDFValueAxis up = axis(chart, AxisPosition.LEFT, block.up(), greatest(block, Block.Series::up));
        XDDFScatterChartData data = (XDDFScatterChartData) chart.createData(ChartTypes.SCATTER, across, up);
        data.setStyle(ScatterStyle.LINE_MARKER);
        data.setVaryColors(false);
        for (Block.Series series : block.series()) {
            series(data, series);
        }
        chart.plot(data);
        // else the axes take the many decimals of the cells
        chart.getCTChart()
                .getPlotArea()
                .getValAxList()
                .forEach(axis -> axis.getNumFmt().setSourceLinked(false));
    }

    private static XDDFValueAxis axis(XSSFChart chart, AxisPosition position, String title, double greatest) {
        XDDFValueAxis axis = chart.createValueAxis(position);
        axis.setTitle(title);
        axis.setNumberFormat(Digits.format(Digits.figures(greatest, FIGURES)));
        axis.setCrosses(AxisCrosses.MIN);
        XDDFShapeProperties grid = axis.getOrAddMajorGridProperties();
        grid.setLineProperties(line(GREY, GRID_POINTS));
        return axis;
    }

    private double greatest(Block.Chart block, Function<Block.Series, Run> along) {
        return block.series().stream()
                .flatMap(series -> along.apply(series).cells().stream())
                .mapToDouble(cell -> values.apply(cell) instanceof Value.Number number ? Math.abs(number.value()) : 0)
                .max()
                .orElse(0);
    }

    private void series(XDDFScatterChartData data, Block.Series series) {
        XDDFScatterChartData.Series drawn =
                (XDDFScatterChartData.Series) data.addSeries(source(series.across()), source(series.up()));
        drawn.setTitle(series.name(), null);
        drawn.setSmooth(false);
        if (series.isLine()) {
            drawn.setMarkerStyle(MarkerStyle.NONE);
            drawn.setLineProperties(line(BLACK, LINE_POINTS));
        } else {
            drawn.setMarkerStyle(MarkerStyle.DIAMOND);
            drawn.setLineProperties(new XDDFLineProperties(new XDDFNoFillProperties()));
            drawn.getCTScatterSer()
                    .getMarker()
                    .addNewSpPr()
                    .addNewSolidFill()
                    .addNewSrgbClr()
                    .setVal(BLACK);
        }
    }

    private static XDDFLineProperties line(byte[] colour, double points) {
        XDDFLineProperties line = new XDDFLineProperties(new XDDFSolidFillProperties(XDDFColor.from(colour)));
        line.setWidth(points);
        return line;
    }

    private XDDFNumericalDataSource<Double> source(Run run) {
        Double[] numbers = run.cells().stream()
                .map(cell -> values.apply(cell) instanceof Value.Number number ? Double.valueOf(number.value()) : null)
                .toArray(Double[]::new);
        return XDDFDataSourcesFactory.fromArray(numbers, run.fixedFrom(""));
    }
}
