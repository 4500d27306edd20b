import { readFileSync } from 'node:fs';

/** The demo round as the product searches it, and how many points its front has by independent solvers. */
export function demoRounds() {
  const { firstOrganisation, secondOrganisationAsQuoted } = readJson('../test/demo-problems.json');
  return [
    { name: 'first organisation, capital axis', problem: firstOrganisation, points: 853 },
    { name: 'first organisation, life-cycle axis', problem: onLifeCycleAxis(firstOrganisation), points: 788 },
    { name: 'second organisation', problem: secondOrganisationAsQuoted, points: 48 },
  ];
}

/** The front of the first organisation on the capital axis as [cost, benefit], by an independent solver. */
export function demoFront() {
  return readJson('../test/demo-exact-front.json');
}

/** The ceiling is on capital: on the life-cycle axis it becomes a limit, as the product builds it. */
function onLifeCycleAxis({ ceiling, limits, items, ...rest }) {
  const [{ results }] = readJson('../../costing/test/demo-costs.json').organisations;
  const lifeCycleCosts = new Map(results.map(({ id, lifeCycleCostMinor }) => [id, lifeCycleCostMinor]));
  return {
    ...rest,
    limits: [{ name: 'ceiling', most: ceiling }, ...limits],
    items: items.map((item) => ({
      ...item,
      cost: lifeCycleCosts.get(item.id),
      uses: [item.cost, ...item.uses],
    })),
  };
}

function readJson(path) {
  return JSON.parse(readFileSync(new URL(path, import.meta.url), 'utf8'));
}
