package binspan.planner.document;

import java.util.List;
import java.util.stream.Collectors;

/** An edit that would leave no valid scenario. */
public final class RefusedEditException extends Exception {
    private static final long serialVersionUID = 1L;

    private final transient List<EditProblem> problems;

    RefusedEditException(List<EditProblem> problems) {
        super(problems.stream()
                .map(problem ->
                        problem.path().isEmpty() ? problem.message() : problem.path() + ": " + problem.message())
                .collect(Collectors.joining("\n")));
        this.problems = List.copyOf(problems);
    }

    RefusedEditException(String path, String message) {
        this(List.of(new EditProblem(path, message)));
    }

    /** All that is wrong with it, in the order of the file; at least one. */
    public List<EditProblem> problems() {
        return problems;
    }
}
