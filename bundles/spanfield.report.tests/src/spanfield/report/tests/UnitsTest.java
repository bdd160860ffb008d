/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;
import spanfield.report.FieldUnit;
import spanfield.report.LengthUnit;

/**
 * Conversions. Sources: 1 G = 1e-4 T and 1 ft = 0.3048 m exactly: NIST Special Publication 811 (2008), appendix B (from memory, both are
 * definitions).
 */
class UnitsTest {

    /** Relative: two roundings of double precision, each half a unit of the last of 53 bits. */
    private static final double TWO_ROUNDINGS = 2.3e-16;

    @Test
    void milligauss_isATenthOfAMicrotesla() {
        assertEquals(1, FieldUnit.MICROTESLA.fromTesla(1e-6));
        assertEquals(10, FieldUnit.MILLIGAUSS.fromTesla(1e-6));
        Random random = new Random(1);
        for (int i = 0; i < 1000; i++) {
            double tesla = Math.pow(10, -12 + 10 * random.nextDouble());
            double microtesla = FieldUnit.MICROTESLA.fromTesla(tesla);
            assertEquals(10 * microtesla, FieldUnit.MILLIGAUSS.fromTesla(tesla), 10 * microtesla * TWO_ROUNDINGS);
        }
    }

    @Test
    void foot_isTheInternationalFoot() {
        assertEquals(1, LengthUnit.FOOT.fromMetres(0.3048));
        assertEquals(30.48, LengthUnit.FOOT.toMetres(100), 30.48 * TWO_ROUNDINGS);
        assertEquals(-25, LengthUnit.METRE.fromMetres(-25));
    }

    @Test
    void conversions_goBackAndForth() {
        Random random = new Random(2);
        for (int i = 0; i < 1000; i++) {
            double value = (random.nextDouble() - 0.5) * 1e4;
            for (LengthUnit unit : LengthUnit.values()) {
                assertEquals(value, unit.toMetres(unit.fromMetres(value)), Math.abs(value) * TWO_ROUNDINGS);
            }
            for (FieldUnit unit : FieldUnit.values()) {
                assertEquals(value, unit.fromTesla(unit.toTesla(value)), Math.abs(value) * TWO_ROUNDINGS);
            }
        }
    }

    @Test
    void codes_findTheirUnits() {
        assertEquals(FieldUnit.MILLIGAUSS, FieldUnit.ofCode("mG").orElseThrow());
        assertEquals(FieldUnit.MICROTESLA, FieldUnit.ofCode("uT").orElseThrow());
        assertEquals(LengthUnit.FOOT, LengthUnit.ofCode("ft").orElseThrow());
        assertTrue(FieldUnit.ofCode("MG").isEmpty());
        assertTrue(LengthUnit.ofCode("").isEmpty());
    }
}
