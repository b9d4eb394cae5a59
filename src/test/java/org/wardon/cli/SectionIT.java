package org.wardon.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tools.jackson.databind.JsonNode;

/** The verb that shows warm and cold places in still air, and its picture. */
class SectionIT {
    private static final String DEMO = "demo-data/landing.json";

    @TempDir Path folder;

    @Test
    void aPersonGetsTheNumbersAsTheyLieAndThePicture() throws IOException {
        Path picture = folder.resolve("shed.svg");
        String page =
                WardonJar.run("section", DEMO, "--chamber", "shed", "--picture", picture.toString())
                        .good()
                        .out();
        assertTrue(page.startsWith("Chamber shed, mean of the 24 h to 2026-03-"), page);
        assertTrue(page.contains("\nTemperatures in °C, as they lie; [in brackets] in the load\n"));
        assertTrue(page.contains("[") && page.contains(" roof ") && page.contains(" floor "), page);
        assertTrue(page.contains("\nPicture written to " + picture + "\n"), page);
        assertTrue(
                page.lines().allMatch(line -> line.length() <= 100 + folder.toString().length()));
        assertFalse(page.contains("{") || page.contains("NaN"), page);
        String svg = Files.readString(picture);
        assertTrue(
                svg.startsWith("<svg xmlns=\"http://www.w3.org/2000/svg\"")
                        && svg.endsWith("</svg>\n"));
        WardonJar.run(
                        "section",
                        DEMO,
                        "--chamber",
                        "shed",
                        "--hours",
                        "1",
                        "--picture",
                        picture.toString())
                .good();
        assertFalse(svg.equals(Files.readString(picture)), "what stood there is replaced");
    }

    @Test
    void aProgramGetsItsNames() {
        JsonNode section = WardonJar.run("section", DEMO, "--chamber", "shed", "--json").json();
        JsonNames.check(
                section,
                "",
                ("chamber at hours across widthM heightM faces settingC outdoorC oneAirC meanC"
                                + " airMeanC warmest coldest spreadK airSpreadK stack spaces leftOpenPct field"
                                + " said warnings")
                        .split(" "));
        JsonNames.check(section, "faces[]", "side", "face", "innerC");
        JsonNames.check(section, "warmest", "xM", "yM", "temperatureC", "inStack", "where");
        JsonNames.check(section, "spaces[]", "space", "nusselt", "conductivityWmK");
        JsonNames.finite(section);
        JsonNode field = section.get("field");
        assertEquals(field.get("rows").asInt(), field.get("temperatureC").size());
        assertEquals(field.get("columns").asInt(), field.get("temperatureC").get(0).size());
    }

    @Test
    void whatCannotBeShownOrWrittenLeavesNothing() throws IOException {
        String png = folder.resolve("shed.png").toString();
        assertEquals(
                "wardon: --picture: is '"
                        + png
                        + "', another kind of picture; accepted: a name that ends in .svg\n",
                WardonJar.run("section", DEMO, "--chamber", "shed", "--picture", png)
                        .refused(2)
                        .err());
        String svg = folder.resolve("cold.svg").toString();
        assertTrue(
                WardonJar.run("section", DEMO, "--chamber", "cold", "--picture", svg)
                        .refused(2)
                        .err()
                        .startsWith(
                                "wardon: --chamber: is 'cold', whose air is stirred (compressor)"));
        assertEquals(
                "wardon: --chamber: is 'shad', no chamber of this plan; did you mean 'shed'?"
                        + " accepted: fruit, cold, shed\n",
                WardonJar.run("section", DEMO, "--chamber", "shad", "--picture", svg)
                        .refused(2)
                        .err());
        String nowhere = folder.resolve("gone/shed.svg").toString();
        assertEquals(
                "wardon: "
                        + nowhere
                        + ": cannot be written: its folder does not exist; make the folder first,"
                        + " or give another\n",
                WardonJar.run("section", DEMO, "--chamber", "shed", "--picture", nowhere)
                        .refused(4)
                        .err());
        try (Stream<Path> left = Files.list(folder)) {
            assertEquals(0, left.count());
        }
    }
}
