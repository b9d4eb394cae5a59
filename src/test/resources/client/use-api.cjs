// A general-purpose client reads the document of a running server and asks by the names it finds there.
const [bundle, url, secret, planFile, weatherFile] = process.argv.slice(2);
const fs = require('fs');
const assert = require('assert');

globalThis.self = globalThis;
globalThis.window = globalThis;
globalThis.location = { href: url + '/api' };
const Client = require(bundle);

async function refused(asked) {
  try {
    await asked;
  } catch (e) {
    return e.response;
  }
  throw new Error('not refused');
}

(async () => {
  const client = await new Client({ url: url + '/api/openapi.json', authorizations: { bearer: secret } });
  assert.deepStrictEqual(client.errors, []);
  const { plans, answers, long, chambers, crops, own } = client.apis;
  const operations = Object.values(client.apis).flatMap((api) => Object.keys(api));

  const plan = JSON.parse(fs.readFileSync(planFile, 'utf8'));
  const files = { 'weather.csv': fs.readFileSync(weatherFile, 'utf8') };
  const kept = await plans.keepPlan({}, { requestBody: { plan, files, name: 'From a client' } });
  assert.strictEqual(kept.status, 201);
  const id = kept.body.id;
  const forecast = await answers.advise({ plan: id, waitS: 60 });
  assert.strictEqual(forecast.body.lots.length, plan.lots.length);
  const named = await plans.replacePlan({ plan: id, 'If-Match': kept.headers.etag },
    { requestBody: { plan, name: 'Named anew' } });
  assert.strictEqual(named.headers.etag, '"2"');
  const late = await refused(plans.replacePlan({ plan: id, 'If-Match': '"1"' }, { requestBody: { plan } }));
  assert.strictEqual(late.status, 412);
  assert.strictEqual(JSON.parse(late.text).versions.version, 2);
  const share = await answers.share({ crop: ['mango=5', 'banana'], days: 4 });
  assert.strictEqual(share.body.pairs.length, 1);
  const curve = await chambers.readCurve({ plan: id, chamber: 'cold', curve: 'air' });
  assert.strictEqual(curve.body.unit, '°C');
  const what = await chambers.whatIf({ plan: id, chamber: 'cold', settingC: 14 });
  assert.strictEqual(what.body.chamber, 'cold');
  const bad = await refused(crops.keep({ crop: 'mango', atC: 90 }));
  assert.strictEqual(JSON.parse(bad.text).faults[0].path, 'atC');
  const value = await own.setOwnValue({ crop: 'okra', fact: 'storage-life' }, { requestBody: { low: 7, high: 9 } });
  assert.strictEqual(value.body.unit, 'day');
  let job = (await long.compare({ plan: id }, { requestBody: { variants: [{ name: 'warm', set: ['chambers[cold].setting.temperatureC=15'] }] } })).body;
  while (job.state === 'running') {
    await new Promise((resolve) => setTimeout(resolve, 50));
    job = (await long.readJob({ job: job.job })).body;
  }
  const compared = await long.readResult({ job: job.job });
  assert.strictEqual(compared.body.variants[1].name, 'warm');
  await plans.deletePlan({ plan: id, version: 2 });
  console.log(operations.length + ' operations, 12 asked');
})().catch((e) => {
  console.error(e.stack, e.response && e.response.text);
  process.exit(1);
});
