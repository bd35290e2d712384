package binspan.worksheet;

import binspan.counting.ArmLight;
import binspan.counting.ClickStatistics;
import binspan.optics.SlotCaptures;

/** Section 6: pairs of each bin, detected photons and click probability of each port in each slot's window. */
final class WorksheetPhotons {
    private final WorksheetPage page;
    private final SlotCaptures captures;
    private final double modes;

    private WorksheetPhotons(WorksheetPage page) {
        this.page = page;
        this.captures = page.captures();
        this.modes = page.prediction().spectrum().schmidtNumber();
    }

    static void write(WorksheetPage page) {
        WorksheetPhotons photons = new WorksheetPhotons(page);
        if (page.endless()) {
            photons.bin("b", "pulse", "{mu}", page.value("mu"));
        } else {
            photons.bins();
        }
        for (WorksheetSide side : page.sides()) {
            for (int port = 0; port < side.loads().size(); port++) {
                photons.port(side, port);
            }
        }
    }

    private void bins() {
        double e = page.scenario().source().pump().earlyPairFraction();
        double mu = page.value("mu");
        page.input("e", "share of the pairs born early", e, "", "source.pump.earlyPairFraction");
        page.line("mu_E", "pairs of the early bin", "{mu} {e}", mu * e, "");
        page.line("mu_L", "pairs of the late bin", "{mu} (1 - {e})", mu * (1.0 - e), "");
        bin("b_E", "early bin", "{mu_E}", mu * e);
        bin("b_L", "late bin", "{mu_L}", mu * (1.0 - e));
    }

    private void bin(String symbol, String name, String mean, double value) {
        String formula = mean + " (1 + " + mean + "/{K})";
        page.line(
                symbol,
                "pairs of the " + name + " as the click formula takes them",
                formula,
                ClickStatistics.bunched(value, modes),
                "");
    }

    private void port(WorksheetSide side, int port) {
        if (page.endless()) {
            slot(side, port, 0, endless(side, port), endlessValue(side, port));
            return;
        }
        for (int slot = 0; slot < 3; slot++) {
            slot(side, port, slot, bright(side, port, slot), brightValue(side, port, slot));
        }
    }

    private void slot(WorksheetSide side, int port, int slot, String formula, double photons) {
        String words = side.name() + " port " + (port + 1) + (page.endless() ? ": " : ", slot " + slot + ": ");
        double noise = page.value(side.of("d", port));
        String n = symbol("n", side, port, slot);
        page.line(n, words + "detected photons in the window", formula, photons, "");
        String silent = Double.isInfinite(modes) ? " exp(-{" + n + "})" : " (1 + {" + n + "}/{K})^-{K}";
        double click = ClickStatistics.click(photons, noise, modes);
        page.cited("Takeoka, Jin, Sasaki, New J. Phys. 17, 043030 (2015)")
                .line(
                        symbol("q", side, port, slot),
                        words + "click probability",
                        "1 - exp(-" + side.in("d", port) + ")" + silent,
                        click,
                        "");
    }

    /** Symbol of a quantity of a port in the window of a slot. */
    static String symbol(String name, WorksheetSide side, int port, int slot) {
        return side.of(name, port) + "(" + slot + ")";
    }

    private String bright(WorksheetSide side, int port, int slot) {
        String s = side.in("sh", port);
        String l = side.in("lo", port);
        String sum = "";
        sum = added(sum, side, port, -slot, "{e} " + s);
        sum = added(sum, side, port, 1 - slot, "({e} " + l + " + (1 - {e}) " + s + ")");
        sum = added(sum, side, port, 2 - slot, "(1 - {e}) " + l);
        return side.in("N") + " (" + sum + ")";
    }

    private String added(String sum, WorksheetSide side, int port, int offset, String weight) {
        String capture = WorksheetCaptures.single(side, port, offset);
        if (!page.has(capture)) {
            return sum;
        }
        return sum + (sum.isEmpty() ? "" : " + ") + "{" + capture + "} " + weight;
    }

    private double brightValue(WorksheetSide side, int port, int slot) {
        ArmLight light = side.light();
        double e = page.value("e");
        double s = light.shortTo(port);
        double l = light.longTo(port);
        double first = captured(side, port, -slot) * e * s;
        double second = captured(side, port, 1 - slot) * (e * l + (1.0 - e) * s);
        double third = captured(side, port, 2 - slot) * (1.0 - e) * l;
        return light.photons() * (first + second + third);
    }

    private double captured(WorksheetSide side, int port, int offset) {
        return side.isAlice() ? captures.alice(port, offset) : captures.bob(port, offset);
    }

    private String endless(WorksheetSide side, int port) {
        String sum = "";
        for (int offset = -captures.reach(); offset <= captures.reach(); offset++) {
            String capture = WorksheetCaptures.single(side, port, offset);
            sum += page.has(capture) ? (sum.isEmpty() ? "{" : " + {") + capture + "}" : "";
        }
        return side.in("N") + " (" + side.in("sh", port) + " + " + side.in("lo", port) + ") (" + sum + ")";
    }

    private double endlessValue(WorksheetSide side, int port) {
        double captured = 0.0;
        for (int offset = -captures.reach(); offset <= captures.reach(); offset++) {
            captured += captured(side, port, offset);
        }
        return side.light().photons() * side.light().into(port) * captured;
    }
}
