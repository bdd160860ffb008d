/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study;

import java.util.List;
import spanfield.study.internal.Messages;

/** A request to a study that cannot be met: an unknown name, a point in a conductor or under ground. The study itself is sound. */
public final class StudyInputException extends RuntimeException {

    private static final long serialVersionUID = 1L;

    private final transient List<PointProblem> pointProblems;

    /**
     * What is wrong with one of the points of a request.
     *
     * @param index   place of the point in the request, from 0
     * @param message what is wrong and what to do
     */
    public record PointProblem(int index, String message) {
    }

    public StudyInputException(String message) {
        super(message);
        this.pointProblems = List.of();
    }

    /** For a request with unusable points, at least one. */
    public StudyInputException(List<PointProblem> problems) {
        super(problems.size() == 1 ? problems.get(0).message() : Messages.text("points.more", problems.get(0).message(), problems.size() - 1));
        this.pointProblems = List.copyOf(problems);
    }

    /** The unusable points of the request; empty where the request fails for another reason. */
    public List<PointProblem> pointProblems() {
        return pointProblems;
    }
}
