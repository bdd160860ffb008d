/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.internal;

import spanfield.solver.Progress;

/** The part of a longer work that one step fills; reports never fall. */
final class PartProgress implements Progress {

    private final Progress whole;
    private final double from;
    private final double to;

    /**
     * @param from fraction of the whole at the start of the step
     * @param to   fraction of the whole at its end
     */
    PartProgress(Progress whole, double from, double to) {
        this.whole = whole;
        this.from = from;
        this.to = to;
    }

    @Override
    public void report(double fraction) {
        whole.report(from + (to - from) * Math.max(0, Math.min(1, fraction)));
    }

    @Override
    public boolean cancelled() {
        return whole.cancelled();
    }

    /** The same step for work whose parts are not worth telling: it only listens to cancellation. */
    Progress silent() {
        return new Progress() {
            @Override
            public void report(double fraction) {
                // the step as a whole is reported instead
            }

            @Override
            public boolean cancelled() {
                return whole.cancelled();
            }
        };
    }
}
