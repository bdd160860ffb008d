/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

import spanfield.model.FieldMeasure;
import spanfield.model.LimitBasis;
import spanfield.model.LimitPlace;

/**
 * A level against which the magnetic field is compared. Local codes and licensed practice decide which limit holds.
 *
 * @param id            identifier in the study file
 * @param name          name for people
 * @param measure       scalar that is compared
 * @param levelTesla    level in tesla RMS
 * @param place         where the limit applies
 * @param body          body or law that set the level; may be empty
 * @param edition       edition or date; may be empty
 * @param loadCondition load condition to which the level refers; may be empty
 * @param basis         how the level is known
 */
public record LimitInfo(String id, String name, FieldMeasure measure, double levelTesla, LimitPlace place, String body, String edition,
    String loadCondition, LimitBasis basis) {
}
