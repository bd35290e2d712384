package binspan.worksheet;

import binspan.optics.FibreOptics;
import binspan.optics.Passband;
import binspan.scenario.FibreSpan;
import binspan.scenario.FilterElement;
import binspan.scenario.PathElement;
import binspan.units.Decibels;
import binspan.units.OpticalFrequency;
import binspan.units.Scale;
import java.util.ArrayList;
import java.util.List;

/**
 * Section 2: light that classical channels leave in the photon's band, with what follows each fibre that carries any.
 */
final class WorksheetStrayLight {
    private final WorksheetPage page;
    private final WorksheetSide side;
    private final List<String> arriving = new ArrayList<>();

    private WorksheetStrayLight(WorksheetPage page, WorksheetSide side) {
        this.page = page;
        this.side = side;
    }

    static void write(WorksheetPage page) {
        for (WorksheetSide side : page.sides()) {
            WorksheetStrayLight stray = new WorksheetStrayLight(page, side);
            stray.spans();
            String sum = stray.arriving.isEmpty() ? "no classical channels" : String.join(" + ", stray.arriving);
            double photons = side.path().strayPhotonsPerSecond();
            page.line(side.of("stray"), side.name() + ": classical light behind the excess loss", sum, photons, "1/s");
        }
    }

    private void spans() {
        List<PathElement> path = side.arm().path();
        for (int i = 0; i < path.size(); i++) {
            if (path.get(i) instanceof FibreSpan span
                    && !span.classicalChannels().isEmpty()) {
                losses(i);
                filters(i);
                quantum(i, span);
                for (int k = 0; k < span.classicalChannels().size(); k++) {
                    arriving.add(WorksheetChannel.write(page, side, new WorksheetChannel.Place(i, k, arriving.size())));
                }
            }
        }
    }

    private void losses(int fibre) {
        List<String> losses = new ArrayList<>(List.of(side.in("exc")));
        double lossDb = page.value(side.of("exc"));
        for (int i = fibre + 1; i < side.arm().path().size(); i++) {
            losses.add(side.in("loss", i));
            lossDb += page.value(side.of("loss", i));
        }
        String meaning = "loss up to the analyzer's splitting, repairs left out";
        line("aft", fibre, meaning, String.join(" + ", losses), lossDb, "dB");
    }

    private void filters(int fibre) {
        Passband filters = Passband.OPEN;
        double isolationDb = 0.0;
        List<String> isolations = new ArrayList<>();
        for (int i = fibre + 1; i < side.arm().path().size(); i++) {
            if (side.arm().path().get(i) instanceof FilterElement filter) {
                filters = filters.and(Passband.of(filter.bandwidthFwhmGHz() * Scale.GIGA, filter.passband()));
                isolationDb += filter.isolationDb();
                isolations.add(isolation(i, filter));
            }
        }
        line("iso", fibre, "isolation of the filters", String.join(" + ", isolations), isolationDb, "dB");
        String area = "area under their transmission over 2 pi";
        line("B_n", fibre, "noise bandwidth of the filters", area, filters.noiseBandwidthHz(), "Hz");
        double width =
                OpticalFrequency.widthNm(filters.noiseBandwidthHz(), side.band().centreNm());
        line(
                "dl",
                fibre,
                "the same in wavelength",
                side.in("lambda") + "^2 " + side.in("B_n", fibre) + "/c",
                width,
                "nm");
    }

    private String isolation(int element, FilterElement filter) {
        if (!page.has(side.of("isol", element))) {
            String meaning = side.name() + ": isolation of " + filter.label().orElse("the filter in the path");
            String path = side.name() + ".path[" + element + "].isolationDb";
            page.input(side.of("isol", element), meaning, filter.isolationDb(), "dB", path);
        }
        return side.in("isol", element);
    }

    private void quantum(int fibre, FibreSpan span) {
        double dbPerKm = FibreOptics.attenuationDbPerKm(span, side.band().centreNm());
        String formula = span.measuredLossDb().isPresent()
                ? "ln(10)/10 x " + side.in("loss", fibre) + "/" + side.in("L", fibre)
                : "ln(10)/10 x " + side.in("alpha", fibre);
        String meaning = side.name() + ", fibre " + (fibre + 1) + ": attenuation in the photon's band";
        page.line(side.of("a_q", fibre), meaning, formula, dbPerKm * Decibels.NEPERS_PER_DB, "1/km");
    }

    private void line(String symbol, int fibre, String meaning, String formula, double value, String unit) {
        String words = side.name() + ", behind fibre " + (fibre + 1) + ": " + meaning;
        page.line(side.of(symbol, fibre), words, formula, value, unit);
    }
}
