/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.report;

import java.nio.charset.Charset;

/** Signs of text output: those of the trade where the output can carry them, ASCII otherwise. */
public enum TextStyle {

    /** Signs beyond ASCII: micro, plus-minus, ohm, degree. */
    UNICODE("\u00b1", "\u03a9 m", "\u00b0"),
    /** ASCII only. */
    ASCII("+-", "ohm m", " deg");

    private final String plusMinus;
    private final String ohmMetres;
    private final String degrees;

    TextStyle(String plusMinus, String ohmMetres, String degrees) {
        this.plusMinus = plusMinus;
        this.ohmMetres = ohmMetres;
        this.degrees = degrees;
    }

    /** The style that a character set can carry. */
    public static TextStyle of(Charset charset) {
        return charset.canEncode() && charset.newEncoder().canEncode("\u00b5\u00b1\u03a9\u00b0") ? UNICODE : ASCII;
    }

    /** Plus-minus. */
    public String plusMinus() {
        return plusMinus;
    }

    /** Unit of resistivity. */
    public String ohmMetres() {
        return ohmMetres;
    }

    /** Degree sign, to stand directly behind the number. */
    public String degrees() {
        return degrees;
    }

    /** Symbol of a field unit. */
    public String symbol(FieldUnit unit) {
        return this == UNICODE ? unit.symbol() : unit.code();
    }
}
