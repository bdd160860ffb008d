/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import spanfield.report.Numbers;

/** The rounding policy of numbers for people. */
class NumbersTest {

    @ParameterizedTest
    @CsvSource({"12.3449, 12.34", "0.12, 0.1200", "0, 0", "-0.0, 0", "999.96, 1000", "0.00012345, 0.0001234", "0.000012345, 1.234e-5",
        "1.23456e7, 1.235e7", "-4.56789, -4.568", "123456, 123500", "1e-300, 1.000e-300", "NaN, -", "Infinity, inf", "9.9996e-5, 0.0001000"})
    void field_hasFourSignificantDigits(double value, String text) {
        assertEquals(text, Numbers.field(value));
    }

    @ParameterizedTest
    @CsvSource({"2.5, 1, 2", "3.5, 1, 4", "0.125, 2, 0.12", "0.375, 2, 0.38", "2.675, 3, 2.68", "1.005, 3, 1.00"})
    void ties_goToTheEvenDigitOfTheDecimalNumber(double value, int digits, String text) {
        assertEquals(text, Numbers.significant(value, digits));
    }

    @ParameterizedTest
    @CsvSource({"1.01e-8, 1.1e-8", "0.001, 0.0010", "0.00101, 0.0011", "0, 0", "-3.21, 3.3", "99.1, 100", "NaN, -"})
    void bound_isRoundedUp(double value, String text) {
        assertEquals(text, Numbers.bound(value));
    }

    @Test
    void printedBound_stillHolds() {
        Random random = new Random(3);
        for (int i = 0; i < 10_000; i++) {
            double bound = Math.pow(10, -14 + 16 * random.nextDouble());
            double printed = Double.parseDouble(Numbers.bound(bound));
            assertTrue(printed >= bound && printed <= 1.1 * bound, bound + " as " + printed);
        }
    }

    @Test
    void printedField_isNearEnough() {
        Random random = new Random(4);
        for (int i = 0; i < 10_000; i++) {
            double value = (random.nextBoolean() ? 1 : -1) * Math.pow(10, -14 + 24 * random.nextDouble());
            // half a unit of the fourth digit is at most 5e-4 of a number that begins with 1
            assertEquals(value, Double.parseDouble(Numbers.field(value)), 5.0001e-4 * Math.abs(value));
        }
    }

    @ParameterizedTest
    @CsvSource({"-25, -25", "25.4, 25.4", "182.333, 182.33", "-0.001, 0", "0, 0", "1e-9, 0"})
    void brief_hasNoTrailingZeros(double value, String text) {
        assertEquals(text, Numbers.brief(value, 2));
    }

    @ParameterizedTest
    @CsvSource({"-25, -25.00", "-0.001, 0.00", "1.005, 1.00", "1.015, 1.02", "NaN, -"})
    void length_hasTwoDecimals(double value, String text) {
        assertEquals(text, Numbers.length(value));
    }

    @ParameterizedTest
    @CsvSource({"100, 100", "0.2, 0.2", "1e-6, 1e-6", "3.5e-7, 3.5e-7", "0, 0", "20.000000000000004, 20", "1e7, 1e7"})
    void stated_looksAsEntered(double value, String text) {
        assertEquals(text, Numbers.stated(value));
    }
}
