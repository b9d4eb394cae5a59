// Writes the answers of psychrolib (npm, MIT) for a grid of moist air as CSV to standard output.
// Once: npm install psychrolib@1.1.1
// Then: node src/test/scripts/psychrolib-moist-air.mjs > src/test/resources/published/psychrolib-1.1.1.csv
import { createRequire } from "node:module";
const require = createRequire(process.cwd() + "/");
const psychrolib = require("psychrolib");
const psy = typeof psychrolib === "function" ? new psychrolib() : psychrolib;
psy.SetUnitSystem(psy.SI);
const lines = [
  "# psychrolib 1.1.1 from npm (PsychroLib, MIT), after ASHRAE Handbook - Fundamentals, 2017, chapter 1",
  "elevationM,pressurePa,temperatureC,humidityFraction,saturationPa,humidityRatio,enthalpyJkg,specificVolumeM3kg,wetBulbC,dewPointC",
];
const humidities = [0.05, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 1.0];
for (const elevation of [0, 1000, 2000, 3000]) {
  const p = psy.GetStandardAtmPressure(elevation);
  for (let t = -20; t <= 50; t += 2.5) {
    for (const rh of humidities) {
      const w = psy.GetHumRatioFromRelHum(t, rh, p);
      const row = [
        elevation, p, t, rh, psy.GetSatVapPres(t), w,
        psy.GetMoistAirEnthalpy(t, w), psy.GetMoistAirVolume(t, w, p),
        psy.GetTWetBulbFromHumRatio(t, w, p), psy.GetTDewPointFromHumRatio(t, w, p),
      ];
      lines.push(row.map((x) => Number(x.toPrecision(9))).join(","));
    }
  }
}
console.log(lines.join("\n"));
