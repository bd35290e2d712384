package binspan.worksheet;

import binspan.optics.Passband;
import binspan.optics.PortTiming;
import binspan.optics.SlotCaptures;
import java.util.List;

/**
 * Section 3, pulsed sources: captured shares of photons and pairs by how many slots away from the window they belong.
 * Ports that time alike share their lines; shares below a millionth of a millionth are left out.
 */
final class WorksheetCaptures {
    /** Captured shares that are left out. */
    static final double NOTHING = 1e-12;

    private final WorksheetPage page;
    private final SlotCaptures captures;

    private WorksheetCaptures(WorksheetPage page) {
        this.page = page;
        this.captures = page.captures();
    }

    static void write(WorksheetPage page) {
        if (!page.scenario().pulsed()) {
            return;
        }
        WorksheetCaptures sheet = new WorksheetCaptures(page);
        for (WorksheetSide side : page.sides()) {
            for (int port = 0; port < side.ports().size(); port++) {
                if (like(side, port) == port) {
                    sheet.box(side, port);
                    sheet.singles(side, port);
                }
            }
        }
        for (int a = 0; a < page.sides().get(0).ports().size(); a++) {
            for (int b = 0; b < page.sides().get(1).ports().size(); b++) {
                WorksheetJointCaptures.write(page, a, b);
            }
        }
    }

    /** The first port of the arm that times like this one. */
    static int like(WorksheetSide side, int port) {
        List<PortTiming> ports = side.ports();
        return ports.get(port).same(ports.get(0)) ? 0 : port;
    }

    /** Symbol of the captured share of a port's photons from a slot so many after the window's. */
    static String single(WorksheetSide side, int port, int offset) {
        return side.of("c", like(side, port)) + "(" + offset + ")";
    }

    /** Symbol of the captured share of pairs. */
    static String pair(WorksheetPage page, int a, int b, int offsetA, int offsetB) {
        int likeA = like(page.sides().get(0), a) + 1;
        int likeB = like(page.sides().get(1), b) + 1;
        return "J_" + likeA + likeB + "(" + offsetA + "," + offsetB + ")";
    }

    private void singles(WorksheetSide side, int port) {
        for (int offset = -captures.reach(); offset <= captures.reach(); offset++) {
            double captured = side.isAlice() ? captures.alice(port, offset) : captures.bob(port, offset);
            if (offset == 0 || captured > NOTHING) {
                String meaning = side.name() + " port " + (port + 1) + ": captured photons " + where(offset);
                page.line(single(side, port, offset), meaning, formula(side, port, offset), captured, "");
            }
        }
    }

    /** States box and blur of a flat-top spectrum. */
    private void box(WorksheetSide side, int port) {
        if (!side.filters().flat()) {
            return;
        }
        String name = side.name() + " port " + (port + 1) + ": ";
        double width = 2.0 * side.filters().halfWidth() * Math.abs(side.path().groupDelayDispersion());
        double light =
                (1.0 / side.filters().variance() + page.prediction().spectrum().inversePump()) / 4.0;
        double blur = Math.sqrt(light + side.ports().get(port).variance());
        page.line(
                side.of("X", port),
                name + "box into which dispersion spreads the spectrum",
                "2 " + side.in("a") + " |" + side.in("beta") + "|",
                width,
                "s");
        String formula = "sqrt((1/" + side.in("v") + " + {L_AB})/4 + " + side.in("V", port) + ")";
        page.line(
                side.of("blur", port),
                name + "blur of that box by pulse, near field and detector, rms",
                formula,
                blur,
                "s");
    }

    /** Where captured light belongs, in words. */
    static String where(int offset) {
        if (offset == 0) {
            return "of the window's own slot";
        }
        String slots = Math.abs(offset) == 1 ? " slot " : " slots ";
        return "that belong " + Math.abs(offset) + slots + (offset > 0 ? "later" : "earlier");
    }

    private String formula(WorksheetSide side, int port, int offset) {
        PortTiming timing = side.ports().get(port);
        Passband filters = side.filters();
        String late = late(side, offset);
        if (filters.gaussian() && !timing.tailed()) {
            return erf("{w}", late, side.in("rms", port));
        }
        if (filters.flat() && !timing.tailed()) {
            return WorksheetBox.capture(page, side.of("X", port), side.of("blur", port), late);
        }
        String tail = timing.tailed()
                ? ", a share " + side.in("pt", port) + " with an exponential tail of " + side.in("tt", port)
                : "";
        String shape = filters.gaussian()
                ? "Gaussian of rms " + side.in("rms", port)
                : "spectrum spread by " + side.in("beta") + " and blurred by detector and near field";
        return "share of the " + shape + tail + " inside -{w}/2 to {w}/2, late by " + late;
    }

    /** How late the light is against the window's centre. */
    static String late(WorksheetSide side, int offset) {
        if (offset == 0) {
            return side.in("late");
        }
        String times = Math.abs(offset) == 1 ? "" : Math.abs(offset) + " ";
        return side.in("late") + (offset > 0 ? " + " : " - ") + times + "{T}";
    }

    /** Share of a Gaussian inside a window, its mean late by x. */
    static String erf(String window, String late, String rms) {
        boolean sum = late.indexOf(' ') >= 0;
        String x = sum ? "(" + late + ")" : late;
        return "[erf((" + window + "/2 - " + x + ")/(sqrt 2 " + rms + ")) + erf((" + window + "/2 + " + x + ")/(sqrt 2 "
                + rms + "))]/2";
    }
}
