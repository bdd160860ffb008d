/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

import java.util.Optional;

/** Units in which lengths are shown. Results hold metres; only this class knows the factors. */
public enum LengthUnit {

    /** Metre. */
    METRE("m", 1),
    /** International foot, 0.3048 metres exactly (international yard and pound agreement, 1959). */
    FOOT("ft", 0.3048);

    private final String code;
    private final double metres;

    LengthUnit(String code, double metres) {
        this.code = code;
        this.metres = metres;
    }

    /** The unit as printed and as typed: m, ft. */
    public String code() {
        return code;
    }

    /** Converts metres to this unit. */
    public double fromMetres(double value) {
        return value / metres;
    }

    /** Converts this unit to metres. */
    public double toMetres(double value) {
        return value * metres;
    }

    /** The unit of a code (m, ft), case-sensitive. */
    public static Optional<LengthUnit> ofCode(String code) {
        for (LengthUnit unit : values()) {
            if (unit.code.equals(code)) {
                return Optional.of(unit);
            }
        }
        return Optional.empty();
    }
}
