package org.wardon.files;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.wardon.enclosure.FaceName;
import org.wardon.errors.BadInput;
import org.wardon.errors.Fault;
import org.wardon.files.forecast.CompareAnswer.Changed;
import org.wardon.plan.StorePlan;

/** The demo with inputs changed by path. */
class PlanVariantsTest {
    private static final PlanVariants DEMO =
            new PlanVariants(Path.of("demo-data/landing.json"), TableLookups.read());

    private static List<String> refused(String... sets) {
        BadInput refused = assertThrows(BadInput.class, () -> DEMO.with("a", List.of(sets)));
        return refused.faults().stream().map(Fault::sentence).toList();
    }

    @Test
    void anyInputIsChangedByItsPath() {
        PlanVariants.Variant variant =
                DEMO.with(
                        "a",
                        List.of(
                                "chambers[cold].setting.temperatureC=5",
                                "$.chambers[1].door.protection=strip-curtain",
                                "chambers[fruit].faces[roof].beyond=shade",
                                "lots[AVO1].chamber=fruit",
                                "chambers[shed].gains={\"lightsW\": 40}",
                                "days=7"));
        StorePlan plan = variant.plan();
        assertEquals(5, plan.getChamber("cold").setting().temperatureC());
        assertEquals(
                "strip-curtain",
                plan.getChamber("cold").enclosure().door().orElseThrow().protection());
        assertEquals(FaceName.ROOF, plan.getChamber("fruit").enclosure().faces().get(0).name());
        assertEquals(40, plan.getChamber("shed").enclosure().gains().lightsW());
        assertEquals(7, plan.days());
        assertEquals(Optional.of("fruit"), plan.lots().get(10).chamber());
        assertEquals(
                new Changed("$.chambers[1].setting.temperatureC", Optional.of("2"), "5"),
                variant.changed().get(0));
        assertEquals(
                new Changed("$.lots[10].chamber", Optional.empty(), "\"fruit\""),
                variant.changed().get(3));
    }

    @Test
    void laterChangesSeeEarlierOnes() {
        PlanVariants.Variant variant =
                DEMO.with("a", List.of("lots[AVO1].id=AVO9", "lots[AVO9].massKg=50"));
        assertEquals(50, variant.plan().lots().get(10).massKg());
    }

    @Test
    void everyPathThatNamesNothingIsTold() {
        assertEquals(
                List.of(
                        "--set chambers[colt].setting.temperatureC: there is no 'colt' in $.chambers;"
                                + " did you mean 'cold'? accepted: fruit, cold, shed",
                        "--set chambers[7].id: there is no '7' in $.chambers; accepted: fruit, cold,"
                                + " shed",
                        "--set name[0].x: there is no '0' in $.name; accepted: no item, $.name is no"
                                + " list or has none",
                        "--set a..b: is no path; accepted: such as"
                                + " chambers[north].setting.temperatureC",
                        "--set: is 'days'; accepted: PATH=VALUE, such as"
                                + " chambers[north].setting.temperatureC=10"),
                refused(
                        "chambers[colt].setting.temperatureC=5",
                        "chambers[7].id=5",
                        "name[0].x=1",
                        "a..b=1",
                        "days"));
    }

    @Test
    void whatTheSchemaRefusesIsToldWithTheVariantAndItsPath() {
        List<String> told =
                refused("chambers[cold].setting.temperatureC=warm", "chambers[cold].sett=1");
        assertEquals(2, told.size(), told.toString());
        String lead = "demo-data/landing.json, variant 'a', $.chambers[1].";
        assertEquals(lead, told.get(0).substring(0, lead.length()));
        assertEquals(lead, told.get(1).substring(0, lead.length()));
    }
}
