/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.field;

import org.apache.commons.math3.complex.Complex;

/**
 * Phasors of the magnetic field at points and their scalar measures (IEEE Std 644, IEC 61786-1). RMS, tesla, time factor
 * exp(+j omega t); components 0 = X (right), 1 = Y (ahead), 2 = Z (up). Immutable.
 */
public final class FieldPhasors {

    private final double[][] re;
    private final double[][] im;
    private final double[] numericalError;
    private final double[] modelError;

    FieldPhasors(double[][] re, double[][] im, double[] numericalError, double[] modelError) {
        this.re = re;
        this.im = im;
        this.numericalError = numericalError;
        this.modelError = modelError;
    }

    /** Number of points. */
    public int size() {
        return numericalError.length;
    }

    /** A component's phasor at a point, in tesla RMS. */
    public Complex component(int component, int point) {
        return new Complex(re[component][point], im[component][point]);
    }

    /** Resultant sqrt(|Bx|^2 + |By|^2 + |Bz|^2) at a point, in tesla RMS. */
    public double resultantTesla(int point) {
        return resultant(re, im, point);
    }

    static double resultant(double[][] re, double[][] im, int i) {
        return Math.sqrt(re[0][i] * re[0][i] + re[1][i] * re[1][i] + re[2][i] * re[2][i]
            + im[0][i] * im[0][i] + im[1][i] * im[1][i] + im[2][i] * im[2][i]);
    }

    /** Major semi-axis of the field ellipse, sqrt((S + |Q|)/2) with S the squared resultant and Q = Bx^2 + By^2 + Bz^2, in tesla RMS. */
    public double majorAxisTesla(int point) {
        double s = 0;
        double qr = 0;
        double qi = 0;
        for (int c = 0; c < 3; c++) {
            double a = re[c][point];
            double b = im[c][point];
            s += a * a + b * b;
            qr += a * a - b * b;
            qi += 2 * a * b;
        }
        return Math.sqrt((s + Math.hypot(qr, qi)) / 2);
    }

    /** Minor semi-axis, |Re B x Im B| / major, in tesla RMS; 0 without field. The difference form would cancel for linear fields. */
    public double minorAxisTesla(int point) {
        double major = majorAxisTesla(point);
        if (major == 0) {
            return 0;
        }
        double cx = re[1][point] * im[2][point] - re[2][point] * im[1][point];
        double cy = re[2][point] * im[0][point] - re[0][point] * im[2][point];
        double cz = re[0][point] * im[1][point] - re[1][point] * im[0][point];
        return Math.sqrt(cx * cx + cy * cy + cz * cz) / major;
    }

    /** Minor over major semi-axis, 0 (linear) to 1 (circular); 0 without field. */
    public double axialRatio(int point) {
        double major = majorAxisTesla(point);
        return major == 0 ? 0 : minorAxisTesla(point) / major;
    }

    /**
     * Unit vector along the major axis, components X, Y, Z, the one of the two with Z not negative (then X not negative). Without field the
     * zero vector; in a circular field some direction of the plane.
     */
    public double[] majorAxisDirection(int point) {
        double qr = 0;
        double qi = 0;
        for (int c = 0; c < 3; c++) {
            qr += re[c][point] * re[c][point] - im[c][point] * im[c][point];
            qi += 2 * re[c][point] * im[c][point];
        }
        // At the phase -arg(Q)/2 the vector Re(B exp(j phase)) is the major axis.
        double phase = -Math.atan2(qi, qr) / 2;
        double[] axis = new double[3];
        double square = 0;
        for (int c = 0; c < 3; c++) {
            axis[c] = re[c][point] * Math.cos(phase) - im[c][point] * Math.sin(phase);
            square += axis[c] * axis[c];
        }
        if (square == 0) {
            return axis;
        }
        boolean turn = axis[2] < 0 || axis[2] == 0 && axis[0] < 0;
        double scale = (turn ? -1 : 1) / Math.sqrt(square);
        for (int c = 0; c < 3; c++) {
            axis[c] *= scale;
        }
        return axis;
    }

    /** Bound of the numerical error of the field vector at a point, in tesla RMS: holds for the resultant and both semi-axes. */
    public double numericalErrorTesla(int point) {
        return numericalError[point];
    }

    /** Difference of the resultant between the exact half-space and the complex images, in tesla RMS; 0 without an active earth. */
    public double modelErrorTesla(int point) {
        return modelError[point];
    }
}
