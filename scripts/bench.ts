/**
 * `npm run bench [rates|brine|map|ingest …]`: every figure is a ratio or a rate taken in one run, on one core, since
 * machines differ and are noisy. `ingest` makes databases of its own on the server of DATABASE_URL, or on the private one.
 */
export type Bench = () => unknown;

const benches: Readonly<Record<string, () => Promise<Bench>>> = {
  rates: async () => (await import('./bench/rates')).benchRates,
  map: async () => (await import('./bench/map')).benchMap,
  ingest: async () => (await import('./bench/ingest')).benchIngest,
};

const wanted = process.argv.slice(2);
const unknown = wanted.filter((name) => !(name in benches));
if (unknown.length > 0) {
  console.error(`There is no bench called ${unknown.join(', ')}. There are: ${Object.keys(benches).join(', ')}.`);
  process.exit(2);
}
for (const name of wanted.length > 0 ? wanted : Object.keys(benches)) {
  const load = benches[name];
  if (!load) continue;
  console.log(`\n${name}`);
  await (
    await load()
  )();
}
