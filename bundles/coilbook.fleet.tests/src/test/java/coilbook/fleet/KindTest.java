package coilbook.fleet;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.Set;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class KindTest {

    static java.util.List<Kind<?>> kinds() {
        return Kind.ALL;
    }

    @Test
    void thereIsAKindForEverySheetOfTheExchangeWorkbook() {
        Set<String> sheets = new HashSet<>();
        Kind.ALL.forEach(kind -> sheets.add(kind.sheet()));
        for (String sheet : new String[] { "Customers", "Sites", "Circuits", "Lines", "Stations", "Controllers", "Valve types",
                "Coil types", "Driver types",
                "Input settings", "Cable types", "Transformer types", "Items", "Fittings", "Readings", "Concessions" }) {
            assertTrue(sheets.contains(sheet), sheet);
        }
    }

    @ParameterizedTest
    @MethodSource("kinds")
    void columnsAreUniqueAndKeysComeFirst(Kind<?> kind) {
        Set<String> headings = new HashSet<>();
        Set<String> ids = new HashSet<>();
        for (Field field : kind.fields()) {
            assertTrue(headings.add(field.heading().toLowerCase(java.util.Locale.ROOT)), field.heading());
            assertTrue(ids.add(field.id()), field.id());
            assertFalse(field.heading().contains("["), field.heading());
        }
        assertFalse(kind.keyFields().isEmpty());
        assertTrue(kind.fields().get(0).isKey());
    }

    @ParameterizedTest
    @MethodSource("kinds")
    void referencesLeadToEarlierKinds(Kind<?> kind) {
        for (Field field : kind.fields()) {
            if (field.refersTo() != null) {
                assertTrue(Kind.ALL.indexOf(Kind.of(field.refersTo())) < Kind.ALL.indexOf(kind), kind + "." + field);
            }
        }
    }

    @ParameterizedTest
    @MethodSource("kinds")
    void everyFieldReadsBackWhatItShows(Kind<?> kind) throws InvalidValue {
        Object[] values = Samples.values(kind);
        Row row = kind.create(values);
        assertNotNull(row.key());
        for (Field field : kind.fields()) {
            String text = FieldText.format(field, field.get(row));
            Object again = FieldText.parse(field, text, Provenance.NAMEPLATE);
            assertEquals(field.get(row), again, kind + "." + field + " shown as " + text);
        }
    }

    @Test
    void aNegativeResistanceIsRefusedWithWords() throws InvalidValue {
        Kind<CoilType> kind = Kind.of(CoilType.class);
        CoilType coil = kind.create(Samples.values(kind));
        InvalidValue refused = assertThrows(InvalidValue.class, () -> kind.with(coil, kind.field("resistance20"), Datum.catalogue(-3)));
        assertEquals("Resistance at 20 °C", refused.column());
        assertEquals("-3", refused.value());
        assertTrue(refused.expected().contains("above 0 Ω"), refused.expected());
    }

    @Test
    void aMissingKeyIsRefusedButAMissingDateInAKeyMeansAlways() throws InvalidValue {
        Kind<Supply> kind = Kind.of(Supply.class);
        assertEquals("A/B/C/", kind.create(new Object[] { "A/B/C", null, null, "A/M" }).key());
        assertThrows(InvalidValue.class, () -> kind.create(new Object[] { null, null, null, "A/M" }));
    }

    @Test
    void provenanceOfARowIsOneCell() throws InvalidValue {
        Kind<CableType> kind = Kind.of(CableType.class);
        CableType cable = new CableType("X", null, null, Datum.catalogue(1e-6), Datum.measured(0.02), Datum.catalogue(300), null, null,
                null, null);
        String text = kind.provenanceText(cable);
        assertEquals("catalogue; Conductor resistance = measured", text);
        ProvenanceText read = ProvenanceText.parse(text, Provenance.ASSUMED);
        assertEquals(Provenance.MEASURED, read.of(kind.field("conductor_resistance")));
        assertEquals(Provenance.CATALOGUE, read.of(kind.field("rated_voltage")));
        assertThrows(InvalidValue.class, () -> ProvenanceText.parse("hearsay", Provenance.ASSUMED));
    }

    @Test
    void theWeakerProvenanceWins() {
        assertEquals(Provenance.ASSUMED, Provenance.weaker(Provenance.MEASURED, Provenance.ASSUMED));
        assertEquals(Provenance.MEASURED, Provenance.weaker(null, Provenance.MEASURED));
    }
}
