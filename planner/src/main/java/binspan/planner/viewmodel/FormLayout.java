package binspan.planner.viewmodel;

import binspan.scenario.Arm;
import binspan.scenario.ClassicalChannel;
import binspan.scenario.Content;
import binspan.scenario.FibreSpan;
import binspan.scenario.Field;
import binspan.scenario.PathElement;
import binspan.scenario.Scenario;
import binspan.scenario.ScenarioSections;
import binspan.scenario.Section;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;

/** Which fields stand in the form of a part of the link, in the order of the registry. */
final class FormLayout {
    private static final List<String> CLOCK = List.of("clockJitterRmsPs", "tagBinPs", "delayErrorPs", "photon");
    private static final String CHANNELS = "classicalChannels";

    private final List<Group> groups = new ArrayList<>();
    private final Scenario scenario;

    private FormLayout(Scenario scenario) {
        this.scenario = scenario;
    }

    /**
     * Fields of one object.
     *
     * @param title heading, empty where the part's name says it
     * @param object path of the object
     * @param fields its fields
     * @param inList whether the object is one of a list from which it can be removed
     */
    record Group(String title, String object, List<FieldPlace> fields, boolean inList) {}

    /** The groups of a part that the scenario has. */
    static List<Group> of(Scenario scenario, LinkPart part) {
        FormLayout layout = new FormLayout(scenario);
        layout.part(part);
        return List.copyOf(layout.groups);
    }

    /** The list to which items can be added: the classical channels of a fibre, the detectors of a side; empty if there is none. */
    static String listOf(Scenario scenario, LinkPart part) {
        if (part instanceof LinkPart.Port port) {
            return port.site().path() + ".detectors";
        }
        return part instanceof LinkPart.Element element && element(scenario, element) instanceof FibreSpan
                ? object(element) + "." + CHANNELS
                : "";
    }

    private void part(LinkPart part) {
        if (part instanceof LinkPart.Plan) {
            plan();
        } else if (part instanceof LinkPart.Promise) {
            section("", "require");
        } else if (part instanceof LinkPart.Source) {
            section("pump", "source.pump");
            fields("pairs", "source", field -> true);
        } else if (part instanceof LinkPart.Bands) {
            section("signal", "source.signal");
            section("idler", "source.idler");
        } else {
            site(part);
        }
    }

    private void plan() {
        fields("", "", field -> true);
        section("timing", "timing");
        section("acquisition", "acquisition");
        section("protocol", "protocol");
    }

    private void site(LinkPart part) {
        if (part instanceof LinkPart.Coupling coupling) {
            named(coupling.site(), "sourceCouplingLossDb");
        } else if (part instanceof LinkPart.Repair repair) {
            named(repair.site(), "repairMarginDb");
        } else if (part instanceof LinkPart.Clock clock) {
            CLOCK.forEach(name -> named(clock.site(), name));
        } else if (part instanceof LinkPart.Analyzer analyzer) {
            section("", analyzer.site().path() + ".analyzer");
        } else if (part instanceof LinkPart.Port port) {
            port(port);
        } else if (part instanceof LinkPart.Element element) {
            element(element);
        }
    }

    /** One of two detectors can be removed. */
    private void port(LinkPart.Port port) {
        String object = port.site().path() + ".detectors[" + port.port() + "]";
        boolean two = port.site().arm(scenario).detectors().size() > 1;
        String title = two ? Words.of("form.port", port.port() + 1) : "";
        groups.add(new Group(title, object, places(object, sectionAt(object)), two));
    }

    private void element(LinkPart.Element part) {
        section("", object(part));
        if (element(scenario, part) instanceof FibreSpan span) {
            List<ClassicalChannel> channels = span.classicalChannels();
            for (int i = 0; i < channels.size(); i++) {
                String object = object(part) + "." + CHANNELS + "[" + i + "]";
                Section section = sectionAt(object);
                groups.add(new Group(Words.of("form.channel", i + 1), object, places(object, section), true));
            }
        }
    }

    private static String object(LinkPart.Element part) {
        return part.site().path() + ".path[" + part.index() + "]";
    }

    private static PathElement element(Scenario scenario, LinkPart.Element part) {
        Arm arm = part.site().arm(scenario);
        return arm.path().get(part.index());
    }

    private void named(Site site, String name) {
        fields("", site.path(), field -> field.name().equals(name));
    }

    private void section(String title, String object) {
        fields(title, object, field -> true);
    }

    private void fields(String title, String object, Predicate<Field> wanted) {
        List<FieldPlace> places = places(object, sectionAt(object)).stream()
                .filter(place -> wanted.test(place.field()))
                .toList();
        Group last = groups.isEmpty() ? null : groups.get(groups.size() - 1);
        if (last != null && last.object().equals(object)) {
            List<FieldPlace> joined = new ArrayList<>(last.fields());
            joined.addAll(places);
            groups.set(groups.size() - 1, new Group(last.title(), object, List.copyOf(joined), false));
        } else {
            groups.add(new Group(title.isEmpty() ? "" : Words.of("form.group." + title), object, places, false));
        }
    }

    /** The plain fields of an object, and objects that take the place of one of them. */
    private static List<FieldPlace> places(String object, Section section) {
        List<FieldPlace> places = new ArrayList<>();
        for (Field field : section.fields()) {
            FieldPlace place = new FieldPlace(object, section, field);
            if (isPlain(field) || !place.rivals().isEmpty()) {
                places.add(place);
            }
        }
        return List.copyOf(places);
    }

    private static boolean isPlain(Field field) {
        return switch (field.kind()) {
            case SECTION, LIST, ENTRIES -> false;
            default -> true;
        };
    }

    private Section sectionAt(String object) {
        if (object.isEmpty()) {
            return ScenarioSections.SCENARIO;
        }
        FieldPlace place = PlannedValue.place(scenario, object);
        Content content = place.field().content();
        return content.typed() ? typed(content, object) : content.section("").orElseThrow();
    }

    private Section typed(Content content, String object) {
        Object element = PlannedValue.at(scenario, object).orElseThrow();
        return content.sectionOf((Record) element);
    }
}
