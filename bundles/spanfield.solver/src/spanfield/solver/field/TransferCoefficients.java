/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.field;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.complex.Complex;
import spanfield.solver.SolverInputException;
import spanfield.solver.SolverInputException.Reason;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.earth.EarthReturn;

/**
 * Field per ampere of sources (wires, or phases merged from subconductors) at points: the linear operator from current phasors to field
 * phasors. Load cases and phase orders are linear combinations of it. Immutable.
 *
 * <p>Unit: tesla per ampere; components 0 = X (right), 1 = Y (ahead), 2 = Z (up). Coefficients are complex where an earth model is
 * active. The operator holds the field with complex images and, beside it, the difference of the exact half-space to the images.
 */
public final class TransferCoefficients {

    private final int sources;
    private final int points;
    private final EarthReturn earth;
    private final Accuracy asked;
    private final double[][][] re;
    private final double[][][] im;
    private final double[][][] differenceRe;
    private final double[][][] differenceIm;
    private final double[][] error;
    private final List<String> warnings;

    private TransferCoefficients(int sources, int points, EarthReturn earth, Accuracy asked, double[][][] re, double[][][] im,
        double[][][] differenceRe, double[][][] differenceIm, double[][] error, List<String> warnings) {
        this.sources = sources;
        this.points = points;
        this.earth = earth;
        this.asked = asked;
        this.re = re;
        this.im = im;
        this.differenceRe = differenceRe;
        this.differenceIm = differenceIm;
        this.error = error;
        this.warnings = List.copyOf(warnings);
    }

    /** Number of sources. */
    public int sourceCount() {
        return sources;
    }

    /** Number of points. */
    public int pointCount() {
        return points;
    }

    /** Earth of the solve; its model is the one that {@link #combine(Complex[])} reports. */
    public EarthReturn earth() {
        return earth;
    }

    /** Accuracy that was asked of the solve. */
    public Accuracy askedAccuracy() {
        return asked;
    }

    /** Warnings of the solve, in whole sentences. */
    public List<String> warnings() {
        return warnings;
    }

    /** A coefficient under the earth model of the solve, in tesla per ampere. */
    public Complex coefficient(int source, int component, int point) {
        return coefficient(source, component, point, earth.model());
    }

    /** A coefficient under an earth model, in tesla per ampere; {@link EarthModel#NONE} only when the solve had no active earth. */
    public Complex coefficient(int source, int component, int point, EarthModel model) {
        requireModel(model);
        double real = re[source][component][point];
        double imaginary = im == null ? 0 : im[source][component][point];
        if (im != null && model == EarthModel.EXACT_HALF_SPACE) {
            real += differenceRe[source][component][point];
            imaginary += differenceIm[source][component][point];
        }
        return new Complex(real, imaginary);
    }

    /** Bound of the magnitude of the numerical error of a source's coefficient vector at a point, in tesla per ampere. */
    public double numericalError(int source, int point) {
        return error[source][point];
    }

    /**
     * Coefficients of a source under the earth model of the solve, as new arrays [part][component][point], part 0 real and 1 imaginary, in
     * tesla per ampere: for work that combines many load states.
     */
    public double[][][] coefficients(int source) {
        double[][][] copy = new double[2][3][points];
        boolean exact = earth.model() == EarthModel.EXACT_HALF_SPACE && im != null;
        for (int c = 0; c < 3; c++) {
            for (int i = 0; i < points; i++) {
                copy[0][c][i] = re[source][c][i] + (exact ? differenceRe[source][c][i] : 0);
                copy[1][c][i] = im == null ? 0 : im[source][c][i] + (exact ? differenceIm[source][c][i] : 0);
            }
        }
        return copy;
    }

    /**
     * Merges sources into groups: the coefficient of a group is the weighted sum of its members, as for a bundle whose subconductors share
     * the current.
     *
     * @param groupOfSource group of each source, 0 to groups - 1, or -1 to leave it out
     * @param weightOfSource weight of each source, for a bundle one over the number of subconductors
     * @param groups        number of groups
     */
    public TransferCoefficients merge(int[] groupOfSource, double[] weightOfSource, int groups) {
        if (groupOfSource.length != sources || weightOfSource.length != sources) {
            throw new SolverInputException(Reason.SIZE_MISMATCH, "Groups and weights are needed for each of " + sources + " sources");
        }
        Builder merged = new Builder(groups, points, earth, asked);
        for (int s = 0; s < sources; s++) {
            int g = groupOfSource[s];
            if (g < 0) {
                continue;
            }
            double weight = weightOfSource[s];
            for (int c = 0; c < 3; c++) {
                addScaled(merged.re[g][c], re[s][c], weight);
                if (im != null) {
                    addScaled(merged.im[g][c], im[s][c], weight);
                    addScaled(merged.differenceRe[g][c], differenceRe[s][c], weight);
                    addScaled(merged.differenceIm[g][c], differenceIm[s][c], weight);
                }
            }
            addScaled(merged.error[g], error[s], Math.abs(weight));
        }
        warnings.forEach(merged::warn);
        return merged.build();
    }

    private static void addScaled(double[] target, double[] source, double factor) {
        for (int i = 0; i < target.length; i++) {
            target[i] += factor * source[i];
        }
    }

    /** Field phasors for current phasors, one of each source in amperes RMS, under the earth model of the solve. */
    public FieldPhasors combine(Complex[] amperes) {
        return combine(amperes, earth.model());
    }

    /** Field phasors for current phasors under an earth model. */
    public FieldPhasors combine(Complex[] amperes, EarthModel model) {
        requireModel(model);
        if (amperes.length != sources) {
            throw new SolverInputException(Reason.SIZE_MISMATCH, "There are " + sources + " sources, but " + amperes.length + " currents");
        }
        double[][] imageRe = new double[3][points];
        double[][] imageIm = new double[3][points];
        double[] bound = new double[points];
        for (int s = 0; s < sources; s++) {
            double a = SolverInputException.requireWithin("real part of current " + s + " in amperes", amperes[s].getReal(), -1e9, 1e9);
            double b = SolverInputException.requireWithin("imaginary part of current " + s + " in amperes", amperes[s].getImaginary(), -1e9, 1e9);
            addProduct(re[s], im == null ? null : im[s], a, b, imageRe, imageIm);
            addBound(s, Math.hypot(a, b), bound);
        }
        if (im == null) {
            return new FieldPhasors(imageRe, imageIm, bound, new double[points]);
        }
        double[][] exactRe = copy(imageRe);
        double[][] exactIm = copy(imageIm);
        for (int s = 0; s < sources; s++) {
            addProduct(differenceRe[s], differenceIm[s], amperes[s].getReal(), amperes[s].getImaginary(), exactRe, exactIm);
        }
        double[] modelError = new double[points];
        for (int i = 0; i < points; i++) {
            modelError[i] = Math.abs(FieldPhasors.resultant(exactRe, exactIm, i) - FieldPhasors.resultant(imageRe, imageIm, i));
        }
        return model == EarthModel.EXACT_HALF_SPACE ? new FieldPhasors(exactRe, exactIm, bound, modelError)
            : new FieldPhasors(imageRe, imageIm, bound, modelError);
    }

    /** Quadrature bound plus rounding: each coefficient is a sum of some hundred terms, accumulated with random rounding. */
    private void addBound(int source, double magnitude, double[] bound) {
        final double rounding = 64 * Math.ulp(1.0);
        double[][] r = re[source];
        for (int i = 0; i < points; i++) {
            double size = Math.abs(r[0][i]) + Math.abs(r[1][i]) + Math.abs(r[2][i]);
            bound[i] += magnitude * (error[source][i] + rounding * size);
        }
    }

    private static void addProduct(double[][] re, double[][] im, double a, double b, double[][] sumRe, double[][] sumIm) {
        for (int c = 0; c < 3; c++) {
            for (int i = 0; i < re[c].length; i++) {
                double imaginary = im == null ? 0 : im[c][i];
                sumRe[c][i] += re[c][i] * a - imaginary * b;
                sumIm[c][i] += re[c][i] * b + imaginary * a;
            }
        }
    }

    private static double[][] copy(double[][] array) {
        return new double[][] {array[0].clone(), array[1].clone(), array[2].clone()};
    }

    private void requireModel(EarthModel model) {
        if (im != null && model == EarthModel.NONE) {
            throw new IllegalArgumentException("this operator was solved with an earth model; solve again without one");
        }
    }

    /** Filled by the solver, one writer for each point. */
    static final class Builder {

        private final EarthReturn earth;
        private final Accuracy asked;
        private final int points;
        private final double[][][] re;
        private final double[][][] im;
        private final double[][][] differenceRe;
        private final double[][][] differenceIm;
        private final double[][] error;
        private final List<String> warnings = new ArrayList<>();

        Builder(int sources, int points, EarthReturn earth, Accuracy asked) {
            this.earth = earth;
            this.asked = asked;
            this.points = points;
            re = new double[sources][3][points];
            im = earth.active() ? new double[sources][3][points] : null;
            differenceRe = earth.active() ? new double[sources][3][points] : null;
            differenceIm = earth.active() ? new double[sources][3][points] : null;
            error = new double[sources][points];
        }

        void set(int source, int point, double x, double y, double z, double bound) {
            re[source][0][point] = x;
            re[source][1][point] = y;
            re[source][2][point] = z;
            error[source][point] = bound;
        }

        void addImage(int source, int point, double scale, double[] values, int at) {
            for (int c = 0; c < 3; c++) {
                re[source][c][point] += scale * values[at + 2 * c];
                im[source][c][point] = scale * values[at + 2 * c + 1];
            }
        }

        /** Values from the point {@code first} on, [value][point]. */
        void setDifferences(int source, int first, double[][] values) {
            for (int c = 0; c < 3; c++) {
                System.arraycopy(values[2 * c], 0, differenceRe[source][c], first, values[2 * c].length);
                System.arraycopy(values[2 * c + 1], 0, differenceIm[source][c], first, values[2 * c + 1].length);
            }
        }

        void warn(String warning) {
            warnings.add(warning);
        }

        TransferCoefficients build() {
            return new TransferCoefficients(re.length, points, earth, asked, re, im, differenceRe, differenceIm, error, warnings);
        }
    }
}
