package binspan.scenario;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class NearestTest {

    /**
     * Textbook distances: Levenshtein, Soviet Physics Doklady 10, 707 (1966), from memory; the first two stand in every
     * description of it. Two neighbours that change places count once, in no part of the word that is edited again.
     */
    @ParameterizedTest
    @CsvSource({
        "kitten, sitting, 3",
        "saturday, sunday, 3",
        "'', fibre, 5",
        "fibre, '', 5",
        "fiber, fibre, 1",
        "same, same, 0",
        "ab, ba, 1",
        "ca, abc, 3"
    })
    void distanceCountsInsertionsDeletionsExchangesAndSwaps(String a, String b, int distance) {
        assertThat(Nearest.distance(a, b)).isEqualTo(distance);
        assertThat(Nearest.distance(b, a)).isEqualTo(distance);
    }

    @Test
    void closestComesFirstAndEqualOnesByAlphabet() {
        assertThat(Nearest.to("lengthNn", List.of("lengthKm", "label", "lengthNm")))
                .containsExactly("lengthNm", "lengthKm");
        assertThat(Nearest.to("pat", List.of("pas", "par", "pan", "pal"))).containsExactly("pal", "pan", "par");
    }

    @Test
    void caseIsNoDifference() {
        assertThat(Nearest.to("ATTENUATIONDBPERKM", List.of("attenuationDbPerKm")))
                .containsExactly("attenuationDbPerKm");
    }

    @Test
    void nothingIsOfferedForAWordThatResemblesNone() {
        assertThat(Nearest.to("colour", List.of("windowWidthPs", "cableTemperatureStepK")))
                .isEmpty();
    }
}
