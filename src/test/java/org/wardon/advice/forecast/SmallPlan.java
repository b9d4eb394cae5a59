package org.wardon.advice.forecast;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.wardon.advice.PlanLookups;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.errors.Progress;
import org.wardon.files.PlanReader;
import org.wardon.files.forecast.Forecast;
import org.wardon.reference.ReferenceBook;

/** A plan of one small chamber, changed by what a test is about, and its forecast. */
final class SmallPlan {
    private static final String PANEL =
            "[{\"material\": \"steel-sheet\", \"thicknessMm\": 0.5},"
                    + "{\"material\": \"pur-panel\", \"thicknessMm\": 80},"
                    + "{\"material\": \"steel-sheet\", \"thicknessMm\": 0.5}]";

    private String walls = PANEL;
    private String weather = "{\"steady\": {\"temperatureC\": 29, \"humidityPct\": 80}}";
    private String chamber =
            "\"setting\": {\"temperatureC\": 4},"
                    + "\"cooling\": [{\"kind\": \"compressor\", \"ratedCapacityW\": 3500,"
                    + " \"defrost\": {\"everyHours\": 8, \"minutes\": 15}}]";
    private String lots = "";
    private double days = 3;

    /** Layers of walls and roof, a JSON list. */
    SmallPlan walls(String layers) {
        walls = layers;
        return this;
    }

    /** The weather, a JSON object. */
    SmallPlan weather(String json) {
        weather = json;
        return this;
    }

    /** Members of the chamber besides measures and faces. */
    SmallPlan chamber(String members) {
        chamber = members;
        return this;
    }

    /** The lots, JSON objects with commas between. */
    SmallPlan lots(String objects) {
        lots = objects;
        return this;
    }

    SmallPlan days(double howLong) {
        days = howLong;
        return this;
    }

    private String json() {
        StringBuilder faces = new StringBuilder();
        for (String face : List.of("roof", "north", "east", "south", "west")) {
            faces.append("{\"face\": \"").append(face).append("\", \"beyond\": \"shade\",");
            faces.append("\"buildUp\": \"wall\"},");
        }
        return "{\"storePlan\": 1, \"site\": {\"latitudeDeg\": 12, \"longitudeDeg\": -61.7,"
                + " \"zone\": \"UTC\"}, \"weather\": "
                + weather
                + ", \"from\": \"2026-03-02T00:00\", \"days\": "
                + days
                + ", \"buildUps\": {\"wall\": {\"layers\": "
                + walls
                + "}}, \"chambers\": [{\"id\": \"north\", \"lengthM\": 4, \"widthM\": 3,"
                + " \"heightM\": 2.5, \"faces\": ["
                + faces
                + "{\"face\": \"floor\", \"layers\": [{\"material\": \"eps-15\","
                + " \"thicknessMm\": 60}, {\"material\": \"concrete-dense\","
                + " \"thicknessMm\": 100}]}], "
                + chamber
                + "}], \"lots\": ["
                + lots
                + "]}";
    }

    /** Advises on the plan, written into a folder. */
    StoreAdvice advice(ReferenceBook book, Path folder) throws IOException {
        Path file = folder.resolve("plan.json");
        Files.writeString(file, json());
        return new ForecastAdvice(book, Words.english(Units.METRIC))
                .advise(PlanReader.read(file, PlanLookups.of(book)), Progress.SILENT);
    }

    /** Texts of warnings of a code. */
    static List<String> told(Forecast forecast, String code) {
        return forecast.warnings().stream()
                .filter(warning -> warning.code().equals(code))
                .map(Forecast.Warning::text)
                .toList();
    }
}
