/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Wire;
import spanfield.solver.geometry.WirePath;
import spanfield.study.CorridorPlan;

/**
 * All wires of a study at one wind swing. Conductors stand in a fixed order (lines in the order of the study, attachments by name), so
 * that changing loads or moving phases to other attachments of the same bundle leaves the wires, and the coefficients computed for them,
 * as they are. Immutable.
 */
public final class GeometryState {

    private final double swing;
    private final List<StrungConductor> conductors;
    private final List<WirePath> centres;
    private final List<Wire> wires;
    private final int[] conductorOfWire;
    private final double[] weightOfWire;
    private final DoubleKey key;
    private final GroundClearance[][] clearances;

    /** @param conductors all strung conductors of the study, in their fixed order */
    GeometryState(List<StrungConductor> conductors, CorridorPlan plan, double swing) {
        this.swing = swing;
        this.conductors = List.copyOf(conductors);
        this.centres = conductors.stream().map(c -> c.centre(plan, swing)).toList();
        List<Wire> all = new ArrayList<>();
        List<Integer> owner = new ArrayList<>();
        for (int i = 0; i < conductors.size(); i++) {
            for (Wire wire : conductors.get(i).wires(plan, swing)) {
                all.add(wire);
                owner.add(i);
            }
        }
        this.wires = List.copyOf(all);
        this.conductorOfWire = owner.stream().mapToInt(Integer::intValue).toArray();
        this.weightOfWire = Arrays.stream(conductorOfWire).mapToDouble(i -> 1.0 / conductors.get(i).element().bundleCount()).toArray();
        this.key = key(wires, conductorOfWire);
        this.clearances = new GroundClearance[conductors.size()][];
        for (int i = 0; i < clearances.length; i++) {
            StrungConductor c = conductors.get(i);
            clearances[i] = centres.get(i).spans().stream().map(s -> GroundClearance.of(s, c.bundleDrop(), c.bundleHalfWidth(), plan))
                .toArray(GroundClearance[]::new);
        }
    }

    private static DoubleKey key(List<Wire> wires, int[] conductorOfWire) {
        DoubleKey.Builder key = new DoubleKey.Builder();
        for (int w = 0; w < conductorOfWire.length; w++) {
            WirePath path = wires.get(w).path();
            key.add(conductorOfWire[w], wires.get(w).radiusMetres(), path.start().ordinal(), path.finish().ordinal());
            key.add(path.first().x(), path.first().y(), path.first().z());
            for (CatenarySpan span : path.spans()) {
                key.add(span.end().x(), span.end().y(), span.end().z(), span.constantMetres(), span.swingRadians());
            }
        }
        return key.build();
    }

    /** Wind swing in radians. */
    double swing() {
        return swing;
    }

    /** Phases and shield wires. */
    List<StrungConductor> conductors() {
        return conductors;
    }

    /** Path of the bundle's centre, [conductor]. */
    WirePath centre(int conductor) {
        return centres.get(conductor);
    }

    /** Single wires: every subconductor. */
    List<Wire> wires() {
        return wires;
    }

    /** Conductor to which each wire belongs, as a new array. */
    int[] conductorOfWire() {
        return conductorOfWire.clone();
    }

    /** Share of the conductor's current in each wire, as a new array. */
    double[] weightOfWire() {
        return weightOfWire.clone();
    }

    /** Least clearance of a conductor in a span. */
    GroundClearance clearance(int conductor, int span) {
        return clearances[conductor][span];
    }

    /** Single wires of a line by its index: every subconductor. */
    List<Wire> wires(int line) {
        List<Wire> own = new ArrayList<>();
        for (int w = 0; w < conductorOfWire.length; w++) {
            if (conductors.get(conductorOfWire[w]).line().index() == line) {
                own.add(wires.get(w));
            }
        }
        return List.copyOf(own);
    }

    /** Least clearance of all conductors in metres. */
    double leastClearance() {
        return Arrays.stream(clearances).flatMap(Arrays::stream).mapToDouble(GroundClearance::metres).min().orElseThrow();
    }

    /** Identity of the wires for caching. */
    DoubleKey key() {
        return key;
    }
}
