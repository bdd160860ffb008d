/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

import java.util.Arrays;

/**
 * The magnetic field of one load case at a run of points, with its phasors. Components 0 = X, 1 = Y, 2 = Z of the plan: on a straight
 * corridor to the right, ahead, up. Immutable.
 */
public final class FieldSeries {

    private final FieldValue[] values;
    private final Phasor[][] components;

    /**
     * @param values     measures, [point]
     * @param components phasors in tesla RMS, [component][point], three components
     */
    public FieldSeries(FieldValue[] values, Phasor[][] components) {
        if (components.length != 3) {
            throw new IllegalArgumentException("three components are needed, not " + components.length);
        }
        this.values = values.clone();
        this.components = new Phasor[3][];
        for (int c = 0; c < 3; c++) {
            if (components[c].length != values.length) {
                throw new IllegalArgumentException("component " + c + " has " + components[c].length + " points, not " + values.length);
            }
            this.components[c] = components[c].clone();
        }
    }

    /** Number of points. */
    public int size() {
        return values.length;
    }

    /** Measures at a point. */
    public FieldValue value(int point) {
        return values[point];
    }

    /** Phasor of a component (0 = X, 1 = Y, 2 = Z) at a point, in tesla RMS. */
    public Phasor component(int component, int point) {
        return components[component][point];
    }

    /** The resultant at every point in tesla RMS, as a new array. */
    public double[] resultantsTesla() {
        return Arrays.stream(values).mapToDouble(FieldValue::resultantTesla).toArray();
    }

    /** The major semi-axis at every point in tesla RMS, as a new array. */
    public double[] majorAxesTesla() {
        return Arrays.stream(values).mapToDouble(FieldValue::majorAxisTesla).toArray();
    }
}
