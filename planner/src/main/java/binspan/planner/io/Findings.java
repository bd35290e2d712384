package binspan.planner.io;

import binspan.scenario.Problem;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** What is wrong with a file, without the errors that only follow from others. */
final class Findings {
    private static final int SHOWN = 100;
    private static final int KEPT = 1000;
    private static final String[] PATH_LISTS = {"spread.", "provenance."};

    private final List<Finding> found = new ArrayList<>();
    private final Set<String> settled = new HashSet<>();
    private boolean incomplete;
    private int beyond;

    /** Adds an error about a value; that it is missing or contradicts others is then no further error. */
    void add(Place place, String path, String message) {
        add(new Finding(place, path, message));
        settle(path);
    }

    /** Adds an error. */
    void add(Finding finding) {
        if (found.size() < KEPT) {
            found.add(finding);
        } else {
            beyond++;
        }
    }

    /** Settles a path whose error stands elsewhere. */
    void settle(String path) {
        if (beyond == 0) {
            settled.add(path);
        }
    }

    /** Notes that an object or list could not be read, so that paths into it lead nowhere. */
    void incomplete() {
        incomplete = true;
    }

    /** Adds what the scenario's own rules found, placed in the file. */
    void addAll(List<Problem> problems, Node root) {
        for (Problem problem : problems) {
            if (!isSettled(problem.path()) && !leadsIntoError(problem.path(), problems)) {
                Place place = Locator.place(root, problem.path());
                add(new Finding(place, problem.path(), problem.message()));
            }
        }
    }

    private boolean isSettled(String path) {
        for (int end = path.length();
                end > 0;
                end = Math.max(path.lastIndexOf('.', end - 1), path.lastIndexOf('[', end - 1))) {
            if (settled.contains(path.substring(0, end))) {
                return true;
            }
        }
        return false;
    }

    /** Whether a path of a spread or provenance names something that is missing or unreadable itself. */
    private boolean leadsIntoError(String path, List<Problem> problems) {
        for (String list : PATH_LISTS) {
            if (path.startsWith(list)) {
                String named = path.substring(list.length());
                return incomplete || isSettled(named) || isUnder(named, problems);
            }
        }
        return false;
    }

    private static boolean isUnder(String named, List<Problem> problems) {
        for (Problem problem : problems) {
            if (!problem.path().isEmpty() && (named + ".").startsWith(problem.path() + ".")) {
                return true;
            }
        }
        return false;
    }

    boolean isEmpty() {
        return found.isEmpty();
    }

    /** The errors in the order of the file; of very many the first. */
    List<FileError> errors() {
        found.sort(Comparator.comparing(Finding::place));
        return found.stream().limit(SHOWN).map(Finding::error).toList();
    }

    /** The errors in the order of the file, one line each; of very many the first and their number. */
    List<String> lines(String file) {
        found.sort(Comparator.comparing(Finding::place));
        List<String> lines = new ArrayList<>();
        for (Finding finding : found.subList(0, Math.min(SHOWN, found.size()))) {
            lines.add(finding.line(file));
        }
        int more = found.size() + beyond - lines.size();
        if (more > 0) {
            lines.add(Printable.line(file + ": and " + more + " more errors"));
        }
        return lines;
    }
}
