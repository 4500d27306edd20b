import type { Item, Problem } from '../src/problem/problem.js';

/**
 * Published choices of projects under one budget or a few, with the set that is best. Items are numbered from 1 as in
 * their sources, benefit is what the source maximises.
 */
export interface PublishedBudget {
  readonly name: string;
  readonly problem: Problem;
  /** What the best selection within the budget brings. */
  readonly optimum: number;
  /** Its items; left out where the source names none. */
  readonly chosen?: readonly string[];
}

type Rest = Partial<Omit<Problem, 'items'>>;

function projects(
  values: readonly number[],
  costs: readonly number[],
  ceiling: number,
  rest: Rest = {},
): Problem {
  const items = values.map((benefit, index): Item => ({ id: `${index + 1}`, benefit, cost: costs[index] }));
  return { format: 'metewand-problem/1', ceiling, items, ...rest };
}

/** "10110" as item ids. */
function taken(marks: string): string[] {
  return [...marks].flatMap((mark, index) => (mark === '1' ? [`${index + 1}`] : []));
}

function withNeeds(problem: Problem, needs: Readonly<Record<string, string[]>>): Problem {
  const items = problem.items.map((item) => (needs[item.id] ? { ...item, needs: [needs[item.id]] } : item));
  return { ...problem, items };
}

/** Net present values in hundredths; what would lose money brings nothing. */
function inHundredths(values: readonly number[]): number[] {
  return values.map((value) => Math.max(0, Math.round(100 * value)));
}

/** Newnan, Eschenbach, Lavelle, Engineering Economic Analysis (9th ed., 2004), chapter 17. */
const NINE_PROJECTS = [100, 200, 50, 100, 100, 100, 300, 300, 50];
const NEWNAN: readonly PublishedBudget[] = [
  {
    name: 'Newnan, example 17-3 at 8 %',
    problem: projects(
      inHundredths([60.04, 67.4, 11.91, 55.48, 80.52, 67.1, 13.46, 64.38, 20.13]),
      NINE_PROJECTS,
      650,
    ),
    optimum: 35_067,
    chosen: ['1', '2', '4', '5', '6', '9'],
  },
  {
    name: 'Newnan, example 17-3 at 14.5 %',
    problem: projects(
      inHundredths([22.01, 3.87, 6.81, 21.1, 28.14, 17.91, -27.05, -31.69, -1.28]),
      NINE_PROJECTS,
      650,
    ),
    optimum: 9_984,
    chosen: ['1', '2', '3', '4', '5', '6'],
  },
  {
    name: 'Newnan, three proposals with exclusive alternatives',
    problem: {
      format: 'metewand-problem/1',
      ceiling: 250,
      items: [
        { id: '1A', benefit: 6_004, cost: 100, oneOf: '1' },
        { id: '1B', benefit: 6_606, cost: 150, oneOf: '1' },
        { id: '1C', benefit: 6_740, cost: 200, oneOf: '1' },
        { id: '2A', benefit: 957, cost: 50, oneOf: '2' },
        { id: '3A', benefit: 3_699, cost: 100, oneOf: '3' },
        { id: '3B', benefit: 3_821, cost: 150, oneOf: '3' },
      ],
    },
    optimum: 10_660,
    chosen: ['1A', '2A', '3A'],
  },
];

/**
 * Brealey, Myers, Allen, Principles of Corporate Finance, capital rationing; from memory. In the second case project 1
 * gives 30 back in the second year and so pays for project 4.
 */
const BREALEY: readonly PublishedBudget[] = [
  {
    name: 'Brealey, one year',
    problem: projects([21, 16, 12], [10, 5, 5], 10),
    optimum: 28,
    chosen: ['2', '3'],
  },
  {
    name: 'Brealey, two years',
    problem: {
      format: 'metewand-problem/1',
      ceiling: 10,
      limits: [{ name: 'second year', most: 10 }],
      items: [
        { id: '1', benefit: 21, cost: 10, uses: [-30] },
        { id: '2', benefit: 16, cost: 5, uses: [-5] },
        { id: '3', benefit: 12, cost: 5, uses: [-5] },
        { id: '4', benefit: 13, cost: 0, uses: [40] },
      ],
    },
    optimum: 34,
    chosen: ['1', '4'],
  },
];

/** Winston, Operations Research, p. 478-479, and the conditions its exercises add. */
const FOUR_INVESTMENTS = projects([16, 22, 12, 8], [5, 7, 4, 3], 14);
const WINSTON: readonly PublishedBudget[] = [
  { name: 'Winston', problem: FOUR_INVESTMENTS, optimum: 42, chosen: ['2', '3', '4'] },
  {
    name: 'Winston, at most two investments',
    problem: { ...FOUR_INVESTMENTS, counts: [{ items: ['1', '2', '3', '4'], most: 2 }] },
    optimum: 38,
    chosen: ['1', '2'],
  },
  {
    name: 'Winston, the second only with the first',
    problem: withNeeds(FOUR_INVESTMENTS, { 2: ['1'] }),
    optimum: 38,
    chosen: ['1', '2'],
  },
  {
    name: 'Winston, not both the second and the fourth',
    problem: { ...FOUR_INVESTMENTS, eitherOr: [['2', '4']] },
    optimum: 38,
    chosen: ['1', '2'],
  },
];

/** Hillier and Lieberman, Introduction to Operations Research (9th ed.); figures from memory. */
const HILLIER: readonly PublishedBudget[] = [
  {
    name: 'Hillier, California Manufacturing',
    problem: withNeeds(projects([9, 5, 6, 4], [6, 3, 5, 2], 10, { eitherOr: [['3', '4']] }), {
      3: ['1'],
      4: ['2'],
    }),
    optimum: 14,
    chosen: ['1', '2'],
  },
  {
    name: 'Hillier, General Wheels',
    problem: withNeeds(
      projects([17, 10, 15, 19, 7, 13, 9], [43, 28, 34, 48, 17, 32, 23], 100, {
        eitherOr: [
          ['1', '2'],
          ['3', '4'],
        ],
      }),
      { 3: ['1', '2'], 4: ['1', '2'] },
    ),
    optimum: 41,
    chosen: ['1', '3', '7'],
  },
];

/** Martello and Toth, Knapsack Problems (1990). */
const MARTELLO: readonly PublishedBudget[] = [
  {
    name: 'Martello and Toth, seven items',
    problem: projects([70, 20, 39, 37, 7, 5, 10], [31, 10, 20, 19, 4, 3, 6], 50),
    optimum: 107,
    chosen: taken('1001000'),
  },
  {
    name: 'Martello and Toth, eight items',
    problem: projects([15, 100, 90, 60, 40, 15, 10, 1], [2, 20, 20, 30, 40, 30, 60, 10], 102),
    optimum: 280,
    chosen: taken('11110100'),
  },
];

/** The data set KNAPSACK_01 of Florida State University (its P04 is Martello and Toth's seven items). */
const KNAPSACK_01: readonly PublishedBudget[] = [
  {
    name: 'KNAPSACK_01, P01',
    problem: projects(
      [92, 57, 49, 68, 60, 43, 67, 84, 87, 72],
      [23, 31, 29, 44, 53, 38, 63, 85, 89, 82],
      165,
    ),
    optimum: 309,
    chosen: taken('1111010000'),
  },
  {
    name: 'KNAPSACK_01, P02',
    problem: projects([24, 13, 23, 15, 16], [12, 7, 11, 8, 9], 26),
    optimum: 51,
    chosen: taken('01110'),
  },
  {
    name: 'KNAPSACK_01, P03',
    problem: projects([50, 50, 64, 46, 50, 5], [56, 59, 80, 64, 75, 17], 190),
    optimum: 150,
    chosen: taken('110010'),
  },
  {
    name: 'KNAPSACK_01, P05',
    problem: projects([350, 400, 450, 20, 70, 8, 5, 5], [25, 35, 45, 5, 25, 3, 2, 2], 104),
    optimum: 900,
    chosen: taken('10111011'),
  },
  {
    name: 'KNAPSACK_01, P06',
    problem: projects([442, 525, 511, 593, 546, 564, 617], [41, 50, 49, 59, 55, 57, 60], 170),
    optimum: 1_735,
    chosen: taken('0101001'),
  },
  {
    name: 'KNAPSACK_01, P07',
    problem: projects(
      [135, 139, 149, 150, 156, 163, 173, 184, 192, 201, 210, 214, 221, 229, 240],
      [70, 73, 77, 80, 82, 87, 90, 94, 98, 106, 110, 113, 115, 118, 120],
      750,
    ),
    optimum: 1_458,
    chosen: taken('101010111000011'),
  },
  {
    name: 'KNAPSACK_01, P08',
    problem: projects(
      [
        825594, 1677009, 1676628, 1523970, 943972, 97426, 69666, 1296457, 1679693, 1902996, 1844992, 1049289,
        1252836, 1319836, 953277, 2067538, 675367, 853655, 1826027, 65731, 901489, 577243, 466257, 369261,
      ],
      [
        382745, 799601, 909247, 729069, 467902, 44328, 34610, 698150, 823460, 903959, 853665, 551830, 610856,
        670702, 488960, 951111, 323046, 446298, 931161, 31385, 496951, 264724, 224916, 169684,
      ],
      6_404_180,
    ),
    optimum: 13_549_094,
    chosen: taken('110111000110100100000111'),
  },
];

/** A public exercise: what to pack for a hike. */
const HIKE: PublishedBudget = {
  name: '22 items for a hike',
  problem: projects(
    [150, 35, 200, 160, 60, 45, 60, 40, 30, 10, 70, 30, 15, 10, 40, 70, 75, 80, 20, 12, 50, 10],
    [9, 13, 153, 50, 15, 68, 27, 39, 23, 52, 11, 32, 24, 48, 73, 42, 43, 22, 7, 18, 4, 30],
    400,
  ),
  optimum: 1_030,
};

export const PUBLISHED_BUDGETS: readonly PublishedBudget[] = [
  ...NEWNAN,
  ...BREALEY,
  ...WINSTON,
  ...HILLIER,
  ...MARTELLO,
  ...KNAPSACK_01,
  HIKE,
];
