import { freshInstance } from '../fresh.mjs';
import { measure } from '../processes.mjs';

export const verificationRow = {
  id: 'T9',
  what: 'independent check of a finished file in whole numbers, reading both files included, over search time',
  floor: 'below 1 %',
  goal: 'below 0.5 %',
  async run({ seed, say }) {
    const told = [];
    for (const [place, [alternatives, seconds]] of [
      [100, 300],
      [200, 300],
      [1_000, 10],
    ].entries()) {
      const problem = freshInstance(seed, 80 + place, { alternatives });
      told.push({ alternatives, ...(await shareOf({ problem, settings: { seed }, seconds })) });
      say(`${problem.name}: ${told.at(-1).words}`);
    }
    const right = told.every(({ findings }) => findings.length === 0);
    const largest = Math.max(...told.map(({ share }) => share));
    const measured = told.map(({ alternatives, words }) => `${alternatives}: ${words}`).join('; ');
    return { measured, floor: right && largest < 0.01, goal: right && largest < 0.005 };
  },
};

async function shareOf(task) {
  const { status, points, findings, searchSeconds, verifySeconds } = await measure('searchAndVerify', task);
  const share = verifySeconds / searchSeconds;
  const told = findings.map(({ path, sentence }) => `; ${path}: ${sentence}`).join('');
  const words =
    `${(100 * share).toFixed(2)} % (${verifySeconds.toFixed(3)} of ${searchSeconds.toFixed(1)} s, ` +
    `${points} points ${status}${told})`;
  return { share, words, findings };
}
