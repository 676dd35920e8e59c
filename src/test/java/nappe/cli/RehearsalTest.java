package nappe.cli;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class RehearsalTest {
    @Test
    void workbook_and_pages_can_be_made_and_it_is_done_once() {
        assertThat(Rehearsal.ofPages().outcome()).isTrue();
        assertThat(Rehearsal.ofWorkbook().outcome()).isTrue();
        assertThat(Rehearsal.ofPages()).isSameAs(Rehearsal.ofPages());
    }
}
