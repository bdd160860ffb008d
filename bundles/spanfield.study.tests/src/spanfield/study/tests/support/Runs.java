/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.tests.support;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import spanfield.model.FieldMeasure;
import spanfield.model.Study;
import spanfield.solver.Progress;
import spanfield.study.FieldPoint;
import spanfield.study.StudyRun;
import spanfield.study.StudySnapshot;
import spanfield.study.result.EdgeRow;
import spanfield.study.result.EdgeTable;
import spanfield.study.result.FieldValue;
import spanfield.study.result.PointTable;

/** Short ways to results. */
public final class Runs {

    private Runs() {
    }

    /** Edge table of a study, computed afresh. */
    public static EdgeTable table(Study study) {
        return new StudyRun().edgeTable(StudySnapshot.of(study), Progress.NONE);
    }

    /** Field at points of a study, computed afresh. */
    public static PointTable points(Study study, List<FieldPoint> points) {
        return new StudyRun().points(StudySnapshot.of(study), points, Progress.NONE);
    }

    /** Asserts that two fields agree within their own error bounds and a relative tolerance. */
    public static void assertSame(FieldValue expected, FieldValue actual, double relative, String message) {
        double tolerance = expected.numericalErrorTesla() + actual.numericalErrorTesla() + relative * expected.resultantTesla();
        assertEquals(expected.resultantTesla(), actual.resultantTesla(), tolerance, message + " resultant");
        assertEquals(expected.majorAxisTesla(), actual.majorAxisTesla(), tolerance, message + " major axis");
    }

    /** Asserts that two tables have the same fields at edges and maxima, row by row. */
    public static void assertSame(EdgeTable expected, EdgeTable actual, double relative, String message) {
        assertEquals(expected.rows().size(), actual.rows().size());
        for (int i = 0; i < expected.rows().size(); i++) {
            EdgeRow a = expected.rows().get(i);
            EdgeRow b = actual.rows().get(i);
            String where = message + " " + a.station().name() + " " + a.loadCase().name();
            assertSame(a.leftEdge().field(), b.leftEdge().field(), relative, where + " left");
            assertSame(a.rightEdge().field(), b.rightEdge().field(), relative, where + " right");
            assertSameGreatest(a, b, relative, where);
        }
    }

    /** Asserts that two rows have the same greatest values, each in its own measure: the other measure is not stationary there. */
    public static void assertSameGreatest(EdgeRow a, EdgeRow b, double relative, String message) {
        assertClose(a.greatestResultant().field(), b.greatestResultant().field(), FieldMeasure.RESULTANT, relative, message);
        assertClose(a.greatestMajorAxis().field(), b.greatestMajorAxis().field(), FieldMeasure.MAJOR_AXIS, relative, message);
    }

    private static void assertClose(FieldValue expected, FieldValue actual, FieldMeasure measure, double relative, String message) {
        double tolerance = expected.numericalErrorTesla() + actual.numericalErrorTesla() + relative * expected.resultantTesla();
        assertEquals(expected.tesla(measure), actual.tesla(measure), tolerance, message + " greatest " + measure);
    }
}
