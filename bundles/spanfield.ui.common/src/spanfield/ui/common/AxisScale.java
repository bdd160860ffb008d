/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.common;

import java.util.ArrayList;
import java.util.List;

/**
 * The one place where values of a chart axis become pixels and back, linear or logarithmic. Immutable.
 */
public final class AxisScale {

    private final double low;
    private final double high;
    private final double lowPixel;
    private final double highPixel;
    private final boolean logarithmic;

    /**
     * @param low         value at the low pixel; positive for a logarithmic scale
     * @param high        value at the high pixel, greater than low
     * @param lowPixel    pixel of the low value
     * @param highPixel   pixel of the high value; may be less than the low one, as on a vertical axis
     * @param logarithmic whether decades are equal lengths
     */
    public AxisScale(double low, double high, double lowPixel, double highPixel, boolean logarithmic) {
        if (!(high > low) || logarithmic && !(low > 0)) {
            throw new IllegalArgumentException("an axis from " + low + " to " + high);
        }
        this.low = low;
        this.high = high;
        this.lowPixel = lowPixel;
        this.highPixel = highPixel;
        this.logarithmic = logarithmic;
    }

    /** Pixel of a value; values below a logarithmic scale fall on its low end. */
    public int toPixel(double value) {
        double share = logarithmic ? Math.log(Math.max(value, low) / low) / Math.log(high / low) : (value - low) / (high - low);
        return (int) Math.round(lowPixel + share * (highPixel - lowPixel));
    }

    /** Value at a pixel. */
    public double toValue(double pixel) {
        double share = (pixel - lowPixel) / (highPixel - lowPixel);
        return logarithmic ? low * Math.pow(high / low, share) : low + share * (high - low);
    }

    /** Values at which ticks stand: multiples of 1, 2 or 5 times a power of ten, about {@code wanted} of them, or decades. */
    public List<Double> ticks(int wanted) {
        List<Double> ticks = new ArrayList<>();
        if (logarithmic) {
            for (double decade = Math.pow(10, Math.ceil(Math.log10(low) - 1e-9)); decade <= high * (1 + 1e-9); decade *= 10) {
                ticks.add(decade);
            }
            return ticks;
        }
        double step = niceStep((high - low) / Math.max(1, wanted));
        for (long k = (long) Math.ceil(low / step - 1e-9); k * step <= high + 1e-9 * step; k++) {
            ticks.add(k * step);
        }
        return ticks;
    }

    /** The least of 1, 2, 5 times a power of ten that is not below a number. */
    public static double niceStep(double rough) {
        double power = Math.pow(10, Math.floor(Math.log10(rough)));
        for (double factor : new double[] {1, 2, 5}) {
            if (factor * power >= rough * (1 - 1e-9)) {
                return factor * power;
            }
        }
        return 10 * power;
    }

    /** A round number at or above a value, for the end of an axis. */
    public static double niceEnd(double value) {
        double step = niceStep(value / 5);
        return Math.ceil(value / step * (1 - 1e-12)) * step;
    }
}
