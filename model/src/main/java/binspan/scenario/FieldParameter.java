package binspan.scenario;

import binspan.scenario.PathParser.Address;
import binspan.scenario.PathParser.Step;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;

/** A numeric field of the scenario, or several of the same meaning moved together. */
public final class FieldParameter implements Parameter {
    private final String path;
    private final List<Address> addresses;

    FieldParameter(String path, List<Address> addresses) {
        this.path = path;
        this.addresses = List.copyOf(addresses);
    }

    @Override
    public String path() {
        return path;
    }

    /** The registry's entry. */
    public Field field() {
        return addresses.get(0).field();
    }

    @Override
    public String unit() {
        return field().unit();
    }

    @Override
    public Range range() {
        return field().range();
    }

    @Override
    public String meaning() {
        return field().meaning();
    }

    @Override
    public OptionalDouble value(Scenario scenario) {
        return value(scenario, addresses.get(0).steps());
    }

    @Override
    public Scenario with(Scenario scenario, double value) {
        boolean whole = field().kind() != Field.Kind.COUNT || value == Math.rint(value);
        if (!range().contains(value) || !whole) {
            throw new IllegalArgumentException(
                    path + ": found " + Range.plain(value) + "; allowed " + field().allowed());
        }
        PumpMode mode = scenario.source().pump().mode();
        PumpFields.insteadOf(field().name(), mode).ifPresent(other -> refuse("a " + mode.text() + " pump", other));
        Record changed = scenario;
        for (Address address : addresses) {
            changed = with(changed, address.steps(), value);
        }
        return (Scenario) changed;
    }

    private static OptionalDouble value(Record node, List<Step> steps) {
        Step step = steps.get(0);
        Object component = step.section()
                .component(node, step.section().indexOf(step.field().name()));
        if (component instanceof Number number) {
            return OptionalDouble.of(number.doubleValue());
        }
        if (component instanceof OptionalDouble optional) {
            return optional;
        }
        return value(child(component, step.item()), steps.subList(1, steps.size()));
    }

    private static Record child(Object component, int item) {
        if (component instanceof Optional<?> optional) {
            return (Record) optional.orElseThrow();
        }
        return component instanceof List<?> list ? (Record) list.get(Math.max(item, 0)) : (Record) component;
    }

    private Record with(Record node, List<Step> steps, double value) {
        Step step = steps.get(0);
        Section section = step.section();
        if (steps.size() == 1) {
            section.excluding(node, step.field()).ifPresent(this::refuseBeside);
            return section.stating(node, step.field(), value);
        }
        int index = section.indexOf(step.field().name());
        return section.with(
                node,
                index,
                changed(section.component(node, index), step.item(), steps.subList(1, steps.size()), value));
    }

    private void refuseBeside(Field standing) {
        Section section = standing.content().section("").orElseThrow();
        String instead = section.fields().stream()
                .filter(each -> each.kind().numeric() && each.presence() == Field.Presence.REQUIRED)
                .map(each -> standing.name() + "." + each.name())
                .collect(Collectors.joining(" or "));
        refuse("the " + standing.name() + " found here", instead);
    }

    private void refuse(String reason, String instead) {
        String parent = path.substring(0, path.length() - field().name().length());
        throw new IllegalArgumentException(path + ": does not go with " + reason + "; vary " + parent + instead);
    }

    private Object changed(Object component, int item, List<Step> rest, double value) {
        if (component instanceof Optional<?> optional) {
            return optional.map(element -> with((Record) element, rest, value));
        }
        if (!(component instanceof List<?> list)) {
            return with((Record) component, rest, value);
        }
        List<Object> items = new ArrayList<>(list);
        for (int i = 0; i < items.size(); i++) {
            if (item == PathParser.ALL || item == i) {
                items.set(i, with((Record) items.get(i), rest, value));
            }
        }
        return items;
    }
}
