/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.plot;

import java.util.Objects;
import spanfield.model.FieldMeasure;
import spanfield.report.Units;

/**
 * How a plot is drawn.
 *
 * @param units   units of the axes and labels
 * @param measure scalar of the field that is drawn
 */
public record PlotOptions(Units units, FieldMeasure measure) {

    /** Microtesla, metres, resultant. */
    public static final PlotOptions DEFAULT = new PlotOptions(Units.SI, FieldMeasure.RESULTANT);

    public PlotOptions {
        Objects.requireNonNull(units);
        Objects.requireNonNull(measure);
    }
}
