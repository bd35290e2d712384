package binspan.scenario;

import binspan.scenario.PathParser.Address;
import binspan.scenario.PathParser.Step;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import java.util.stream.Collectors;
import java.util.stream.Stream;

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
        double checked = allowed(value);
        return over(scenario).apply(checked);
    }

    @Override
    public DoubleFunction<Scenario> over(Scenario scenario) {
        PumpMode mode = scenario.source().pump().mode();
        PumpFields.insteadOf(field().name(), mode).ifPresent(other -> refuse("a " + mode.text() + " pump", other));
        DoubleFunction<Record> first = edit(scenario, addresses.get(0).steps());
        if (addresses.size() == 1) {
            return value -> (Scenario) first.apply(allowed(value));
        }
        List<Step> second = addresses.get(1).steps();
        return value -> (Scenario) edit(first.apply(allowed(value)), second).apply(value);
    }

    /**
     * The single values that it moves, each as a parameter of its own, in the order in which they stand in the scenario.
     *
     * @param scenario a scenario in which its path leads somewhere
     */
    public List<Parameter> places(Scenario scenario) {
        List<Parameter> places = new ArrayList<>();
        addresses.forEach(address -> place(scenario, address.steps(), List.of(), places));
        return List.copyOf(places);
    }

    private static void place(Record node, List<Step> steps, List<Step> before, List<Parameter> places) {
        Step step = steps.get(0);
        if (steps.size() == 1) {
            Address address = new Address(after(before, step));
            places.add(new FieldParameter(address.path(), List.of(address)));
            return;
        }
        Object component = step.section()
                .component(node, step.section().indexOf(step.field().name()));
        List<Step> rest = steps.subList(1, steps.size());
        if (component instanceof List<?> list && step.item() == PathParser.ALL) {
            for (int i = 0; i < list.size(); i++) {
                place((Record) list.get(i), rest, after(before, new Step(step.section(), step.field(), i)), places);
            }
        } else {
            place(child(component, step.item()), rest, after(before, step), places);
        }
    }

    private static List<Step> after(List<Step> before, Step step) {
        return Stream.concat(before.stream(), Stream.of(step)).toList();
    }

    private double allowed(double value) {
        boolean whole = field().kind() != Field.Kind.COUNT || value == Math.rint(value);
        if (range().contains(value) && whole) {
            return value;
        }
        throw new IllegalArgumentException(path + ": found " + Range.plain(value) + "; allowed " + field().allowed());
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

    /** The record at the start of some steps as a function of the number at their end. */
    private DoubleFunction<Record> edit(Record node, List<Step> steps) {
        Section section = steps.get(0).section();
        Field field = steps.get(0).field();
        int index = section.indexOf(field.name());
        if (steps.size() == 1) {
            section.excluding(node, field).ifPresent(this::refuseBeside);
            Object[] components = section.componentsFor(node, field);
            return value -> section.construct(components, index, field.component(value));
        }
        Object[] components = section.components(node);
        DoubleFunction<Object> part = part(components[index], steps.get(0).item(), steps.subList(1, steps.size()));
        return value -> section.construct(components, index, part.apply(value));
    }

    private DoubleFunction<Object> part(Object component, int item, List<Step> rest) {
        if (component instanceof Optional<?> optional) {
            DoubleFunction<Record> inside = edit((Record) optional.orElseThrow(this::incomplete), rest);
            return value -> Optional.of(inside.apply(value));
        }
        if (!(component instanceof List<?> list)) {
            DoubleFunction<Record> inside = edit((Record) component, rest);
            return inside::apply;
        }
        List<DoubleFunction<Record>> items = new ArrayList<>();
        for (int i = 0; i < list.size(); i++) {
            Record present = (Record) list.get(i);
            items.add(item == PathParser.ALL || item == i ? edit(present, rest) : value -> present);
        }
        return value -> items.stream().map(each -> each.apply(value)).toList();
    }

    private IllegalArgumentException incomplete() {
        return new IllegalArgumentException(path + ": not every element of the list has it; name one as [0]");
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
}
