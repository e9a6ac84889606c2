import { inData, readIfThere } from './place.mjs';
import { say } from './say.mjs';

const file = inData('demo-sign-ins.json');

/** Prints who can sign in to the demo; the seed wrote them down, since the database keeps only hashes. */
export function demoSignIns() {
  const text = readIfThere(file);
  if (!text) return;
  const people = JSON.parse(text);
  say(`\n${JSON.stringify(people)}`);
}
