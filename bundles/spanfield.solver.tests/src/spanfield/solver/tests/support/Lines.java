/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.tests.support;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.complex.Complex;
import spanfield.solver.Progress;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.field.Accuracy;
import spanfield.solver.field.FieldPhasors;
import spanfield.solver.field.MagneticFieldSolver;
import spanfield.solver.field.ObservationPoints;
import spanfield.solver.field.TransferCoefficients;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;
import spanfield.solver.geometry.Wire;
import spanfield.solver.geometry.WireEnd;
import spanfield.solver.geometry.WirePath;
import spanfield.solver.line.PhaseCurrents;

/** Straight level lines and short ways to solve them. */
public final class Lines {

    public static final double[] ABC = {0, Math.toRadians(-120), Math.toRadians(120)};

    private Lines() {
    }

    /** An endless straight level wire along Y. */
    public static Wire straight(String name, double x, double z) {
        return new Wire(name, WirePath.of(CatenarySpan.straight(new Position(x, -100, z), new Position(x, 100, z))), 0.0143);
    }

    /** A straight wire between two points that ends at both. */
    public static Wire finite(Position from, Position to) {
        return new Wire("finite", new WirePath(List.of(CatenarySpan.straight(from, to)), WireEnd.ENDS, WireEnd.ENDS), 0.01);
    }

    /** Endless straight level wires along Y. */
    public static List<Wire> straight(double[] x, double[] z) {
        List<Wire> wires = new ArrayList<>();
        for (int i = 0; i < x.length; i++) {
            wires.add(straight("wire " + i, x[i], z[i]));
        }
        return wires;
    }

    public static TransferCoefficients transfer(List<Wire> wires, ObservationPoints points, EarthReturn earth) {
        return MagneticFieldSolver.parallel().solve(wires, points, earth, Accuracy.DEFAULT, Progress.NONE);
    }

    public static FieldPhasors field(List<Wire> wires, ObservationPoints points, EarthReturn earth, Complex[] amperes) {
        return transfer(wires, points, earth).combine(amperes);
    }

    /** Currents of a circuit with the given order of phase letters, e.g. "CBA". */
    public static Complex[] circuit(double amperes, String order) {
        Complex[] abc = PhaseCurrents.balanced(amperes, 0, ABC);
        Complex[] currents = new Complex[order.length()];
        for (int i = 0; i < currents.length; i++) {
            currents[i] = abc[order.charAt(i) - 'A'];
        }
        return currents;
    }

    public static Complex[] concat(Complex[]... parts) {
        List<Complex> all = new ArrayList<>();
        for (Complex[] part : parts) {
            all.addAll(List.of(part));
        }
        return all.toArray(Complex[]::new);
    }

    /** Points at one height across the line at station 0. */
    public static ObservationPoints at(double height, double... x) {
        Position[] positions = new Position[x.length];
        for (int i = 0; i < x.length; i++) {
            positions[i] = new Position(x[i], 0, height);
        }
        return ObservationPoints.of(positions);
    }
}
