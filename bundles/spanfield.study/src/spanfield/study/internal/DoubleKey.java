/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import java.util.Arrays;

/** A run of numbers as a map key, equal only to the very same numbers. */
final class DoubleKey {

    private final double[] values;
    private final int hash;

    private DoubleKey(double[] values) {
        this.values = values;
        this.hash = Arrays.hashCode(values);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof DoubleKey key && key.hash == hash && Arrays.equals(key.values, values);
    }

    @Override
    public int hashCode() {
        return hash;
    }

    /** Collects the numbers. */
    static final class Builder {

        private double[] values = new double[256];
        private int count;

        Builder add(double... more) {
            if (count + more.length > values.length) {
                values = Arrays.copyOf(values, Math.max(2 * values.length, count + more.length));
            }
            System.arraycopy(more, 0, values, count, more.length);
            count += more.length;
            return this;
        }

        Builder add(DoubleKey other) {
            return add(other.values);
        }

        DoubleKey build() {
            return new DoubleKey(Arrays.copyOf(values, count));
        }
    }
}
