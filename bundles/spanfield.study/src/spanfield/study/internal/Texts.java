/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.math.BigDecimal;
import java.math.MathContext;

/** Numbers in messages. */
final class Texts {

    private static final int DIGITS = 4;

    private Texts() {
    }

    /** A number with four significant digits, without trailing zeros, with an exponent only where it is hard to read otherwise. */
    static String number(double value) {
        if (Double.isNaN(value) || Double.isInfinite(value)) {
            return Double.toString(value);
        }
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(DIGITS));
        if (rounded.signum() == 0) {
            return "0";
        }
        double magnitude = Math.abs(value);
        if (magnitude >= 1e7 || magnitude < 1e-4) {
            int exponent = rounded.precision() - rounded.scale() - 1;
            return rounded.movePointLeft(exponent).stripTrailingZeros().toPlainString() + "e" + exponent;
        }
        return rounded.stripTrailingZeros().toPlainString();
    }
}
