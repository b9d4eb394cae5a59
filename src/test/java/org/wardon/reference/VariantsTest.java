package org.wardon.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Map;
import org.junit.jupiter.api.Test;
import org.wardon.errors.BadInput;
import org.wardon.keeping.Crops;
import org.wardon.produce.Commodity;
import org.wardon.produce.rows.ChillingExposure;

/** Variants that print keeps apart can be chosen. */
class VariantsTest {
    @Test
    void aVariantBringsItsOwnRowsAndTheCropTheRest() {
        Commodity avocado = Crops.get("avocado");
        assertTrue(Variants.of(avocado).containsKey("hass"), Variants.of(avocado).toString());
        assertFalse(Variants.of(avocado).containsKey("west-indian-types"));
        Commodity hass = Variants.choose(avocado, "Hass").commodity();
        assertEquals(avocado.needs(), hass.needs());
        assertEquals(avocado.keeping().lives(), hass.keeping().lives());
        long printed =
                avocado.keeping().exposures().stream()
                        .filter(row -> row.variant().isEmpty() || row.variant().equals("Hass"))
                        .count();
        assertEquals(printed, hass.keeping().exposures().size());
        assertTrue(printed < avocado.keeping().exposures().size());
        assertTrue(
                hass.keeping().exposures().stream()
                        .map(ChillingExposure::variant)
                        .allMatch(String::isEmpty));
        Commodity red = Crops.get("bell-pepper");
        double own =
                red.keeping().curves().stream()
                        .filter(row -> row.variant().equals("bell-pepper-red"))
                        .findFirst()
                        .orElseThrow()
                        .slopeKJMol();
        Commodity chosen = Variants.choose(red, "bell-pepper-red").commodity();
        assertEquals(own, chosen.keeping().curves().get(0).slopeKJMol());
        assertEquals("", chosen.keeping().curves().get(0).variant());
    }

    @Test
    void everyVariantOfEveryCropCanBeChosen() {
        int chosen = 0;
        for (Commodity crop : Crops.list()) {
            for (Map.Entry<String, String> variant : Variants.of(crop).entrySet()) {
                Variants.Chosen one = Variants.choose(crop, variant.getKey());
                assertFalse(one.told().arguments().get(1).text().isEmpty(), variant.toString());
                org.wardon.keeping.KeepingModel.of(Crops.lot(one.commodity()))
                        .paces(org.wardon.keeping.Draw.MEDIAN);
                chosen++;
            }
        }
        assertTrue(chosen > 20, "variants: " + chosen);
        // Another word for the whole crop chooses nothing.
        assertEquals(Map.of(), Variants.of(Crops.get("sweet-corn")));
    }

    @Test
    void anUnknownVariantIsToldThoseThereAre() {
        BadInput wrong =
                assertThrows(
                        BadInput.class,
                        () -> Variants.choose(Crops.get("bell-pepper"), "bell-peper-red"));
        assertTrue(
                wrong.getMessage()
                        .startsWith(
                                "--variant: 'bell-peper-red' is no variant of bell-pepper with rows"
                                        + " of its own; did you mean 'bell-pepper-red'? accepted:"
                                        + " "),
                wrong.getMessage());
        BadInput none =
                assertThrows(BadInput.class, () -> Variants.choose(Crops.get("okra"), "red"));
        assertEquals(
                "--variant: 'red' is no variant of okra with rows of its own; accepted: none, print"
                        + " keeps no variants of it apart",
                none.getMessage());
    }
}
