package coilbook.criteria.internal.station;

import static coilbook.criteria.StationFixture.STATION;
import static coilbook.criteria.StationFixture.TODAY;
import static coilbook.criteria.StationFixture.twoLevelStation;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

import org.junit.jupiter.api.Test;

import coilbook.fleet.Datum;
import coilbook.fleet.Provenance;
import coilbook.fleet.ReadingQuantity;
import coilbook.fleet.SubjectKind;

class StationFactsTest {

    private static void assertKnown(double value, Provenance provenance, Fact fact) {
        assertEquals(List.of(), fact.missing());
        assertEquals(value, fact.value(), 1e-12 * Math.abs(value));
        assertEquals(provenance, fact.provenance());
    }

    @Test
    void dutyAsRecorded() {
        StationDuty duty = StationDuty.of(twoLevelStation().view());
        assertKnown(10, Provenance.NAMEPLATE, duty.meanRate());
        assertKnown(10, Provenance.NAMEPLATE, duty.burstRate());
        assertKnown(0.02, Provenance.NAMEPLATE, duty.onTime());
        assertKnown(0.08, Provenance.NAMEPLATE, duty.offTime());
    }

    /** On-time = length ÷ speed, off-time = gap ÷ speed, burst = speed ÷ (length + gap), mean = speed ÷ pitch; arithmetic. */
    @Test
    void dutyFromSpeedAndPattern() {
        StationDuty duty = StationDuty
                .of(twoLevelStation().duty("cycle_rate", null).duty("on_time", null).duty("bead_length", Datum.nameplate(0.03))
                        .duty("gap", Datum.nameplate(0.02)).duty("pitch", Datum.estimated(0.25)).view());
        assertKnown(0.02, Provenance.NAMEPLATE, duty.onTime());
        assertKnown(0.02 / 1.5, Provenance.NAMEPLATE, duty.offTime());
        assertKnown(30, Provenance.NAMEPLATE, duty.burstRate());
        assertKnown(6, Provenance.ESTIMATED, duty.meanRate());
    }

    @Test
    void dutysOwnSpeedGoesBeforeTheLines() {
        StationDuty duty = StationDuty
                .of(twoLevelStation().duty("cycle_rate", null).duty("on_time", null).duty("bead_length", Datum.nameplate(0.03))
                        .duty("gap", Datum.nameplate(0.02)).duty("speed", Datum.measured(3)).view());
        assertKnown(0.01, Provenance.NAMEPLATE, duty.onTime());
        assertKnown(60, Provenance.NAMEPLATE, duty.meanRate());
    }

    @Test
    void dutyNamesWhatIsMissing() {
        StationDuty none = StationDuty.of(twoLevelStation().withoutDuty().view());
        assertEquals(List.of("Cycle rate of station " + STATION), none.meanRate().missing());
        assertEquals(List.of("On-time of station " + STATION), none.onTime().missing());
        StationDuty read = StationDuty.of(twoLevelStation().withoutDuty()
                .read(SubjectKind.STATION, STATION, ReadingQuantity.CYCLE_RATE, TODAY, 7, null, null).view());
        assertKnown(7, Provenance.MEASURED, read.meanRate());
    }

    /** 10 m of 1 mm² class 5 (19.5 Ω/km) there and back: 0.39 Ω at 20 °C; a published table gives the drop of a 10 Ω coil as 3.753609 %. */
    @Test
    void cableLoop() {
        Fact cable = CableResistance.of(twoLevelStation().view());
        assertKnown(0.39, Provenance.CATALOGUE, cable);
        assertEquals(0.03753609, cable.value() / (10 + cable.value()), 1e-8);
        // × 1.2161 at 75 °C
        assertEquals(0.39 * 1.2161,
                CableResistance.of(twoLevelStation().station("cable_temperature", Datum.measured(75)).view()).value(), 1e-4);
    }

    @Test
    void cableTemperatureIsThatOfTheAirWhereNotRecorded() {
        Fact cable = CableResistance.of(twoLevelStation().station("cable_temperature", null).view());
        assertEquals(0.39 * 274.5 / 254.5, cable.value(), 1e-12);
    }

    @Test
    void cableNamesWhatIsMissing() {
        assertEquals(List.of("Cable length of station " + STATION),
                CableResistance.of(twoLevelStation().station("cable_length", null).view()).missing());
        assertEquals(List.of("Cable type of station " + STATION),
                CableResistance.of(twoLevelStation().withoutCable().view()).missing());
        assertKnown(0, Provenance.NAMEPLATE,
                CableResistance.of(twoLevelStation().station("cable_length", Datum.nameplate(0)).withoutCable().view()));
    }

    @Test
    void ambientIsTheSitesWithoutAHeatedBody() {
        CoilAmbient ambient = CoilAmbient.of(twoLevelStation().view());
        assertTrue(ambient.highest().isExact());
        assertKnown(40, Provenance.NAMEPLATE, ambient.highest().from());
        assertKnown(10, Provenance.NAMEPLATE, ambient.lowest().to());
        CoilAmbient none = CoilAmbient.of(twoLevelStation().site("ambient_highest", null).view());
        assertEquals(List.of("Ambient highest of site WERK"), none.highest().from().missing());
    }

    @Test
    void ambientOnAHeatedBodyWeighsConductances() {
        // (0.3 · 40 + 0.1 · 160) / 0.4 = 70 °C
        CoilAmbient ambient = CoilAmbient.of(twoLevelStation().station("body_temperature", Datum.measured(160))
                .station("conductance_to_air", Datum.estimated(0.3)).station("conductance_to_body", Datum.estimated(0.1)).view());
        assertKnown(70, Provenance.ESTIMATED, ambient.highest().from());
        assertTrue(ambient.highest().isExact());
    }

    @Test
    void ambientOnAHeatedBodyIsASpanWithoutConductances() {
        CoilAmbient.Span highest = CoilAmbient.of(twoLevelStation().station("body_temperature", Datum.measured(160)).view()).highest();
        assertFalse(highest.isExact());
        assertEquals(40, highest.from().value());
        assertEquals(160, highest.to().value());
        assertEquals(List.of("Conductance to air of station " + STATION, "Conductance to body of station " + STATION), highest.narrowing());
    }

    @Test
    void ambientAsRecordedOrReadGoesFirst() {
        CoilAmbient recorded = CoilAmbient
                .of(twoLevelStation().station("coil_ambient_highest", Datum.measured(95)).station("body_temperature", Datum.measured(160))
                        .view());
        assertKnown(95, Provenance.MEASURED, recorded.highest().from());
        CoilAmbient read = CoilAmbient
                .of(twoLevelStation().read(SubjectKind.STATION, STATION, ReadingQuantity.COIL_TEMPERATURE, TODAY, 80, null, null).view());
        assertKnown(80, Provenance.NAMEPLATE, read.nominal().from());
        assertKnown(98, Provenance.NAMEPLATE, read.highest().from());
    }

    @Test
    void windingResistanceFromTheCatalogue() {
        WindingResistance winding = WindingResistance.of(twoLevelStation().view());
        assertKnown(9.5, Provenance.CATALOGUE, winding.lowest());
        assertKnown(10.5, Provenance.CATALOGUE, winding.highest());
        assertKnown(9, Provenance.ASSUMED, WindingResistance.of(twoLevelStation().coil("resistance_tolerance", null).view()).lowest());
    }

    @Test
    void aReadingOfTheCoilGoesBeforeTheCatalogue() {
        // 11.2 Ω at 45 °C are 10.198211 Ω at 20 °C (check value).
        WindingResistance winding = WindingResistance
                .of(twoLevelStation().read(SubjectKind.ITEM, "coil/c-1", ReadingQuantity.WINDING_RESISTANCE,
                        TODAY.minusDays(9), 11.2, Datum.measured(45), Datum.measured(0.01)).view());
        assertTrue(winding.measured());
        assertEquals(10.198211, winding.resistance20().value(), 1e-6);
        assertEquals(10.198211 * 1.01, winding.highest().value(), 1e-5);
        assertEquals(Provenance.MEASURED, winding.highest().provenance());
        // No uncertainty recorded: the type's tolerance stays.
        assertEquals(10.198211 * 1.05, WindingResistance.of(twoLevelStation().readWinding(11.2, 45.0).view()).highest().value(), 1e-5);
    }

    @Test
    void aReadingThatCannotBeTrustedDoesNot() {
        assertFalse(WindingResistance.of(twoLevelStation().readWinding(250, 20.0).view()).measured(), "implausible");
        assertFalse(WindingResistance.of(twoLevelStation().readWinding(10, null).view()).measured(), "no temperature");
        assertFalse(WindingResistance
                .of(twoLevelStation().read(SubjectKind.ITEM, "coil/c-1", ReadingQuantity.WINDING_RESISTANCE, TODAY.minusYears(3), 10,
                        Datum.measured(20), null).view())
                .measured(), "out of date");
        assertTrue(WindingResistance.of(twoLevelStation().readWinding(7, 20.0).view()).measured(), "shorted turns");
    }
}
