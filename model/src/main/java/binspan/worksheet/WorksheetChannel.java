package binspan.worksheet;

import binspan.optics.FibreOptics;
import binspan.optics.RamanNoise;
import binspan.scenario.ClassicalChannel;
import binspan.scenario.Direction;
import binspan.scenario.FibreSpan;
import binspan.units.Decibels;
import binspan.units.OpticalFrequency;
import binspan.units.PhysicalConstants;

/** Section 2: Raman light and leakage of one classical channel. */
final class WorksheetChannel {
    private static final String RAMAN = "Eraerds et al., New J. Phys. 12, 063027 (2010), from memory";

    /**
     * Where a channel stands.
     *
     * @param fibre position of its fibre in the path
     * @param item position in that fibre's list of channels
     * @param index position among all channels of the arm
     */
    record Place(int fibre, int item, int index) {}

    private final WorksheetPage page;
    private final WorksheetSide side;
    private final Place place;
    private final FibreSpan span;
    private final ClassicalChannel channel;

    private WorksheetChannel(WorksheetPage page, WorksheetSide side, Place place) {
        this.page = page;
        this.side = side;
        this.place = place;
        this.span = (FibreSpan) side.arm().path().get(place.fibre());
        this.channel = span.classicalChannels().get(place.item());
    }

    /** States a channel and gives the symbol of its light behind the excess loss, ready to stand in a formula. */
    static String write(WorksheetPage page, WorksheetSide side, Place place) {
        WorksheetChannel sheet = new WorksheetChannel(page, side, place);
        sheet.inputs();
        double photons = sheet.raman();
        String sum = sheet.in("ram");
        if (sheet.forward()) {
            photons += sheet.leaked();
            sum = "(" + sum + " + " + sheet.in("leak") + ")";
        }
        String after = side.of("aft", place.fibre());
        double behind = photons * Decibels.transmittance(page.value(after));
        sheet.line("st", "photons behind the excess loss", sum + " 10^(-{" + after + "}/10)", behind, "1/s");
        return sheet.in("st");
    }

    private boolean forward() {
        return channel.direction() == Direction.FORWARD;
    }

    private void inputs() {
        double dbPerKm = FibreOptics.attenuationDbPerKm(span, channel);
        input("dBm", "launched level", channel.launchDbm(), "dBm", "launchDbm");
        line("P0", "the same as power", "1 mW x 10^(" + in("dBm") + "/10)", Decibels.watts(channel.launchDbm()), "W");
        input("rho", "Raman cross-section", channel.ramanCoefficientPerKmNm(), "1/(km nm)", "ramanCoefficientPerKmNm");
        if (channel.attenuationDbPerKm().isEmpty()) {
            page.otherwise("of the class " + span.fibre().text() + ", common practice");
        }
        input("alpha_c", "attenuation", dbPerKm, "dB/km", "attenuationDbPerKm");
        line(
                "a_c",
                "the same as an exponent",
                "ln(10)/10 x " + in("alpha_c"),
                dbPerKm * Decibels.NEPERS_PER_DB,
                "1/km");
    }

    private double raman() {
        double strength = channel.ramanCoefficientPerKmNm() * page.value(side.of("dl", place.fibre()));
        double launched = value("P0");
        double classical = value("a_c");
        double quantum = page.value(side.of("a_q", place.fibre()));
        double watts = forward()
                ? RamanNoise.forward(launched, strength, classical, quantum, span.lengthKm())
                : RamanNoise.backward(launched, strength, classical, quantum, span.lengthKm());
        page.cited(RAMAN);
        line("P_r", "Raman light at the fibre end", ramanFormula(classical == quantum), watts, "W");
        double photons = watts
                / (PhysicalConstants.PLANCK
                        * OpticalFrequency.ofWavelengthNm(side.band().centreNm()));
        line("ram", "Raman photons", in("P_r") + "/(h " + side.in("nu") + ")", photons, "1/s");
        return photons;
    }

    private String ramanFormula(boolean equal) {
        String start = in("P0") + " x " + in("rho") + " x " + side.in("dl", place.fibre()) + " x ";
        String c = in("a_c");
        String q = side.in("a_q", place.fibre());
        String length = side.in("L", place.fibre());
        if (!forward()) {
            return start + "(1 - exp(-(" + c + " + " + q + ") " + length + "))/(" + c + " + " + q + ")";
        }
        return equal
                ? start + length + " exp(-" + c + " " + length + ")"
                : start + "(exp(-" + c + " " + length + ") - exp(-" + q + " " + length + "))/(" + q + " - " + c + ")";
    }

    private double leaked() {
        double energy = PhysicalConstants.PLANCK * OpticalFrequency.ofWavelengthNm(channel.wavelengthNm());
        double end = Decibels.watts(channel.launchDbm() - value("alpha_c") * span.lengthKm());
        double photons = end / energy * Decibels.transmittance(page.value(side.of("iso", place.fibre())));
        input("lambda_c", "its wavelength", channel.wavelengthNm(), "nm", "wavelengthNm");
        String arriving = in("P0") + " exp(-" + in("a_c") + " " + side.in("L", place.fibre()) + ") ";
        String formula = arriving + in("lambda_c") + "/(h c) x 10^(-" + side.in("iso", place.fibre()) + "/10)";
        line("leak", "its own photons through the filters' isolation", formula, photons, "1/s");
        return photons;
    }

    private void input(String symbol, String meaning, double value, String unit, String field) {
        String path = side.name() + ".path[" + place.fibre() + "].classicalChannels[" + place.item() + "]." + field;
        page.input(side.of(symbol, place.index()), words(meaning), value, unit, path);
    }

    private void line(String symbol, String meaning, String formula, double value, String unit) {
        page.line(side.of(symbol, place.index()), words(meaning), formula, value, unit);
    }

    private String words(String meaning) {
        return side.name() + ", classical channel " + (place.index() + 1) + " ("
                + channel.direction().text() + "): " + meaning;
    }

    private double value(String symbol) {
        return page.value(side.of(symbol, place.index()));
    }

    private String in(String symbol) {
        return side.in(symbol, place.index());
    }
}
