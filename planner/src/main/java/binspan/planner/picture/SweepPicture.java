package binspan.planner.picture;

import binspan.planner.plot.Curves;
import binspan.planner.plot.HeatLayer;
import binspan.planner.plot.HeatMap;
import binspan.planner.plot.Interval;
import binspan.planner.plot.Overlays;
import binspan.planner.plot.Panel;
import binspan.planner.plot.PanelGroup;
import binspan.planner.plot.Picture;
import binspan.planner.report.RequiredFigure;
import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.FigureColumn;
import binspan.study.PickedTable;
import binspan.study.StudyTable;
import binspan.study.region.RegionMap;
import binspan.study.window.OperatingIntervals;
import binspan.study.window.OperatingWindow;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** A sweep: of one parameter as curves with the windows shaded, of two as maps with the region. */
public final class SweepPicture {
    /** Most parameters that can be drawn. */
    public static final int MOST_AXES = 2;

    private static final int MOST_CURVES = 8;
    private static final int MOST_MAPS = 6;
    private static final List<String> USUAL =
            List.of("visibility.raw", "key.asymptoticBps", "bell.chsh", "coincidence.car");

    private SweepPicture() {}

    /**
     * The picture of a sweep.
     *
     * @param scenario the link as written
     * @param axes one or two varied parameters
     * @param table the points
     * @param shown figures that were asked for; empty to show the required ones, key and visibility
     */
    public static Picture of(Scenario scenario, List<Axis> axes, StudyTable table, List<FigureColumn> shown) {
        List<Integer> columns = columns(scenario, table, shown, axes.size() == 1 ? MOST_CURVES : MOST_MAPS);
        return axes.size() == 1
                ? curves(scenario, axes.get(0), PickedTable.of(table, columns))
                : maps(scenario, axes, table, columns);
    }

    private static List<Integer> columns(Scenario scenario, StudyTable table, List<FigureColumn> shown, int most) {
        Set<String> names = new LinkedHashSet<>();
        if (shown.isEmpty()) {
            RequiredFigure.of(scenario.require()).forEach(required -> names.add(required.figure()));
            names.addAll(USUAL.subList(0, 2));
        } else {
            shown.forEach(column -> names.add(column.name()));
        }
        List<Integer> columns = new ArrayList<>();
        for (String name : names) {
            int column = table.indexOf(name);
            if (column >= 0 && columns.size() < most) {
                columns.add(column);
            }
        }
        return columns;
    }

    private static Picture curves(Scenario scenario, Axis axis, StudyTable table) {
        return new Picture(
                "Sweep",
                scenario.name() + "; everything else as written",
                new Curves(
                        "",
                        FigureAxes.of(axis),
                        WindowPicture.panels(scenario, table),
                        met(scenario, axis, table),
                        WindowPicture.planned(scenario, axis)));
    }

    /** The windows with their ends solved; of whole numbers, which have none between, as the rows say. */
    private static List<Interval> met(Scenario scenario, Axis axis, StudyTable table) {
        if (RequiredFigure.of(scenario.require()).isEmpty()) {
            return List.of();
        }
        try {
            OperatingIntervals found = new OperatingWindow(scenario, axis).run(Execution.SINGLE);
            return found.windows().stream()
                    .map(window ->
                            new Interval(window.from().value(), window.to().value()))
                    .filter(interval -> interval.upper() > interval.lower())
                    .toList();
        } catch (IllegalArgumentException e) {
            return MetRows.of(table);
        }
    }

    /** The solved region; over whole numbers, which have nothing between, as the rows say. */
    private static Overlays overlays(Scenario scenario, List<Axis> axes, StudyTable table) {
        if (RequiredFigure.of(scenario.require()).isEmpty()) {
            return Overlays.NONE;
        }
        try {
            RegionMap region = RegionPicture.region(scenario, axes);
            return RegionPicture.overlays(scenario, region, List.of());
        } catch (IllegalArgumentException e) {
            return Overlays.NONE.withMargin(RegionPicture.met(axes, table));
        }
    }

    private static Picture maps(Scenario scenario, List<Axis> axes, StudyTable table, List<Integer> columns) {
        Overlays overlays = overlays(scenario, axes, table);
        List<Panel> panels = new ArrayList<>();
        for (int column : columns) {
            FigureColumn figure = table.columns().get(column);
            String blank = figure.name().startsWith("key.") ? "no key" : "none";
            panels.add(new HeatMap(
                    "",
                    FigureAxes.of(axes.get(0)),
                    FigureAxes.of(axes.get(1)),
                    new HeatLayer(FigureAxes.of(table, column), RegionPicture.lattice(axes, table, column), blank),
                    overlays));
        }
        return new Picture(
                "Sweep",
                scenario.name() + "; everything else as written",
                panels.size() == 1 ? panels.get(0) : new PanelGroup("", 2, panels));
    }
}
