package binspan.planner.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;

import binspan.planner.viewmodel.MapModel.BoxChoice;
import binspan.prediction.Requirement;
import binspan.prediction.histogram.Peak;
import binspan.scenario.DetectorClass;
import binspan.scenario.PumpMode;
import java.text.MessageFormat;
import java.util.Arrays;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.ResourceBundle;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** The bundle of words against the sources that ask for them, and against the syntax of {@link MessageFormat}. */
class BundleTest {
    private static final int MOST_INSERTS = 10;
    /** What the code itself puts behind a name that it is given. */
    private static final List<String> ENDINGS =
            List.of("", ".keys", ".tip", ".hint", ".what", ".name", ".question", ".answer", ".notes", ".all", ".done");

    private static final ResourceBundle BUNDLE = ResourceBundle.getBundle("binspan.planner.view.words", Locale.ROOT);
    private static final List<String> SOURCES = Stream.of("view", "viewmodel")
            .flatMap(name -> SourceCalls.texts(name).stream())
            .toList();
    private static final Set<String> LITERALS = Stream.concat(
                    SOURCES.stream(), SourceCalls.texts("export").stream()) // names of columns
            .flatMap(text -> SourceCalls.literals(text).stream())
            .collect(Collectors.toSet());

    /** Keys that are built of a beginning and the name of a constant. */
    private static final Map<String, List<String>> BUILT = with(
            Map.of(
                    "form.part.",
                            lower(Arrays.stream(LinkPart.class.getPermittedSubclasses())
                                    .map(Class::getSimpleName)
                                    .filter(name ->
                                            !name.equals("Element") && !name.equals("Port")) // have names of their own
                                    .toList()),
                    "link.kind.", names(LinkItem.Kind.values()),
                    "link.source.",
                            Stream.of(PumpMode.values()).map(PumpMode::text).toList(),
                    "link.detector.",
                            Stream.of(DetectorClass.values())
                                    .map(DetectorClass::text)
                                    .toList(),
                    "slots.peak.", names(Peak.Kind.values()),
                    "slots.title.", Stream.of(Site.values()).map(Site::path).toList(),
                    "map.kind.", names(MapReading.Kind.values()),
                    "map.box.", names(BoxChoice.values()),
                    "map.short.", names(Requirement.values()),
                    "studies.reach.place.", lower(names(ReachModel.Place.values()))),
            "map.star.",
            names(MapRecommendation.Kind.values()));

    private static Map<String, List<String>> with(
            Map<String, List<String>> built, String beginning, List<String> words) {
        Map<String, List<String>> more = new HashMap<>(built);
        more.put(beginning, words);
        return Map.copyOf(more);
    }

    private static List<String> names(Enum<?>[] constants) {
        return Arrays.stream(constants).map(Enum::name).toList();
    }

    private static List<String> lower(List<String> names) {
        return names.stream().map(name -> name.toLowerCase(Locale.ROOT)).toList();
    }

    private static Stream<String> built() {
        return BUILT.entrySet().stream()
                .flatMap(entry -> entry.getValue().stream().map(end -> entry.getKey() + end));
    }

    @Test
    void everyKeyThatTheCodeNamesIsThere() {
        List<String> asked = SOURCES.stream()
                .flatMap(text -> SourceCalls.arguments(text, "Words\\.(?:of|has)").stream())
                .map(SourceCalls::first)
                .filter(key -> !key.contains("+"))
                .flatMap(key -> SourceCalls.literals(key).stream())
                .toList();
        assertThat(asked).hasSizeGreaterThan(100);
        assertThat(asked).allMatch(Words::has);
    }

    @Test
    void everyKeyThatIsBuiltOfAConstantIsThere() {
        assertThat(built()).allMatch(Words::has);
    }

    @Test
    void everyKeyIsUsed() {
        Set<String> beginnings = LITERALS.stream()
                .filter(literal -> literal.matches("[a-z][\\w.]*\\."))
                .collect(Collectors.toSet());
        Set<String> constants = built().collect(Collectors.toSet());
        Set<String> unused = new TreeSet<>(BUNDLE.keySet());
        unused.removeIf(key -> constants.contains(key)
                || ENDINGS.stream()
                        .filter(key::endsWith)
                        .anyMatch(ending -> LITERALS.contains(key.substring(0, key.length() - ending.length())))
                || beginnings.stream()
                        .filter(beginning -> !BUILT.containsKey(beginning))
                        .anyMatch(beginning -> built(key, beginning)));
        // Names of files that are offered: the code asks for them by the name of a constant of its own.
        unused.removeIf(key -> key.startsWith("file.name."));
        assertThat(unused).isEmpty();
    }

    /** Whether a key is a beginning with words of the code behind it. */
    private static boolean built(String key, String beginning) {
        if (!key.startsWith(beginning)) {
            return false;
        }
        String rest = key.substring(beginning.length());
        return ENDINGS.stream().filter(rest::endsWith).anyMatch(ending -> {
            String name = rest.substring(0, rest.length() - ending.length());
            int dot = name.indexOf('.');
            boolean ofTwo =
                    dot > 0 && LITERALS.contains(name.substring(0, dot)) && LITERALS.contains(name.substring(dot + 1));
            return ofTwo || LITERALS.contains(name);
        });
    }

    @Test
    void everyTextIsWrittenAsItsFormatWantsIt() {
        for (String key : BUNDLE.keySet()) {
            String pattern = BUNDLE.getString(key);
            assertThat(pattern.replace("''", "")).as(key).doesNotContain("'");
            String said = Words.of(key, IntStream.range(0, MOST_INSERTS).boxed().toArray());
            assertThat(said).as(key).doesNotContain("{").doesNotContain("}").doesNotContain("''");
            assertThat(said.strip()).as(key).isNotEmpty();
        }
    }

    @Test
    void insertsAreCountedFromZeroWithoutGaps() {
        Pattern insert = Pattern.compile("\\{(\\d)");
        for (String key : BUNDLE.keySet()) {
            Set<Integer> used = insert.matcher(BUNDLE.getString(key))
                    .results()
                    .map(match -> Integer.valueOf(match.group(1)))
                    .collect(Collectors.toCollection(HashSet::new));
            assertThat(used)
                    .as(key)
                    .containsExactlyInAnyOrderElementsOf(
                            IntStream.range(0, used.size()).boxed().toList());
        }
    }

    @Test
    void noCallLeavesAnInsertOpen() {
        for (String text : SOURCES) {
            for (String arguments : SourceCalls.arguments(text, "Words\\.of")) {
                List<String> key = SourceCalls.literals(SourceCalls.first(arguments));
                boolean plain =
                        key.size() == 1 && SourceCalls.first(arguments).strip().equals('"' + key.get(0) + '"');
                if (plain && SourceCalls.first(arguments).length() == arguments.length()) {
                    assertThat(Words.of(key.get(0))).as(key.get(0)).doesNotContain("{");
                }
            }
        }
    }

    @Test
    void nothingThatIsSeenIsWrittenInTheCode() {
        String seen = "(?:setText|setPromptText|setAccessibleText|setAccessibleHelp|setAccessibleRoleDescription"
                + "|setTitle|setHeaderText|setContentText|fillText|setNotice|notice"
                + "|new (?:Label|Button|CheckBox|RadioButton|ToggleButton|Hyperlink|Tooltip|Menu|MenuItem"
                + "|CheckMenuItem|RadioMenuItem|Tab|TitledPane|Text|ButtonType))";
        for (String text : SourceCalls.texts("view")) {
            for (String arguments : SourceCalls.arguments(text, seen)) {
                String own = arguments;
                for (String inner : SourceCalls.arguments(arguments, "Words\\.(?:of|has)")) {
                    own = own.replace(inner, "");
                }
                assertThat(SourceCalls.literals(own))
                        .as(arguments)
                        .map(each -> each.replaceAll("\\\\u[0-9a-f]{4}", ""))
                        .noneMatch(each -> each.matches(".*[A-Za-z]{2,}.*"));
            }
        }
    }
}
