package nappe.deliver.pdf;

import com.lowagie.text.DocumentException;
import com.lowagie.text.pdf.BaseFont;
import java.io.FileNotFoundException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.security.SecureRandom;

/** The bundled typefaces; nothing is taken from the machine. Loaded once, since loading is slow. */
final class Typefaces {
    static final BaseFont REGULAR = load("SourceSans3-Regular");
    static final BaseFont ITALIC = load("SourceSans3-Italic");
    static final BaseFont BOLD = load("SourceSans3-Bold");

    /** For what the text faces lack. */
    static final BaseFont SYMBOLS = load("NotoSansMath-Regular");

    /** Printed in place of a character that no face has. */
    static final int BOX = 0x25A1;

    private static final double POINTS_PER_MM = 72 / 25.4;

    private Typefaces() {}

    private static BaseFont load(String name) {
        String path = "/fonts/" + name + ".ttf";
        try (InputStream in = Typefaces.class.getResourceAsStream(path)) {
            if (in == null) {
                throw new FileNotFoundException("the class path has no " + path);
            }
            BaseFont font = BaseFont.createFont(
                    name + ".ttf", BaseFont.IDENTITY_H, BaseFont.EMBEDDED, false, in.readAllBytes(), null);
            font.setSecureRandom(new FixedTag(name));
            font.setIncludeCidSet(false);
            return font;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (DocumentException e) {
            throw new IllegalStateException(path, e);
        }
    }

    /** The face that has the character: the one asked for, then the symbols. */
    static BaseFont faceFor(int character, BaseFont asked) {
        return !isPrinted(character) || asked.charExists(character) || !SYMBOLS.charExists(character) ? asked : SYMBOLS;
    }

    static boolean isMissing(int character, BaseFont asked) {
        return isPrinted(character) && !asked.charExists(character) && !SYMBOLS.charExists(character);
    }

    private static boolean isPrinted(int character) {
        return !Character.isISOControl(character) && character != '\u00a0';
    }

    static double points(double mm) {
        return mm * POINTS_PER_MM;
    }

    /** The width of a text in mm at a size in points. */
    static double width(String text, BaseFont face, double size) {
        double points = 0;
        for (int at = 0; at < text.length(); at += Character.charCount(text.codePointAt(at))) {
            int character = text.codePointAt(at);
            int shown = isMissing(character, face) ? BOX : character;
            points += faceFor(shown, face).getWidthPoint(new String(Character.toChars(shown)), (float) size);
        }
        return points / POINTS_PER_MM;
    }

    /** Gives the tag of an embedded subset the same six letters each time, so that the same input gives the same bytes. */
    private static final class FixedTag extends SecureRandom {
        private static final long serialVersionUID = 1L;
        private final String letters;
        private int at;

        FixedTag(String name) {
            this.letters = name.replaceAll("[^A-Za-z]", "").toUpperCase(java.util.Locale.ROOT);
        }

        /** Six letters from the end of the name, then the same six again. */
        @Override
        public double nextDouble() {
            char letter = letters.charAt(letters.length() - 6 + at++ % 6);
            return (letter - 'A' + 0.5) / 26;
        }
    }
}
