package binspan.planner.io;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

final class JsonTextTest {

    @Test
    void treeIsIndentedInItsOrder() {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("b", List.of(1, "x\n", true));
        tree.put("a", Map.of("c", 0.5));
        assertThat(JsonText.of(tree)).isEqualTo("""
                {
                  "b": [ 1, "x\\n", true ],
                  "a": {
                    "c": 0.5
                  }
                }""");
    }

    @ParameterizedTest
    @CsvSource({
        "5000.0, 5000",
        "-3.0, -3",
        "0.1, 0.1",
        "1e-10, 1.0E-10",
        "1e13, 1.0E13",
        "16.97212564397033, 16.97212564397033"
    })
    void numbersReadBackAsTheyWere(double number, String text) {
        assertThat(JsonText.of(number)).isEqualTo(text);
        assertThat(Double.parseDouble(text)).isEqualTo(number);
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void numbersThatAreNotFiniteAreRefused(double number) {
        assertThatThrownBy(() -> JsonText.of(List.of(number)))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("finite");
    }

    @Test
    void otherValuesAreRefused() {
        assertThatThrownBy(() -> JsonText.of(Map.of("a", new StringBuilder("b"))))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> JsonText.of(null)).isInstanceOf(IllegalArgumentException.class);
    }
}
