package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;

/** The rows of a choice: values with their conditions beside them, or below where the line is too narrow. */
final class Cases {
    private final Type type;
    private final double width;
    private final List<BoxRow> values;
    private final List<BoxRow> conditions;

    Cases(EquationReading reading, List<BoxRow> values, List<BoxRow> conditions) {
        this.type = reading.type();
        this.width = reading.width();
        this.values = values;
        this.conditions = conditions;
    }

    Box box() {
        double column =
                values.stream().mapToDouble(run -> run.box().width()).max().orElse(0) + 1.1 * type.size();
        double room = width - column;
        boolean beside = room >= 0.4 * width
                || conditions.stream().allMatch(run -> run.box().width() <= room);
        List<Box> rows = new ArrayList<>();
        for (int i = 0; i < values.size(); i++) {
            rows.add(beside ? beside(i, column, room) : below(i));
        }
        return Box.column(rows, 1.35 * type.size(), 0.45 * type.size());
    }

    private Box beside(int row, double column, double room) {
        Box condition = LineEnds.broken(conditions.get(row), room, type, type.size());
        return Box.holding(0, List.of(new Box.Part(values.get(row).box(), 0, 0), new Box.Part(condition, column, 0)));
    }

    private Box below(int row) {
        double indent = 1.5 * type.size();
        Box value = LineEnds.broken(values.get(row), width, type, type.size());
        Box condition = LineEnds.broken(conditions.get(row), width - indent, type, type.size());
        return Box.column(List.of(value, condition), List.of(0.0, indent), 1.25 * type.size(), 0.2 * type.size());
    }
}
