/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.plot;

import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;

/** Finds free places for labels in a drawing: each label takes the candidate that touches the least of what is already there. */
final class LabelPlacer {

    /** Touching another label is as bad as touching this many pieces of curve. */
    private static final int LABEL_WEIGHT = 1000;

    /** Leaving the area makes a label unreadable. */
    private static final int OUTSIDE_WEIGHT = 100_000;

    private final Rectangle2D area;
    private final List<Rectangle2D> labels = new ArrayList<>();
    private final List<Line2D> lines = new ArrayList<>();

    /** An empty area, in the units of the drawing. */
    LabelPlacer(Rectangle2D area) {
        this.area = area;
    }

    /** Adds a piece of a curve that labels had better not cover. */
    void avoid(Line2D line) {
        lines.add(line);
    }

    /** Adds a rectangle that labels must not cover. */
    void avoid(Rectangle2D rectangle) {
        labels.add(rectangle);
    }

    /** The first of the best candidates, which is then taken. */
    Rectangle2D place(List<Rectangle2D> candidates) {
        Rectangle2D best = candidates.get(0);
        int least = Integer.MAX_VALUE;
        for (Rectangle2D candidate : candidates) {
            int cost = cost(candidate);
            if (cost < least) {
                least = cost;
                best = candidate;
            }
        }
        labels.add(best);
        return best;
    }

    /** Takes the place if no other label has it. */
    boolean takeIfFree(Rectangle2D place) {
        if (labels.stream().anyMatch(place::intersects)) {
            return false;
        }
        labels.add(place);
        return true;
    }

    private int cost(Rectangle2D candidate) {
        int cost = area.contains(candidate) ? 0 : OUTSIDE_WEIGHT;
        cost += LABEL_WEIGHT * (int) labels.stream().filter(candidate::intersects).count();
        return cost + (int) lines.stream().filter(line -> line.intersects(candidate)).count();
    }
}
