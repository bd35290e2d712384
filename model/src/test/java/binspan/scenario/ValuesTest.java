package binspan.scenario;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

final class ValuesTest {

    @Test
    void laterStatementReplacesTheEarlier() {
        Values values =
                new Values("loss").put("lossDb", 1.0).put("label", "panel").put("lossDb", 2.0);

        assertThat(values.type()).isEqualTo("loss");
        assertThat(values.asMap().keySet()).containsExactly("lossDb", "label");
        assertThat(values.get("lossDb")).isEqualTo(2.0);
        assertThat(values.text("label")).contains("panel");
        assertThat(values.text("lossDb")).isEmpty();
    }

    @Test
    void whatIsNotStatedIsEmpty() {
        Values values = new Values();

        assertThat(values.has("path")).isFalse();
        assertThat(values.get("path")).isNull();
        assertThat(values.list("path")).isEmpty();
        assertThat(values.section("analyzer").asMap()).isEmpty();
        assertThat(values.type()).isEmpty();
    }

    @Test
    void listAndSectionAreReadAsStated() {
        Values element = new Values("loss");
        Values values = new Values().put("path", List.of(element)).put("timing", element);

        assertThat(values.list("path")).containsExactly(element);
        assertThat(values.section("timing")).isSameAs(element);
    }

    @Test
    void copyStatesTheSameAndGoesItsOwnWay() {
        Values values = new Values("loss").put("lossDb", 1.0);
        Values copy = values.copy().put("label", "panel");
        values.put("lossDb", 3.0);

        assertThat(copy.type()).isEqualTo("loss");
        assertThat(copy.get("lossDb")).isEqualTo(1.0);
        assertThat(values.has("label")).isFalse();
    }
}
