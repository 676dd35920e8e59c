package nappe.deliver.pdf;

import java.util.ArrayList;
import java.util.List;

/**
 * Gathers the pieces of a line into words, so that a line never ends between a symbol and its subscript or before a
 * closing bracket: the renderer may break between any two pieces.
 */
final class Words {
    private final List<View.Word> words = new ArrayList<>();
    private final List<Piece> word = new ArrayList<>();
    private final List<Piece> loose = new ArrayList<>();

    private Words() {}

    static List<View.Word> of(List<Piece> pieces) {
        if (pieces.size() < 2) {
            return List.of(new View.Word(false, pieces));
        }
        Words words = new Words();
        pieces.forEach(words::add);
        words.endWord();
        words.endLoose();
        return words.words;
    }

    private void add(Piece piece) {
        String text = piece.text();
        int from = 0;
        for (int space = text.indexOf(' '); space >= 0; space = text.indexOf(' ', from)) {
            join(word, with(piece, text.substring(from, space)));
            endWord();
            join(loose, with(piece, " "));
            from = space + 1;
        }
        join(word, with(piece, text.substring(from)));
    }

    private void endWord() {
        if (word.size() > 1) {
            endLoose();
            words.add(new View.Word(true, List.copyOf(word)));
        } else {
            word.forEach(piece -> join(loose, piece));
        }
        word.clear();
    }

    private void endLoose() {
        if (!loose.isEmpty()) {
            words.add(new View.Word(false, List.copyOf(loose)));
            loose.clear();
        }
    }

    private static Piece with(Piece piece, String text) {
        return new Piece(text, piece.face(), piece.shift());
    }

    private static void join(List<Piece> pieces, Piece next) {
        if (next.text().isEmpty()) {
            return;
        }
        int last = pieces.size() - 1;
        if (last >= 0 && pieces.get(last).style().equals(next.style())) {
            pieces.set(last, with(next, pieces.get(last).text() + next.text()));
        } else {
            pieces.add(next);
        }
    }
}
