/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * Numbers as text for people. There is one rounding policy: the decimal number that {@link Double#toString(double)} gives, the same that
 * files for programs hold, is rounded once, to the nearest, ties to the even digit; bounds of errors are rounded up instead, so that a
 * printed bound still holds. The decimal mark is a dot; there are no thousands separators, and no negative zero. Verdicts and margins are
 * computed before rounding.
 *
 * <p>Files for programs do not come through here: {@link CsvWriter} writes every digit.
 */
public final class Numbers {

    /** Significant digits of field values in tables. */
    public static final int FIELD_DIGITS = 4;

    /** Significant digits of error bounds and estimates in tables. */
    public static final int ERROR_DIGITS = 2;

    /** Decimals of offsets, stations and heights in tables: a hundredth of a metre or foot. */
    public static final int LENGTH_DECIMALS = 2;

    /** What stands for a number that does not exist. */
    public static final String NONE = "-";

    /** Magnitudes from here on are written plainly. */
    private static final double LEAST_PLAIN = 1e-4;

    /** Magnitudes from here on are written with an exponent. */
    private static final double GREATEST_PLAIN = 1e7;

    private Numbers() {
    }

    /**
     * A value with a number of significant digits, trailing zeros included: 12.34, 0.1200, 1.234e-7.
     *
     * @param value  any double; NaN gives {@link #NONE}
     * @param digits significant digits, at least 1
     */
    public static String significant(double value, int digits) {
        return format(value, digits, RoundingMode.HALF_EVEN);
    }

    /** A field value with {@link #FIELD_DIGITS} digits. */
    public static String field(double value) {
        return significant(value, FIELD_DIGITS);
    }

    /** An error bound or estimate with {@link #ERROR_DIGITS} digits, rounded up. Negative bounds do not exist: their magnitude is shown. */
    public static String bound(double value) {
        return format(Math.abs(value), ERROR_DIGITS, RoundingMode.UP);
    }

    /** A value with a fixed number of decimals. */
    public static String fixed(double value, int decimals) {
        if (!Double.isFinite(value)) {
            return notFinite(value);
        }
        BigDecimal rounded = BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_EVEN);
        return rounded.toPlainString();
    }

    /** A length with {@link #LENGTH_DECIMALS} decimals. */
    public static String length(double value) {
        return fixed(value, LENGTH_DECIMALS);
    }

    /** A value for running text, at most the given decimals, without trailing zeros: -25, 0.5, 182.33. */
    public static String brief(double value, int decimals) {
        if (!Double.isFinite(value)) {
            return notFinite(value);
        }
        BigDecimal rounded = BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_EVEN);
        return rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString();
    }

    /** A stated quantity for running text as it was entered, at most six significant digits, without trailing zeros: 100, 0.2, 1e-6. */
    public static String stated(double value) {
        if (!Double.isFinite(value)) {
            return notFinite(value);
        }
        if (value == 0) {
            return "0";
        }
        BigDecimal rounded = BigDecimal.valueOf(value).round(new MathContext(6, RoundingMode.HALF_EVEN)).stripTrailingZeros();
        return plain(value) ? rounded.toPlainString() : scientific(rounded);
    }

    private static String format(double value, int digits, RoundingMode mode) {
        if (!Double.isFinite(value)) {
            return notFinite(value);
        }
        if (value == 0) {
            return "0";
        }
        BigDecimal rounded = BigDecimal.valueOf(value).round(new MathContext(digits, mode));
        int missing = digits - rounded.precision();
        // A value such as 0.5 has fewer digits than asked: zeros show that they are known.
        BigDecimal full = missing > 0 ? rounded.setScale(rounded.scale() + missing) : rounded;
        return plain(full.doubleValue()) ? full.toPlainString() : scientific(full);
    }

    private static boolean plain(double value) {
        double magnitude = Math.abs(value);
        return magnitude >= LEAST_PLAIN && magnitude < GREATEST_PLAIN;
    }

    private static String scientific(BigDecimal value) {
        String digits = value.unscaledValue().abs().toString();
        int exponent = digits.length() - 1 - value.scale();
        String mantissa = digits.length() == 1 ? digits : digits.charAt(0) + "." + digits.substring(1);
        return (value.signum() < 0 ? "-" : "") + mantissa + "e" + exponent;
    }

    private static String notFinite(double value) {
        return Double.isNaN(value) ? NONE : value > 0 ? "inf" : "-inf";
    }
}
