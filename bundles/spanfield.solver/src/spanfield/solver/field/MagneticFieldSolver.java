/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.field;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.IntStream;
import spanfield.solver.PhysicalConstants;
import spanfield.solver.Progress;
import spanfield.solver.SolverInputException;
import spanfield.solver.SolverInputException.Reason;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.geometry.Wire;
import spanfield.solver.geometry.WireEnd;

/**
 * Computes the magnetic field per ampere of sagged wires at points: Biot-Savart law along each wire's true path, complex images of the
 * same path, and the exact half-space correction.
 *
 * <p>Composition of {@link EarthModel#EXACT_HALF_SPACE}: free space along the true path, plus the complex image of the true path, plus
 * [exact half-space less complex image] of the infinite straight wire at the wire's mean height and offset in its mean direction. For a
 * straight level wire that is the exact half-space field; for lines with turns the geometry stays in the image, and the bracket, which
 * is the error of the image, is taken in the mean direction. A wire that ends has the share of the bracket that it has in the field of the
 * endless image.
 *
 * <p>Accuracy is relative to the resultant of balanced circuits: the coefficient of a wire is computed more finely the farther away the
 * point is, since balanced currents cancel there. The bound that the result carries holds in any case. Without state; thread-safe.
 */
public final class MagneticFieldSolver {

    /** mu0/(4 pi), tesla metre per ampere. */
    private static final double SCALE = PhysicalConstants.MU0 / (4 * Math.PI);

    /** Part of the asked accuracy that the quadrature of one wire may use up close to the line. */
    private static final double SHARE_NEARBY = 0.3;

    /** Part of a wire's quadrature tolerance that interpolation along rows of points may use. */
    private static final double SHARE_OF_ROWS = 0.3;

    /** Part of the asked accuracy that the images may use, relative to the image, which is far smaller than the field nearby. */
    private static final double SHARE_OF_EARTH = 0.3;

    /** Points from which the extent of the points is taken. */
    private static final int SAMPLES = 16;

    /** Phase distance in metres that sets how strongly balanced currents cancel: far coefficients are refined by (this / distance)^2. */
    private static final double CANCELLATION_LENGTH = 10;

    /** Factor on the error forms of the quadrature: over 90000 random points they were passed by at most 1.4 times, at errors of 1e-12. */
    private static final double SAFETY = 2;

    /** Finest relative accuracy that is asked of a quadrature in double precision. */
    private static final double FINEST = 1e-14;

    /** Width in metres beyond which a block of points is closed early. */
    private static final double BLOCK_WIDTH = 80;

    /** Least number of points of a block that is closed for its width. */
    private static final int LEAST_BLOCK = 8;

    private final boolean parallel;

    private MagneticFieldSolver(boolean parallel) {
        this.parallel = parallel;
    }

    /** A solver that uses every core. Its results are the same as those of {@link #sequential()}, bit by bit. */
    public static MagneticFieldSolver parallel() {
        return new MagneticFieldSolver(true);
    }

    /** A solver that stays on the calling thread. */
    public static MagneticFieldSolver sequential() {
        return new MagneticFieldSolver(false);
    }

    /**
     * Transfer coefficients of every wire at every point.
     *
     * @param wires    at least one
     * @param points   observation points, outside the wires
     * @param earth    earth model; when the earth is active both models are computed, so that their difference is known
     * @param accuracy relative accuracy asked
     * @param progress listener; cancels within a block of points
     * @throws SolverInputException                       for a point on or inside a wire, or where no complex image exists
     * @throws spanfield.solver.SolverCancelledException when the listener cancels
     */
    public TransferCoefficients solve(List<Wire> wires, ObservationPoints points, EarthReturn earth, Accuracy accuracy, Progress progress) {
        if (wires.isEmpty()) {
            throw new SolverInputException(Reason.SIZE_MISMATCH, "There is no wire to compute the field of");
        }
        progress.check();
        TransferCoefficients.Builder result = new TransferCoefficients.Builder(wires.size(), points.size(), earth, accuracy);
        FilamentField[] filaments = wires.stream().map(FilamentField::new).toArray(FilamentField[]::new);
        double earthRelative = Math.max(FINEST, accuracy.relative() * SHARE_OF_EARTH * cancellation(extent(filaments, points)));
        EarthField earthField = earth.active() && points.size() > 0 ? new EarthField(wires, points, earth, earthRelative) : null;
        int[] blocks = blocks(points);
        AtomicInteger done = new AtomicInteger();
        IntStream range = IntStream.range(0, blocks.length - 1);
        (parallel && blocks.length > 2 ? range.parallel() : range).forEach(b -> {
            progress.check();
            PointBlock block = new PointBlock();
            block.load(points, blocks[b], blocks[b + 1]);
            solveBlock(block, filaments, earthField, accuracy, result);
            progress.report(done.incrementAndGet() / (double) (blocks.length - 1));
        });
        progress.check();
        for (Wire wire : wires) {
            if (wire.path().start() == WireEnd.ENDS || wire.path().finish() == WireEnd.ENDS) {
                result.warn("Wire '" + wire.name() + "' ends: its current path is open there, and the field of an open path is not unique.");
            }
        }
        return result.build();
    }

    private void solveBlock(PointBlock block, FilamentField[] filaments, EarthField earth, Accuracy accuracy, TransferCoefficients.Builder result) {
        SourceNodes nodes = new SourceNodes();
        double[] relatives = new double[filaments.length];
        double finest = 1;
        for (int w = 0; w < filaments.length; w++) {
            relatives[w] = Math.max(FINEST, accuracy.relative() * SHARE_NEARBY * filaments[w].cancellation(block, CANCELLATION_LENGTH));
            finest = Math.min(finest, relatives[w]);
        }
        double[] distances = new double[filaments.length];
        for (int w = 0; w < filaments.length; w++) {
            distances[w] = filaments[w].distanceBelow(block);
        }
        RowInterpolation row = RowInterpolation.reaching(block, finest * SHARE_OF_ROWS, distances);
        RowInterpolation.Choice rows = new RowInterpolation.Choice();
        double[] imageError = {0};
        double[][] images = earth == null ? null : earth.images(block, imageError);
        double[][] differences = new double[EarthField.VALUES][block.count];
        for (int w = 0; w < filaments.length; w++) {
            block.clearSums();
            double error = SCALE * (SAFETY * filaments[w].addTo(block, row, nodes, relatives[w]) + imageError[0]);
            if (earth != null) {
                error += earth.differences(w, block, rows, SCALE * relatives[w] / filaments[w].farthest(block), differences);
                result.setDifferences(w, block.first, differences);
            }
            for (int i = 0; i < block.count; i++) {
                int point = block.first + i;
                result.set(w, point, SCALE * block.sumX[i], SCALE * block.sumY[i], SCALE * block.sumZ[i], error);
                if (earth != null) {
                    result.addImage(w, point, SCALE, images[i], w * EarthField.VALUES);
                }
            }
        }
    }

    private static double cancellation(double distance) {
        double ratio = CANCELLATION_LENGTH / distance;
        return Math.min(1, ratio * ratio);
    }

    /** Greatest distance of a point to the nearest wire, in metres, from samples of the points. */
    private static double extent(FilamentField[] filaments, ObservationPoints points) {
        double greatest = 0;
        int step = Math.max(1, points.size() / SAMPLES);
        for (int i = 0; i < points.size(); i += step) {
            double nearest = Double.POSITIVE_INFINITY;
            for (FilamentField filament : filaments) {
                nearest = Math.min(nearest, filament.distanceAbove(points.x(i), points.y(i), points.z(i)));
            }
            greatest = Math.max(greatest, nearest);
        }
        return greatest;
    }

    /** Bounds of the blocks: runs of points up to the capacity, closed early where the run gets wide. */
    private static int[] blocks(ObservationPoints points) {
        List<Integer> bounds = new ArrayList<>();
        bounds.add(0);
        int first = 0;
        for (int i = 1; i < points.size(); i++) {
            boolean full = i - first == PointBlock.CAPACITY;
            boolean wide = i - first >= LEAST_BLOCK && Math.abs(points.x(i) - points.x(first)) + Math.abs(points.y(i) - points.y(first)) > BLOCK_WIDTH;
            if (full || wide) {
                bounds.add(i);
                first = i;
            }
        }
        if (points.size() > 0) {
            bounds.add(points.size());
        }
        return bounds.stream().mapToInt(Integer::intValue).toArray();
    }
}
