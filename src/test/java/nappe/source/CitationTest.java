package nappe.source;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class CitationTest {
    private static final Publication BOOK = new Publication("INV", "An invented book", false);

    @Test
    void aCitationShowsKeyAndPlaceAndWhetherItIsFromMemory() {
        assertThat(new Citation(BOOK, "ch. 8", true).shown()).isEqualTo("INV ch. 8 (from memory)");
        assertThat(new Citation(BOOK, "", false).shown()).isEqualTo("INV");
    }
}
