package binspan.planner.io;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.io.Node.ObjectNode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class LocatorTest {
    private static final String TEXT = """
            {
              "arm": {
                "path": [ { "type": "loss" },
                  { "lossDb": 1 } ]
              },
              "spread": {
                "arm.path[0].lossDb": { "normal": 1 },
                "arm": { "normal": 2 }
              }
            }
            """;

    @ParameterizedTest
    @CsvSource({
        "'', 1:1",
        "arm, 2:3",
        "arm.path, 3:5",
        "arm.path[0], 3:15",
        "arm.path[1], 4:7",
        "arm.path[1].lossDb, 4:9",
        "arm.path[0].lossDb, 3:15",
        "arm.path[0].type.more, 3:17",
        "arm.missing, 2:10",
        "missing.path, 1:1",
        "armpath, 1:1",
        "spread.arm.path[0].lossDb, 7:5",
        "spread.arm.path[0].lossDb.normal, 7:29",
        "spread.arm.normal, 8:14",
        "spread.arm.path, 8:12"
    })
    void pathLeadsToItsFieldOrTheNearestObjectAround(String path, String place) throws SyntaxException {
        ObjectNode root = TreeReader.read(TEXT);
        assertThat(Locator.place(root, path)).hasToString(place);
    }

    @Test
    void placesSortByLineThenColumn() {
        assertThat(new Place(2, 1)).isGreaterThan(new Place(1, 9)).isLessThan(new Place(2, 10));
    }
}
