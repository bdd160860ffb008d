/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

import java.util.Objects;

/**
 * Units of a report.
 *
 * @param field  unit of the magnetic flux density
 * @param length unit of lengths: offsets, stations, heights, elevations
 */
public record Units(FieldUnit field, LengthUnit length) {

    /** Microtesla and metres. */
    public static final Units SI = new Units(FieldUnit.MICROTESLA, LengthUnit.METRE);

    public Units {
        Objects.requireNonNull(field);
        Objects.requireNonNull(length);
    }
}
