package binspan.planner.cli;

import binspan.planner.io.JsonText;
import binspan.planner.io.Preset;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** The command {@code binspan list}. */
@Command(
        name = "list",
        mixinStandardHelpOptions = true,
        versionProvider = VersionLine.class,
        header = "Lists what there is to choose from.",
        description = "Fibre and detector classes with their values and sources, starter scenarios,"
                + " and every parameter of a scenario.",
        footer = {
            "",
            "Examples:",
            "  binspan list fibres",
            "  binspan list detectors --json",
            "  binspan list parameters | grep -A 1 jitter"
        })
final class ListCommand implements Callable<Integer> {
    private final Console console;

    @Parameters(
            paramLabel = "TOPIC",
            completionCandidates = Names.class,
            description = "What to list: ${COMPLETION-CANDIDATES}.")
    private String topic;

    @Option(names = "--json", description = "Print the list as JSON.")
    private boolean json;

    /** The topics, for completion. */
    static final class Names extends ArrayList<String> {
        private static final long serialVersionUID = 1L;

        Names() {
            super(List.of("fibres", "detectors", "presets", "parameters"));
        }
    }

    ListCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() throws UsageException {
        console.out().print(json ? JsonText.of(rows()) + "\n" : text());
        return ExitStatus.MET;
    }

    private String text() throws UsageException {
        return switch (topic) {
            case "fibres" -> FibreCatalogue.text();
            case "detectors" -> DetectorCatalogue.text();
            case "presets" -> presets();
            case "parameters" -> ParameterCatalogue.text();
            default -> throw UsageException.unknown("topic", topic, new Names());
        };
    }

    private List<Map<String, Object>> rows() throws UsageException {
        return switch (topic) {
            case "fibres" -> FibreCatalogue.rows();
            case "detectors" -> DetectorCatalogue.rows();
            case "presets" -> presetRows();
            case "parameters" -> ParameterCatalogue.rows();
            default -> throw UsageException.unknown("topic", topic, new Names());
        };
    }

    private static String presets() {
        StringBuilder text = new StringBuilder();
        for (Preset preset : Preset.values()) {
            text.append(String.format("%-12s  %s\n", preset.text(), preset.summary()));
        }
        return text.append("\nbinspan new PRESET writes one of them.\n").toString();
    }

    private static List<Map<String, Object>> presetRows() {
        List<Map<String, Object>> rows = new ArrayList<>();
        for (Preset preset : Preset.values()) {
            Map<String, Object> row = new LinkedHashMap<>();
            row.put("preset", preset.text());
            row.put("meaning", preset.summary());
            rows.add(row);
        }
        return rows;
    }
}
