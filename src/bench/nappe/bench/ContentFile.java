package nappe.bench;

import java.io.BufferedInputStream;
import java.io.BufferedOutputStream;
import java.io.DataInputStream;
import java.io.DataOutputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** {@link Content} in a file that is read in next to no time. */
final class ContentFile {
    private ContentFile() {}

    private interface Write<T> {
        void one(T item) throws IOException;
    }

    private interface Read<T> {
        T one() throws IOException;
    }

    private static <T> void all(DataOutputStream out, List<T> items, Write<T> write) throws IOException {
        out.writeInt(items.size());
        for (T item : items) {
            write.one(item);
        }
    }

    private static <T> List<T> all(DataInputStream in, Read<T> read) throws IOException {
        int count = in.readInt();
        List<T> items = new ArrayList<>(count);
        for (int i = 0; i < count; i++) {
            items.add(read.one());
        }
        return items;
    }

    private static void numbers(DataOutputStream out, float[] numbers) throws IOException {
        out.writeInt(numbers.length);
        for (float number : numbers) {
            out.writeFloat(number);
        }
    }

    private static float[] numbers(DataInputStream in) throws IOException {
        float[] numbers = new float[in.readInt()];
        for (int i = 0; i < numbers.length; i++) {
            numbers[i] = in.readFloat();
        }
        return numbers;
    }

    static void save(Content content, Path file) throws IOException {
        try (DataOutputStream out = new DataOutputStream(new BufferedOutputStream(Files.newOutputStream(file)))) {
            out.writeInt(content.styles());
            all(out, content.sheets(), sheet -> {
                out.writeUTF(sheet.name());
                all(out, sheet.cells(), cell -> {
                    out.writeInt(cell.row());
                    out.writeInt(cell.column());
                    out.writeInt(cell.style());
                    out.writeUTF(cell.formula());
                    out.writeBoolean(cell.text() != null);
                    out.writeUTF(cell.text() == null ? "" : cell.text());
                    out.writeDouble(cell.number());
                    out.writeBoolean(cell.blank());
                });
                all(out, sheet.links(), link -> {
                    out.writeInt(link.row());
                    out.writeInt(link.column());
                    out.writeUTF(link.target());
                });
                all(out, sheet.merged(), out::writeUTF);
                all(out, sheet.widths(), out::writeInt);
                all(out, sheet.heights(), out::writeFloat);
            });
            all(out, content.names(), name -> {
                out.writeUTF(name.name());
                out.writeUTF(name.target());
            });
            all(out, content.pages(), page -> {
                out.writeFloat(page.width());
                out.writeFloat(page.height());
                all(out, page.words(), word -> {
                    out.writeFloat(word.x());
                    out.writeFloat(word.y());
                    out.writeFloat(word.size());
                    out.writeUTF(word.text());
                });
                all(out, page.marks(), mark -> {
                    out.writeUTF(mark.operator());
                    numbers(out, mark.numbers());
                });
                all(out, page.links(), corners -> numbers(out, corners));
            });
            all(out, content.bookmarks(), out::writeUTF);
        }
    }

    static Content load(Path file) throws IOException {
        try (DataInputStream in = new DataInputStream(new BufferedInputStream(Files.newInputStream(file)))) {
            return new Content(
                    in.readInt(),
                    all(in, () -> sheet(in)),
                    all(in, () -> new Content.Name(in.readUTF(), in.readUTF())),
                    all(in, () -> page(in)),
                    all(in, in::readUTF));
        }
    }

    private static Content.Sheet sheet(DataInputStream in) throws IOException {
        return new Content.Sheet(
                in.readUTF(),
                all(in, () -> cell(in)),
                all(in, () -> new Content.Link(in.readInt(), in.readInt(), in.readUTF())),
                all(in, in::readUTF),
                all(in, in::readInt),
                all(in, in::readFloat));
    }

    private static Content.Filled cell(DataInputStream in) throws IOException {
        int row = in.readInt();
        int column = in.readInt();
        int style = in.readInt();
        String formula = in.readUTF();
        boolean words = in.readBoolean();
        String text = in.readUTF();
        return new Content.Filled(row, column, style, formula, words ? text : null, in.readDouble(), in.readBoolean());
    }

    private static Content.Page page(DataInputStream in) throws IOException {
        return new Content.Page(
                in.readFloat(),
                in.readFloat(),
                all(in, () -> new Content.Word(in.readFloat(), in.readFloat(), in.readFloat(), in.readUTF())),
                all(in, () -> new Content.Mark(in.readUTF(), numbers(in))),
                all(in, () -> numbers(in)));
    }
}
