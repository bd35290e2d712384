package binspan.worksheet;

import binspan.optics.OpticalPath;
import binspan.scenario.Compensator;
import binspan.scenario.FibreSpan;
import binspan.scenario.FilterElement;
import binspan.scenario.LossElement;
import binspan.scenario.PathElement;
import binspan.units.Scale;
import java.util.ArrayList;
import java.util.List;

/** Section 2: loss, dispersion, polarization mode dispersion and delay of each arm, element by element. */
final class WorksheetPath {
    private final WorksheetPage page;
    private final WorksheetSide side;
    private final List<String> losses = new ArrayList<>();
    private final List<String> fibreLosses = new ArrayList<>();
    private final List<String> dispersions = new ArrayList<>();
    private final List<String> spreads = new ArrayList<>();
    private final List<String> thermal = new ArrayList<>();

    private WorksheetPath(WorksheetPage page, WorksheetSide side) {
        this.page = page;
        this.side = side;
    }

    static void write(WorksheetPage page) {
        double step = page.scenario().timing().cableTemperatureStepK();
        page.section("2 Path");
        if (step != 0.0) {
            page.input("dT", "temperature step of the cables", step, "K", "timing.cableTemperatureStepK");
        }
        for (WorksheetSide side : page.sides()) {
            WorksheetPath path = new WorksheetPath(page, side);
            path.coupling();
            path.fibres();
            path.components();
            path.ends();
            path.totals(side.path());
            path.delay();
        }
    }

    private void coupling() {
        loss(
                "cpl",
                "loss from inside the passband to the first element",
                side.arm().sourceCouplingLossDb(),
                ".sourceCouplingLossDb");
    }

    private void fibres() {
        List<PathElement> path = side.arm().path();
        for (int i = 0; i < path.size(); i++) {
            if (path.get(i) instanceof FibreSpan span) {
                WorksheetFibre.write(page, side, i, span);
                fibreLosses.add(side.in("loss", i));
                dispersions.add(side.in("DL", i));
                spreads.add(side.in("tau", i));
                if (page.has("dT")) {
                    thermal.add(side.in("dt", i));
                }
            }
        }
        losses.addAll(fibreLosses);
        page.line(
                side.of("D_fib"),
                side.name() + ": dispersion of all fibre",
                sum(dispersions),
                side.path().fibreDispersionPsPerNm(),
                "ps/nm");
    }

    private void components() {
        List<PathElement> path = side.arm().path();
        for (int i = 0; i < path.size(); i++) {
            String at = side.name() + ".path[" + i + "]";
            if (path.get(i) instanceof LossElement part) {
                page.input(side.of("loss", i), name(part, "component"), part.lossDb(), "dB", at + ".lossDb");
                losses.add(side.in("loss", i));
            } else if (path.get(i) instanceof FilterElement filter) {
                page.input(side.of("loss", i), name(filter, "filter"), filter.lossDb(), "dB", at + ".lossDb");
                losses.add(side.in("loss", i));
            } else if (path.get(i) instanceof Compensator) {
                WorksheetCompensator.write(page, side, i);
                losses.add(side.in("loss", i));
                dispersions.add(side.in("DL", i));
            }
        }
    }

    private void ends() {
        loss("rep", "loss set aside for later repairs", side.arm().repairMarginDb(), ".repairMarginDb");
        loss(
                "exc",
                "excess loss of the analyzer, its splitting not counted",
                side.arm().analyzer().excessLossDb(),
                ".analyzer.excessLossDb");
    }

    private void loss(String symbol, String meaning, double lossDb, String field) {
        page.input(side.of(symbol), side.name() + ": " + meaning, lossDb, "dB", side.name() + field);
        losses.add(side.in(symbol));
    }

    private void totals(OpticalPath path) {
        String of = side.name() + ": ";
        page.line(side.of("fib"), of + "loss of all fibre with its joints", sum(fibreLosses), path.fibreLossDb(), "dB");
        page.line(side.of("loss"), of + "loss in all", sum(losses), path.lossDb(), "dB");
        page.line(side.of("eta"), of + "transmittance", "10^(-" + side.in("loss") + "/10)", path.transmittance(), "");
        page.line(
                side.of("D"), of + "dispersion with compensators", sum(dispersions), path.dispersionPsPerNm(), "ps/nm");
        String beta = "-" + side.in("lambda") + "^2/(2 pi c) x " + side.in("D");
        page.line(side.of("beta"), of + "group-delay dispersion", beta, path.groupDelayDispersion(), "s^2");
        String squares = spreads.isEmpty() ? "0" : "sqrt(" + String.join("^2 + ", spreads) + "^2)";
        page.line(side.of("tau"), of + "rms spread by polarization mode dispersion", squares, path.pmdRms(), "s");
    }

    private void delay() {
        page.input(
                side.of("off"),
                side.name() + ": how late the photons arrive against the windows",
                side.arm().delayErrorPs() * Scale.PICO,
                "s",
                side.name() + ".delayErrorPs");
        List<String> parts = new ArrayList<>(List.of(side.in("off")));
        parts.addAll(thermal);
        page.line(side.of("late"), "the same with the temperature step at its worst", sum(parts), side.late(), "s");
    }

    private String name(PathElement element, String otherwise) {
        return side.name() + ": loss of " + element.label().orElse("the " + otherwise);
    }

    private static String sum(List<String> parts) {
        return parts.isEmpty() ? "0" : String.join(" + ", parts);
    }
}
