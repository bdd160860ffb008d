/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

import java.util.Optional;

/** Units in which the magnetic flux density is shown. Results hold tesla; only this class knows the factors. */
public enum FieldUnit {

    /** Microtesla, 1e-6 tesla. */
    MICROTESLA("uT", "\u00b5T", 1e6),
    /** Milligauss, 1e-7 tesla: the gauss is 1e-4 tesla. */
    MILLIGAUSS("mG", "mG", 1e7);

    private final String code;
    private final String symbol;
    private final double perTesla;

    FieldUnit(String code, String symbol, double perTesla) {
        this.code = code;
        this.symbol = symbol;
        this.perTesla = perTesla;
    }

    /** The unit in ASCII, as in the headings of CSV files and on the command line: uT, mG. */
    public String code() {
        return code;
    }

    /** The unit as printed for people: \u00b5T, mG. */
    public String symbol() {
        return symbol;
    }

    /** Converts tesla to this unit. The factor is a power of ten, so that one multiplication is correctly rounded. */
    public double fromTesla(double tesla) {
        return tesla * perTesla;
    }

    /** Converts this unit to tesla. */
    public double toTesla(double value) {
        return value / perTesla;
    }

    /** The unit of a code (uT, mG), case-sensitive. */
    public static Optional<FieldUnit> ofCode(String code) {
        for (FieldUnit unit : values()) {
            if (unit.code.equals(code)) {
                return Optional.of(unit);
            }
        }
        return Optional.empty();
    }
}
