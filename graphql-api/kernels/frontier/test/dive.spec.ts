import { dive } from '../src/proof/dive.js';
import { FrontierGoal } from '../src/proof/goal.js';
import { lossesAt } from '../src/proof/losses.js';
import { precisionOf } from '../src/proof/precision.js';
import { StepLine } from '../src/proof/step-line.js';
import { wholeModel } from '../src/relaxation/narrow-part.js';
import { Relaxation } from '../src/relaxation/relaxation.js';
import { everyChoice, mostCost } from './every-choice.js';
import { tangledModels } from './tangled-models.js';

describe('a dive', () => {
  it('offers feasible portfolios alone, each better than all before, with its true sums', () => {
    let found = 0;
    for (const { model } of tangledModels(80, (seed) => 6 + (seed % 5))) {
      const to = mostCost(model);
      const part = wholeModel(model, 0, to);
      if (!part) continue;
      const goal = new FrontierGoal(new StepLine([]), precisionOf(model));
      const relaxation = new Relaxation(part);
      if (!relaxation.minimise(Math.floor(to / 2))) continue;
      const losses = lossesAt(part, relaxation.prices);
      const gap = goal.gapBelow(losses.tangent, part);
      if (!gap) continue;
      expect(dive(part, { relaxation, losses }, gap, goal)).toBeGreaterThanOrEqual(0);
      const feasible = new Set(everyChoice(model).map((portfolio) => JSON.stringify(portfolio)));
      for (const portfolio of goal.found) expect(feasible.has(JSON.stringify(portfolio))).toBe(true);
      found += goal.found.length;
    }
    expect(found).toBeGreaterThan(50);
  });
});
