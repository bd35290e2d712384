package binspan.planner.io;

import binspan.planner.io.Node.ObjectNode;
import binspan.scenario.Scenario;
import binspan.scenario.ScenarioBuilder;
import binspan.scenario.Values;
import java.io.IOException;
import java.io.InputStream;
import java.util.List;

/** Reads scenarios from files, streams and texts. */
public final class ScenarioReader {
    private ScenarioReader() {}

    /**
     * Reads a scenario file.
     *
     * @param file file name, relative to the working directory or absolute
     * @return the scenario, its defaults filled in
     * @throws InvalidScenarioException if the file is no readable scenario, with everything that is wrong in it
     */
    public static Scenario read(String file) throws InvalidScenarioException {
        return parse(FileText.of(file), file);
    }

    /**
     * The text of a scenario file as it stands, a byte order mark in front apart.
     *
     * @param file file name, relative to the working directory or absolute
     * @throws InvalidScenarioException if it is missing, a directory, unreadable, too large or not UTF-8
     */
    public static String text(String file) throws InvalidScenarioException {
        return FileText.of(file);
    }

    /**
     * Reads a scenario from a stream, to its end.
     *
     * @param in the stream, left open
     * @param name its name in messages
     * @return the scenario, its defaults filled in
     * @throws InvalidScenarioException if the stream holds no readable scenario, with everything that is wrong in it
     */
    public static Scenario read(InputStream in, String name) throws InvalidScenarioException {
        String text;
        try {
            text = FileText.of(in, name);
        } catch (IOException e) {
            throw new InvalidScenarioException(List.of(Printable.line(name + ": not readable")));
        }
        return parse(text, name);
    }

    /**
     * Reads a scenario from a text.
     *
     * @param text JSON with comments
     * @param name its name in messages
     * @return the scenario, its defaults filled in
     * @throws InvalidScenarioException if the text is no scenario, with everything that is wrong in it
     */
    public static Scenario parse(String text, String name) throws InvalidScenarioException {
        Findings findings = new Findings();
        try {
            ObjectNode root = TreeReader.read(text);
            Values stated = new ScenarioWalk(findings).scenario(root);
            ScenarioBuilder.Outcome outcome = ScenarioBuilder.build(stated);
            findings.addAll(outcome.problems(), root);
            if (findings.isEmpty()) {
                return outcome.scenario().orElseThrow();
            }
        } catch (SyntaxException e) {
            findings.add(e.finding());
        }
        throw new InvalidScenarioException(findings.lines(name), findings.errors());
    }
}
