/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.field;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/** Gauss-Legendre rules on [-1, 1] for every number of nodes up to {@value #GREATEST}. */
final class GaussRules {

    static final int LEAST = 2;
    static final int GREATEST = 20;

    private static final double[][] NODES = new double[GREATEST + 1][];
    private static final double[][] WEIGHTS = new double[GREATEST + 1][];

    static {
        GaussIntegratorFactory factory = new GaussIntegratorFactory();
        for (int n = LEAST; n <= GREATEST; n++) {
            GaussIntegrator rule = factory.legendre(n);
            NODES[n] = new double[n];
            WEIGHTS[n] = new double[n];
            for (int i = 0; i < n; i++) {
                NODES[n][i] = rule.getPoint(i);
                WEIGHTS[n][i] = rule.getWeight(i);
            }
        }
    }

    private GaussRules() {
    }

    static double node(int count, int index) {
        return NODES[count][index];
    }

    static double weight(int count, int index) {
        return WEIGHTS[count][index];
    }
}
