/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.tests.checks;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import spanfield.model.Survey;
import spanfield.study.StudyInputException;
import spanfield.study.SurveyCsv;

/** Surveys from files that people and instruments write. */
class SurveyCsvTest {

    private static final double ROUNDING = 1e-15;

    @Test
    void unitsOfTheHeader_areConverted() {
        Survey metric = SurveyCsv.read("station_m,offset_m,height_m,resultant_uT\n80,-10,1.5,3.25\n80,0,1,7\n", "S");
        assertEquals(2, metric.getReadings().size());
        assertEquals(-10, metric.getReadings().get(0).getOffsetMetres(), 0);
        assertEquals(1.5, metric.getReadings().get(0).getHeightMetres(), 0);
        assertEquals(3.25e-6, metric.getReadings().get(0).getResultantTesla(), ROUNDING);
        Survey feet = SurveyCsv.read("\uFEFFtime,offset_ft,station_ft,resultant_mG\r\n12:00,100,-10,32.5\r\n\r\n", "S");
        assertEquals(30.48, feet.getReadings().get(0).getOffsetMetres(), 1e-12);
        assertEquals(-3.048, feet.getReadings().get(0).getStationMetres(), 1e-12);
        assertEquals(3.25e-6, feet.getReadings().get(0).getResultantTesla(), ROUNDING);
        assertEquals(1, feet.getReadings().get(0).getHeightMetres(), 0);
    }

    private static String refusal(String text) {
        return assertThrows(StudyInputException.class, () -> SurveyCsv.read(text, "S")).getMessage();
    }

    @Test
    void badFiles_areRefusedWithLineNumbers() {
        assertTrue(refusal("").contains("is empty"));
        assertTrue(refusal("station_m,offset_m\n1,2\n").contains("no column resultant"));
        assertTrue(refusal("station_m,offset_m,resultant_m\n1,2,3\n").contains("no column resultant"));
        assertTrue(refusal("station_m,offset_m,resultant_uT\n").contains("no readings"));
        String message = refusal("station_m,offset_m,resultant_uT\n80,1,2\n80,x,2\n80,3\n80,4,-1\n80,5,NaN\n");
        assertTrue(message.contains("Line 3: 'x' is no offset."), message);
        assertTrue(message.contains("Line 4: '' is no resultant."), message);
        assertTrue(message.contains("Line 5: '-1' is no resultant."), message);
        assertTrue(message.contains("Line 6: 'NaN' is no resultant."), message);
    }
}
