package nappe.cli;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class RehearsalTest {
    @Test
    void workbook_and_pages_can_be_made_and_it_is_done_once() {
        assertThat(Rehearsal.started().outcome()).isTrue();
        assertThat(Rehearsal.started()).isSameAs(Rehearsal.started());
    }
}
