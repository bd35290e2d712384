package binspan.worksheet;

import binspan.optics.Passband;
import binspan.scenario.Band;
import binspan.scenario.FilterElement;
import binspan.scenario.PassbandShape;
import binspan.scenario.PathElement;
import binspan.units.Scale;
import java.util.ArrayList;
import java.util.List;

/** Band and filters of one arm: every filter by itself, then all of them together. */
final class WorksheetFilters {
    private final WorksheetPage page;
    private final WorksheetSide side;
    private final List<String> gaussian = new ArrayList<>();
    private final List<String> flat = new ArrayList<>();
    private int filters;

    private WorksheetFilters(WorksheetPage page, WorksheetSide side) {
        this.page = page;
        this.side = side;
    }

    static void write(WorksheetPage page, WorksheetSide side) {
        WorksheetFilters filters = new WorksheetFilters(page, side);
        filters.centre();
        filters.each();
        filters.together();
        filters.variance();
    }

    private void centre() {
        Band band = side.band();
        String path = side.bandPath();
        String wavelength = "vacuum wavelength of " + side.name() + "'s photon";
        if (band.wavelengthNm().isPresent()) {
            page.input(side.of("lambda"), wavelength, band.centreNm(), "nm", path + ".wavelengthNm");
            page.line(side.of("nu"), "its frequency", "c/" + side.in("lambda"), band.centreHz(), "Hz");
            return;
        }
        if (band.frequencyTHz().isPresent()) {
            String frequency = "frequency of " + side.name() + "'s photon";
            page.input(side.of("nu"), frequency, band.centreHz(), "Hz", path + ".frequencyTHz");
        } else {
            channel(band.channel().orElseThrow(), path);
        }
        page.line(side.of("lambda"), wavelength, "c/" + side.in("nu"), band.centreNm(), "nm");
    }

    private void channel(double number, String path) {
        String formula = "190 THz + " + side.in("ch") + " x 0.1 THz";
        page.input(side.of("ch"), "channel number of " + side.name() + "'s photon", number, "", path + ".channel");
        page.cited("customary channel numbers on the grid of ITU-T G.694.1");
        page.line(side.of("nu"), "its frequency", formula, side.band().centreHz(), "Hz");
    }

    private void each() {
        filter("filter at the source", side.band().passband(), side.band().bandwidthFwhmGHz(), side.bandPath());
        List<PathElement> path = side.arm().path();
        for (int i = 0; i < path.size(); i++) {
            if (path.get(i) instanceof FilterElement filter) {
                String name = filter.label().orElse("filter in the path");
                filter(name, filter.passband(), filter.bandwidthFwhmGHz(), side.name() + ".path[" + i + "]");
            }
        }
    }

    private void filter(String name, PassbandShape shape, double widthGHz, String path) {
        int index = filters++;
        Passband alone = Passband.of(widthGHz * Scale.GIGA, shape);
        String words = side.name() + ": " + name + ", " + shape.text();
        page.input(
                side.of("B", index),
                words + ", full width at half maximum",
                widthGHz * Scale.GIGA,
                "Hz",
                path + ".bandwidthFwhmGHz");
        if (shape == PassbandShape.GAUSSIAN) {
            page.line(
                    side.of("s", index),
                    "its rms",
                    "2 pi " + side.in("B", index) + "/2.354820",
                    alone.gaussianRms(),
                    "rad/s");
            gaussian.add(side.in("s", index));
        } else {
            page.line(side.of("a", index), "its half width", "pi " + side.in("B", index), alone.halfWidth(), "rad/s");
            flat.add(side.in("a", index));
        }
    }

    private void together() {
        if (!gaussian.isEmpty()) {
            String sum = "1/sqrt(1/" + String.join("^2 + 1/", gaussian) + "^2)";
            together(
                    "s",
                    "rms",
                    gaussian.size() == 1 ? gaussian.get(0) : sum,
                    side.filters().gaussianRms());
        }
        if (!flat.isEmpty()) {
            String least = flat.size() == 1 ? flat.get(0) : "min(" + String.join(", ", flat) + ")";
            together("a", "half width", least, side.filters().halfWidth());
        }
    }

    private void together(String symbol, String what, String formula, double value) {
        String words = side.name() + ": " + what + " of all filters of this shape, wherever they stand";
        page.line(side.of(symbol), words, formula, value, "rad/s");
    }

    private void variance() {
        String formula = formula();
        page.line(
                side.of("v"),
                "variance of the light that they pass",
                formula,
                side.filters().variance(),
                "(rad/s)^2");
    }

    private String formula() {
        String s = side.in("s");
        String a = side.in("a");
        if (flat.isEmpty()) {
            return s + "^2";
        }
        if (gaussian.isEmpty()) {
            return a + "^2/3";
        }
        page.line(
                side.of("x"),
                "edge of the flat top in rms of the Gaussian",
                a + "/" + s,
                side.filters().halfWidth() / side.filters().gaussianRms(),
                "");
        String x = side.in("x");
        return s + "^2 (1 - sqrt(2/pi) " + x + " exp(-" + x + "^2/2)/erf(" + x + "/sqrt 2))";
    }
}
