/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

import spanfield.model.FieldMeasure;

/**
 * The magnetic field at a point in its scalar measures (IEEE Std 644, IEC 61786-1), tesla RMS.
 *
 * @param resultantTesla      sqrt(|Bx|^2 + |By|^2 + |Bz|^2)
 * @param majorAxisTesla      major semi-axis of the field ellipse, at most the resultant
 * @param minorAxisTesla      minor semi-axis of the field ellipse
 * @param numericalErrorTesla bound of the numerical error of each of the three measures
 * @param modelErrorTesla     estimate of what the choice of earth model means: the greater of the differences of resultant and major axis
 *                            between the two earth models; NaN where no earth model is active, so that there is nothing to compare with
 */
public record FieldValue(double resultantTesla, double majorAxisTesla, double minorAxisTesla, double numericalErrorTesla,
    double modelErrorTesla) {

    /** A measure of the field in tesla RMS. */
    public double tesla(FieldMeasure measure) {
        return measure == FieldMeasure.MAJOR_AXIS ? majorAxisTesla : resultantTesla;
    }

    /** Minor over major semi-axis, 0 (linear) to 1 (circular); 0 without field. */
    public double axialRatio() {
        return majorAxisTesla == 0 ? 0 : minorAxisTesla / majorAxisTesla;
    }

    /** Whether {@link #modelErrorTesla} is an estimate: false without an active earth model. */
    public boolean modelErrorKnown() {
        return !Double.isNaN(modelErrorTesla);
    }

    /** Numerical bound plus model error in tesla, the latter where it is known. */
    public double uncertaintyTesla() {
        return modelErrorKnown() ? numericalErrorTesla + modelErrorTesla : numericalErrorTesla;
    }
}
