package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;
import nappe.calculation.Block;
import nappe.calculation.Place;
import nappe.calculation.Sheet;
import nappe.results.Results;

/** The sheets of a package as the template prints them. */
final class Leaves {
    /** A note with these words, on the sheet named Cover, stands for a clear square at the head of the cover, right. */
    private static final String SEAL_SPACE = "(space for a seal)";

    private static final String COVER = "Cover";

    private final Results results;
    private final PageSize page;
    private final Drawings drawings;
    private final Pictures pictures;

    /**
     * @param drawings takes in what is drawn in the lines of the sheets
     */
    Leaves(Results results, PageSize page, Drawings drawings, Pictures pictures) {
        this.results = results;
        this.page = page;
        this.drawings = drawings;
        this.pictures = pictures;
    }

    /** So many tables that stand in the workbook only are told one by one. */
    private static final int FEW = 4;

    List<View.Leaf> leaves() {
        return results.sheets().stream().map(this::leaf).toList();
    }

    private View.Leaf leaf(Sheet sheet) {
        Links links = new Links(results.sheets(), sheet.name());
        boolean wide = sheet.blocks().stream()
                .anyMatch(block -> block instanceof Block.Table table
                        && new TableGrid(results, links, drawings, table).isWide(page));
        boolean sealed = sheet.blocks().stream().anyMatch(block -> isSealSpace(sheet, block));
        double width = wide ? page.wide() : page.upright() - (sealed ? View.SealSpace.ROOM : 0);
        List<View.Part> parts = new ArrayList<>();
        if (sealed) {
            parts.add(new View.SealSpace());
        }
        List<Block.Heading> headings = new ArrayList<>();
        List<Block.Table> elsewhere = new ArrayList<>();
        for (Block block : sheet.blocks()) {
            if (block instanceof Block.WorkbookOnly only && headings.isEmpty()) {
                elsewhere.add(only.table());
                continue;
            }
            parts.addAll(elsewhere(sheet, elsewhere));
            elsewhere.clear();
            if (block instanceof Block.Heading heading) {
                headings.add(heading);
            } else if (!isSealSpace(sheet, block)) {
                parts.addAll(parts(sheet, links, block, headings, width));
                headings.clear();
            }
        }
        parts.addAll(elsewhere(sheet, elsewhere));
        parts.addAll(under(headings, List.of()));
        String style = (wide ? "landscape" : "portrait") + (sheet.name().equals(COVER) ? " cover" : "");
        return new View.Leaf(Links.id(sheet.number()), sheet.number(), XmlText.safe(sheet.title()), style, parts);
    }

    private List<View.Part> parts(Sheet sheet, Links links, Block block, List<Block.Heading> headings, double width) {
        List<View.Text> titles = headings.stream()
                .map(heading -> View.Text.plain("heading", heading.text()))
                .toList();
        if (block instanceof Block.Table table) {
            return List.of(new TableGrid(results, links, drawings, table).grid(titles, width));
        } else if (block instanceof Block.Lines lines) {
            List<View.Part> grids = new ArrayList<>();
            grids.add(new WorkedGrid(results, links, drawings, lines).grid(titles, width));
            grids.addAll(new CasesGrids(results, lines).grids(width));
            return grids;
        } else if (block instanceof Block.WorkbookOnly elsewhere) {
            return under(headings, elsewhere(sheet, List.of(elsewhere.table())));
        } else if (block instanceof Block.Note note) {
            return under(headings, note(note));
        } else if (block instanceof Block.Chart) {
            return under(headings, List.of());
        } else if (block instanceof Block.Figure figure) {
            return under(headings, pictures.parts(figure, width, width > page.upright()));
        }
        throw new IllegalArgumentException("unknown block " + block);
    }

    /** Headings and what follows them, held on one page. */
    private static List<View.Part> under(List<Block.Heading> headings, List<? extends View.Part> parts) {
        if (headings.isEmpty()) {
            return List.copyOf(parts);
        }
        List<View.Part> together = new ArrayList<>();
        headings.forEach(heading -> together.add(new View.Paragraph("heading", View.Text.plain("", heading.text()))));
        together.addAll(parts);
        return List.of(new View.Together(together));
    }

    private static boolean isSealSpace(Sheet sheet, Block block) {
        return sheet.name().equals(COVER)
                && block instanceof Block.Note note
                && note.text().equals(SEAL_SPACE);
    }

    private static List<View.Part> note(Block.Note note) {
        List<View.Part> paragraphs = new ArrayList<>();
        for (String line : note.text().split("\n")) {
            paragraphs.add(new View.Paragraph(note.caution() ? "warn" : "note", View.Text.of("", Labels.note(line))));
        }
        return paragraphs;
    }

    /** Where tables of the workbook stand: each by its title, or many in one line. */
    private static List<View.Part> elsewhere(Sheet sheet, List<Block.Table> tables) {
        if (tables.size() > FEW) {
            int rows = tables.stream().mapToInt(table -> table.rows().size()).sum();
            Block.Table first = tables.get(0);
            Block.Table last = tables.get(tables.size() - 1);
            return List.of(elsewhere(tables.size() + " tables of " + rows
                    + " rows in all stand in the workbook only, sheet " + sheet.name() + ", rows " + (first.row() + 1)
                    + " to " + (last.row() + 2 + last.rows().size()) + firstAndLast(tables) + "."));
        }
        List<View.Part> parts = new ArrayList<>();
        for (Block.Table table : tables) {
            int last = table.row() + 1 + table.rows().size();
            String range = new Place(sheet.name(), table.row(), 0).address() + ":"
                    + new Place(sheet.name(), last, table.columns().size() - 1).address();
            int rows = table.rows().size();
            String title = table.title().isEmpty() ? "A table of " : table.title() + ": ";
            String verb = table.title().isEmpty() || rows == 1 ? " stands" : " stand";
            parts.add(elsewhere(title + rows + (rows == 1 ? " row" : " rows") + verb + " in the workbook only, sheet "
                    + sheet.name() + ", cells " + range + "."));
        }
        return parts;
    }

    private static String firstAndLast(List<Block.Table> tables) {
        List<String> titles = tables.stream()
                .map(Block.Table::title)
                .filter(title -> !title.isEmpty())
                .toList();
        return titles.isEmpty()
                ? ""
                : ", each under its title: the first is \"" + titles.get(0) + "\", the last \""
                        + titles.get(titles.size() - 1) + "\"";
    }

    private static View.Paragraph elsewhere(String text) {
        return new View.Paragraph("elsewhere", View.Text.plain("", text));
    }
}
