import { createInterface } from 'node:readline';
import { answerLine } from './calc-answer';

/**
 * The brine science on a pipe: one JSON question a line in, one JSON answer a line out.
 * `echo '{"ask":"freezing-point","solutes":[{"material":"NaCl","massFraction":0.1}]}' | npm run -s calc`
 */
async function main(): Promise<void> {
  process.stdout.on('error', () => process.exit(0));
  for await (const line of createInterface({ input: process.stdin, crlfDelay: Infinity })) {
    const answer = answerLine(line.replace(/^\uFEFF/, ''));
    if (answer !== null && !process.stdout.write(`${JSON.stringify(answer)}\n`)) {
      await new Promise((resolve) => process.stdout.once('drain', resolve));
    }
  }
}

await main();
