/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

import org.apache.commons.math3.complex.Complex;

/**
 * A phasor, RMS, time factor exp(+j omega t). The unit is that of the place where it stands (ampere or tesla).
 *
 * @param real      real part
 * @param imaginary imaginary part
 */
public record Phasor(double real, double imaginary) {

    /** No current, no field. */
    public static final Phasor ZERO = new Phasor(0, 0);

    /** The phasor of a complex number. */
    public static Phasor of(Complex value) {
        return new Phasor(value.getReal(), value.getImaginary());
    }

    /** RMS magnitude, in the phasor's unit. */
    public double magnitude() {
        return Math.hypot(real, imaginary);
    }

    /** Angle in degrees, above -180 to 180; 0 for the zero phasor. */
    public double angleDegrees() {
        return magnitude() == 0 ? 0 : Math.toDegrees(Math.atan2(imaginary, real));
    }

    /** Sum with another phasor of the same unit. */
    public Phasor plus(Phasor other) {
        return new Phasor(real + other.real, imaginary + other.imaginary);
    }

    /** The phasor of opposite sign. */
    public Phasor negated() {
        return new Phasor(-real, -imaginary);
    }
}
