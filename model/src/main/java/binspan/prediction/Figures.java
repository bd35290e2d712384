package binspan.prediction;

import java.math.BigDecimal;
import java.math.MathContext;

/** Numbers for sentences: three significant digits, no needless zeros. */
final class Figures {
    private static final MathContext THREE = new MathContext(3);

    private Figures() {}

    static String short3(double value) {
        if (value == 0.0 || !Double.isFinite(value)) {
            return value == 0.0 ? "0" : Double.toString(value);
        }
        BigDecimal rounded = new BigDecimal(value).round(THREE).stripTrailingZeros();
        boolean plain = Math.abs(value) >= 1e-3 && Math.abs(value) < 1e6;
        return plain ? rounded.toPlainString() : rounded.toString().replace("E", "e");
    }
}
