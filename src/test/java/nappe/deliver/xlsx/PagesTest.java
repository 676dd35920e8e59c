package nappe.deliver.xlsx;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

class PagesTest {
    private static final Pages.Kept HEAD = new Pages.Kept(0, 3);

    private static Pages pages(int characters, int rows) {
        SheetRows sheet = new SheetRows("S");
        for (int row = 0; row < rows; row++) {
            sheet.atLeast(row, 15);
        }
        return new Pages(Sample.FURNITURE, characters, sheet);
    }

    @Test
    void narrowSheetsAreUprightAndWideOnesWide() {
        assertThat(pages(90, 10).wide()).isFalse();
        assertThat(pages(140, 10).wide()).isFalse();
        assertThat(pages(160, 10).wide()).isTrue();
    }

    @Test
    void whatIsTooWideToBeReadGoesOnPagesBesideEachOther() {
        assertThat(pages(225, 10).beside()).isEqualTo(1);
        assertThat(pages(300, 10).beside()).isEqualTo(2);
    }

    @Test
    void whatIsNearlyOnePageIsPrintedOnOne() {
        assertThat(pages(90, 30).onOne()).isFalse();
        assertThat(pages(90, 48).onOne()).isTrue();
        assertThat(pages(90, 48).ends(HEAD, List.of(new Pages.Kept(30, 47)))).isEmpty();
        assertThat(pages(90, 80).onOne()).isFalse();
    }

    @Test
    void pageEndsBeforeRowsThatBelongTogether() {
        Pages pages = pages(90, 80);
        assertThat(pages.ends(HEAD, List.of())).isEmpty();
        assertThat(pages.ends(HEAD, List.of(new Pages.Kept(30, 55)))).containsExactly(29);
        assertThat(pages.ends(HEAD, List.of(new Pages.Kept(28, 33), new Pages.Kept(30, 55))))
                .containsExactly(29);
    }

    @Test
    void whatIsLongerThanAPageIsCutWhereThePageEnds() {
        assertThat(pages(90, 200).ends(HEAD, List.of(new Pages.Kept(0, 150)))).isEmpty();
    }
}
