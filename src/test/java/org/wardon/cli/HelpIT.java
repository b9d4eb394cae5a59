package org.wardon.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.networknt.schema.InputFormat;
import com.networknt.schema.SchemaLocation;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.wardon.cli.WardonJar.Ran;

/** Help, version, schema and slips of the finger. */
class HelpIT {
    @Test
    void helpListsTheVerbsAndTheExitStatuses() {
        String help = WardonJar.run("--help").good().out();
        for (String verb :
                new String[] {
                    "advise", "keep", "share", "look", "why", "section", "size", "schema", "demo",
                    "open"
                }) {
            assertTrue(help.contains("\n  " + verb + " "), help);
        }
        assertTrue(help.contains("Exit status: 0 done; 2 "), help);
        assertTrue(help.lines().allMatch(line -> line.length() <= 100), help);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "advise", "keep", "share", "look", "why", "section", "size", "schema", "demo",
                "open"
            })
    void everyVerbHasHelp(String verb) {
        String help = WardonJar.run(verb, "--help").good().out();
        assertTrue(help.startsWith("Usage: wardon " + verb + " "), help);
        assertTrue(help.lines().count() > 3, help);
    }

    @Test
    void noVerbAndAWrongVerbAreRefused() {
        Ran none = WardonJar.run().refused(2);
        assertEquals("wardon: no verb is given; see 'wardon --help'\n", none.err());
        assertEquals(
                "wardon: no verb is called 'advies'; perhaps advise; see 'wardon --help'\n",
                WardonJar.run("advies", "plan.json").refused(2).err());
    }

    @Test
    void schemaIsAValidSchemaOfDraft202012() {
        String schema = WardonJar.run("schema").good().out();
        var meta =
                SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
                        .getSchema(
                                SchemaLocation.of("https://json-schema.org/draft/2020-12/schema"));
        assertTrue(meta.validate(schema, InputFormat.JSON).isEmpty());
        assertTrue(schema.contains("\"storePlan\""), schema);
    }
}
