/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.Map;
import spanfield.solver.Progress;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.field.Accuracy;
import spanfield.solver.field.MagneticFieldSolver;
import spanfield.solver.field.ObservationPoints;
import spanfield.solver.field.TransferCoefficients;
import spanfield.solver.geometry.Position;

/**
 * Computes transfer coefficients, one source for every phase and shield wire, and remembers the latest: as long as wires, points, earth and
 * accuracy stay the same, changed loads and phase orders cost no integration. What it returns does not depend on what it remembers.
 * Thread-safe.
 */
public final class CoefficientStore {

    /** Numbers kept at most: 64 MB of double precision. */
    private static final long GREATEST_SIZE = 8L << 20;

    /** Numbers of a coefficient: three complex components in two earth models, and an error bound. */
    private static final long NUMBERS_PER_COEFFICIENT = 13;

    private final MagneticFieldSolver solver;
    private final Map<DoubleKey, TransferCoefficients> entries = new LinkedHashMap<>(16, 0.75f, true);
    private long size;
    private long solves;

    /** An empty store that computes with all cores. */
    public CoefficientStore() {
        this.solver = MagneticFieldSolver.parallel();
    }

    /** How often coefficients had to be computed so far. */
    public synchronized long solves() {
        return solves;
    }

    /**
     * Coefficients of every conductor of a state at points, in tesla per ampere.
     *
     * @param relative accuracy asked of the solver, within its limits
     */
    TransferCoefficients get(GeometryState state, Position[] points, EarthReturn earth, double relative, Progress progress) {
        DoubleKey key = key(state, points, earth, relative);
        synchronized (this) {
            TransferCoefficients known = entries.get(key);
            if (known != null) {
                return known;
            }
            solves++;
        }
        TransferCoefficients single = solver.solve(state.wires(), ObservationPoints.of(points), earth, new Accuracy(relative), progress);
        TransferCoefficients merged = single.merge(state.conductorOfWire(), state.weightOfWire(), state.conductors().size());
        remember(key, merged);
        return merged;
    }

    private static DoubleKey key(GeometryState state, Position[] points, EarthReturn earth, double relative) {
        DoubleKey.Builder key = new DoubleKey.Builder();
        key.add(state.key());
        key.add(earth.model().ordinal(), earth.resistivityOhmMetres(), earth.frequencyHertz(), earth.planeElevationMetres(), relative);
        for (Position p : points) {
            key.add(p.x(), p.y(), p.z());
        }
        return key.build();
    }

    private synchronized void remember(DoubleKey key, TransferCoefficients coefficients) {
        long added = weight(coefficients);
        if (added > GREATEST_SIZE || entries.putIfAbsent(key, coefficients) != null) {
            return;
        }
        size += added;
        Iterator<Map.Entry<DoubleKey, TransferCoefficients>> oldest = entries.entrySet().iterator();
        while (size > GREATEST_SIZE && oldest.hasNext()) {
            size -= weight(oldest.next().getValue());
            oldest.remove();
        }
    }

    private static long weight(TransferCoefficients coefficients) {
        return NUMBERS_PER_COEFFICIENT * coefficients.sourceCount() * coefficients.pointCount();
    }
}
