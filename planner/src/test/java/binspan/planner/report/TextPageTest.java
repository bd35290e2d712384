package binspan.planner.report;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

final class TextPageTest {
    private final TextPage page = new TextPage(TextStyle.PLAIN);

    @Test
    void textIsBrokenBetweenWordsAtEightyColumns() {
        page.wrapped("  - ", "    ", "word ".repeat(40).strip());
        assertThat(page.toString().lines()).allSatisfy(line -> assertThat(line).hasSizeLessThanOrEqualTo(80));
        assertThat(page.toString().lines().toList())
                .hasSize(3)
                .first()
                .asString()
                .startsWith("  - word")
                .hasSize(78);
        assertThat(page.toString().lines().skip(1))
                .allSatisfy(line -> assertThat(line).startsWith("    word"));
    }

    @Test
    void percentagesStayWithTheirNumber() {
        page.wrapped("x".repeat(74) + " 12.3 % of it");
        assertThat(page.toString()).isEqualTo("x".repeat(74) + "\n12.3 % of it\n");
    }

    @Test
    void gluedBlanksAreBlanks() {
        page.wrapped("x".repeat(70) + " 400" + TextPage.GLUE + "picoseconds");
        assertThat(page.toString()).isEqualTo("x".repeat(70) + "\n400 picoseconds\n");
    }

    @Test
    void wordLongerThanTheLineStandsAlone() {
        page.wrapped("a " + "x".repeat(90) + " b");
        assertThat(page.toString()).isEqualTo("a\n" + "x".repeat(90) + "\nb\n");
    }

    @Test
    void columnsKeepAtLeastOneBlank() {
        assertThat(TextPage.right("12345", 4)).isEqualTo(" 12345");
        assertThat(TextPage.right("12", 4)).isEqualTo("  12");
        assertThat(TextPage.left("name", 6)).isEqualTo("name  ");
        assertThat(TextPage.left("much too long", 4)).isEqualTo("much");
    }

    @Test
    void blanksAtTheEndOfALineAreLeftOut() {
        page.line("text   ").line("   ").gap();
        assertThat(page.toString()).isEqualTo("text\n\n\n");
    }
}
