import { act, screen, waitFor, within } from '@testing-library/react';
import { afterEach, expect, test, vi } from 'vitest';
import type { Role, RoundStage } from '../generated/graphql';
import type { RunFieldsFragment } from '../features/frontier/run-fields.generated';
import { aRound, aViewer } from '../test/factories';
import { fakeLink } from '../test/fake-link';
import { renderRoute } from '../test/render-route';
import { aRun } from '../test/run-factories';

interface Setting {
  stage?: RoundStage;
  runs?: RunFieldsFragment[];
  roles?: Role[];
  answers?: Parameters<typeof fakeLink>[0];
}

/** A round as the page asks for it; `runs` may grow while the test goes on. */
function linkFor({ stage = 'SEARCH', runs = [], roles, answers = {} }: Setting) {
  const round = aRound({ stage });
  return fakeLink({
    Viewer: { viewer: aViewer({ roles, rounds: [round] }) },
    RoundFrontier: () => ({ round: { ...round, runs: [...runs] } }),
    Run: ({ id }) => ({ run: runs.find((run) => run.id === id) }),
    RunNews: ({ id }) => ({ run: runs.find((run) => run.id === id) }),
    RunProgress: ({ id }) => ({ run: runs.find((run) => run.id === id) }),
    ...answers,
  });
}

const open = (link: ReturnType<typeof linkFor>, search = '') =>
  renderRoute(`/rounds/round-1/frontier${search}`, link);

const rod = () => screen.findByRole('slider', { name: 'Portfolio A by capital' });

afterEach(() => vi.useRealTimers());

test('sends people to scoring while scores are still open', async () => {
  await open(linkFor({ stage: 'SCORE' }));
  expect(await screen.findByRole('heading', { name: 'Scoring must be closed first' })).toBeVisible();
  expect(screen.getByRole('link', { name: 'Open scoring' })).toHaveAttribute(
    'href',
    '/rounds/round-1/scoring',
  );
  expect(screen.queryByRole('button', { name: 'Start search' })).toBeNull();
});

test('starts a search on the chosen cost and shows the new run', async () => {
  const runs: RunFieldsFragment[] = [];
  const link = linkFor({
    runs,
    answers: {
      StartSearch: () => {
        runs.push(aRun({ number: 1 }));
        return { startSearch: { __typename: 'Run', id: 'run-7', number: 1 } };
      },
    },
  });
  const { user, where } = await open(link);
  await user.selectOptions(await screen.findByLabelText('Cost to weigh against benefit'), 'LIFE_CYCLE');
  await user.click(screen.getByRole('button', { name: 'Start search' }));
  expect(await rod()).toBeVisible();
  expect(where()).toBe('/rounds/round-1/frontier?run=1');
  expect(link.asked.find(({ operation }) => operation === 'StartSearch')?.variables).toEqual({
    input: { roundId: 'round-1', costAxis: 'LIFE_CYCLE' },
  });
});

test('names every limit that collides and leads to the limits', async () => {
  const notes = ['Installation days: 54 of 50.', 'Floor area, Alder House: 102 of 96 m².'];
  const answers = {
    StartSearch: { startSearch: { __typename: 'LimitsCollide', message: 'The limits collide.', notes } },
  };
  const { user } = await open(linkFor({ answers }));
  await user.click(await screen.findByRole('button', { name: 'Start search' }));
  const alert = await screen.findByRole('alert');
  expect(alert).toHaveTextContent('The limits collide.');
  expect(
    within(alert)
      .getAllByRole('listitem')
      .map(({ textContent }) => textContent),
  ).toEqual(notes);
  expect(within(alert).getByRole('link', { name: 'Open the limits' })).toHaveAttribute(
    'href',
    '/rounds/round-1/limits',
  );
});

test('answers in a sentence that claims no more than is proven', async () => {
  await open(linkFor({ runs: [aRun()] }));
  expect(await screen.findByRole('heading', { level: 1 })).toHaveTextContent(
    /^300.k buys 60,3 benefit points\. Best found so far; not yet proven complete\.$/u,
  );
  expect(screen.getByText('Ended, not yet proven')).toBeVisible();
  expect(screen.getByText('Pale rod: nothing proven yet')).toBeVisible();
});

test('says how many points could still be missed, and when none could', async () => {
  const { certificate, points } = aRun();
  const bound = { __typename: 'ChartPoints' as const, costs: [100_000, 400_000], benefits: [20, 66] };
  const bounded = { ...certificate, status: 'BOUNDED' as const, gapPercent: 0.3, provenShare: 0.4, bound };
  const complete = { ...certificate, status: 'COMPLETE' as const, provenShare: 1 };
  const atMost = ['0', '0', '5.7500', '1.0000'];
  const bounding = points.map((point, place) => ({ ...point, atMostMore: atMost[place]! }));
  const runs = [
    aRun({ state: 'STOPPED', certificate: bounded, points: bounding }),
    aRun({ id: 'run-6', number: 6, certificate: complete }),
  ];
  const { user } = await open(linkFor({ runs }));
  const heading = await screen.findByRole('heading', { level: 1 });
  expect(heading).toHaveTextContent('At this cost, at most 5,8 more are possible.');
  const figures = screen.getByRole('table', { name: /Figures of the selected/u });
  expect(within(figures).getByRole('row', { name: /^More possible/u })).toHaveTextContent('at most 5,8');
  expect(screen.getByText(/^Stopped and kept, within 0,3.% of the bound$/u)).toBeVisible();
  expect(screen.getByText(/ kept, 40.% of the axis proven$/u)).toBeVisible();
  await user.selectOptions(screen.getByLabelText('Run'), '6');
  expect(await screen.findByText('Proven complete')).toBeVisible();
  expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent('Nothing at this cost does better.');
  expect(screen.getByText(/no better portfolio exists at any cost$/u)).toBeVisible();
  expect(screen.getByText('Nothing beats these')).toBeVisible();
});

test('tells when asked what else there is at the cost of A', async () => {
  const { points } = aRun();
  const nextBest = { ...points[2]!, benefit: '58.2500', picks: [0, 1, 3] };
  const answers = {
    RunAlternatives: () => ({
      run: {
        __typename: 'Run',
        id: 'run-7',
        alternatives: { __typename: 'PointAlternatives', count: 4, isExact: true, nextBest },
      },
    }),
  };
  const link = linkFor({ runs: [aRun()], answers });
  const { user } = await open(link);
  await user.click(await screen.findByRole('button', { name: 'Other portfolios here' }));
  expect(await screen.findByText('3 other portfolios have the same benefit and cost.')).toBeVisible();
  expect(screen.getByText('Next best at the same cost: 2,0 points less.')).toBeVisible();
  expect(screen.getByText('It takes in Bone densitometer.')).toBeVisible();
  expect(screen.getByText('It loses Patient monitors.')).toBeVisible();
  const asked = link.asked.filter(({ operation }) => operation === 'RunAlternatives');
  expect(asked).toMatchObject([{ variables: { id: 'run-7', pointIndex: 2 } }]);
});

test('moves along the kept portfolios by keyboard and puts B on A', async () => {
  const { user, where } = await open(linkFor({ runs: [aRun()] }));
  const slider = await rod();
  expect(slider).toHaveAttribute(
    'aria-valuetext',
    expect.stringMatching(/^Portfolio A, 300.000.€, 60,3 points$/u),
  );
  act(() => slider.focus());
  await user.keyboard('{ArrowLeft}');
  expect(slider).toHaveAttribute('aria-valuetext', expect.stringMatching(/200.000.€, 50,5 points$/u));
  await user.keyboard('c{Home}');
  expect(slider).toHaveAttribute('aria-valuenow', '0');
  const figures = screen.getByRole('table', { name: /Figures of the selected/u });
  expect(within(figures).getByRole('row', { name: /^Benefit points/u })).toHaveTextContent('20,050,5');
  await user.keyboard('{End}');
  expect(slider).toHaveAttribute('aria-valuenow', '3');
  await user.keyboard('k');
  expect(slider).toHaveAttribute('aria-valuenow', '1');
  await waitFor(() => expect(where()).toBe('/rounds/round-1/frontier?a=200000.00&b=200000.00'));
});

test('says what one step more and one step less exchange', async () => {
  const { user } = await open(linkFor({ runs: [aRun()] }), '?a=200000');
  const gains = await screen.findByRole('region', { name: 'One step further, one step back' });
  expect(gains).toHaveTextContent('No kept portfolio buys more for up to');
  const slider = await rod();
  act(() => slider.focus());
  await user.keyboard('{End}');
  expect(gains).toHaveTextContent(/−4,8\s*points for/u);
  expect(gains).toHaveTextContent('Loses Bone densitometer; takes in Patient monitors');
});

test('lists what A is made of, by how many kept portfolios hold it', async () => {
  await open(linkFor({ runs: [aRun()] }), '?a=200000');
  const all = await screen.findByRole('region', { name: 'In all 3 kept portfolios' });
  expect(within(all).getByRole('listitem')).toHaveTextContent('Steam steriliser');
  expect(within(all).getByRole('img', { name: 'Mandatory' })).toBeInTheDocument();
  const some = screen.getByRole('region', { name: 'In some' });
  expect(
    within(some)
      .getAllByRole('listitem')
      .map(({ textContent }) => textContent),
  ).toEqual([
    expect.stringMatching(/^Infusion pumps67.%$/u),
    expect.stringMatching(/^Patient monitors33.%$/u),
  ]);
  expect(
    within(some)
      .getAllByRole('img')
      .map(({ ariaLabel }) => ariaLabel),
  ).toEqual(['In A:', 'Not in A:']);
  expect(screen.getByRole('region', { name: 'In none' })).toHaveTextContent('Bone densitometer');
});

test('points out the candidates left out before the search', async () => {
  const leftOut: RunFieldsFragment['leftOut'] = [
    {
      __typename: 'RunLeftOut',
      candidateId: 'C-05',
      code: 'C-05',
      name: 'Dental compressor',
      reason: 'No quote is open on the decision date',
      mandatory: true,
    },
  ];
  await open(linkFor({ runs: [aRun({ leftOut })] }));
  const list = await screen.findByRole('region', { name: 'Left out before the search' });
  expect(list).toHaveTextContent('Dental compressor C-05MandatoryNo quote is open on the decision date');
});

test('shows the same portfolios as a table, with the same one selected', async () => {
  const { user, where } = await open(linkFor({ runs: [aRun()] }), '?a=200000.00');
  const link = await screen.findByRole('link', { name: 'Show as table' });
  await act(() => user.click(link));
  const table = await screen.findByRole('table', { name: 'Kept portfolios in order of cost' });
  expect(within(table).getAllByRole('row')).toHaveLength(5);
  const pressed = within(table).getByRole('button', { pressed: true });
  expect(pressed).toHaveAccessibleName(/200.000,00/u);
  await user.click(within(table).getByRole('button', { name: /400.000,00/u }));
  expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent(/^400.k buys 65,0/u);
  await waitFor(() => expect(where()).toBe('/rounds/round-1/frontier?a=400000.00&view=table'));
});

test('restores the view an address names', async () => {
  await open(linkFor({ runs: [aRun()] }), '?a=100000.00&b=300000.00&view=table');
  expect(await screen.findByRole('table', { name: 'Kept portfolios in order of cost' })).toBeVisible();
  expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent(/^100.k buys 20,0/u);
  expect(screen.getByRole('columnheader', { name: /compared/u })).toBeVisible();
});

test('sends A for approval with a reason', async () => {
  const answers = { SubmitSelection: { submitSelection: { __typename: 'Selection', id: 'selection-1' } } };
  const link = linkFor({ runs: [aRun()], answers });
  const { user, where } = await open(link);
  await user.click(await screen.findByRole('button', { name: 'Send A for approval' }));
  const dialog = await screen.findByRole('dialog', { name: 'Send A for approval' });
  expect(dialog).toHaveTextContent(/Benefit points60,2500Capital300.000,00.€Candidates3 of 4/u);
  await user.click(within(dialog).getByRole('button', { name: 'Send for approval' }));
  const reason = within(dialog).getByLabelText('Reason for this choice');
  expect(reason).toHaveAccessibleDescription('Write why this portfolio is the one to buy.');
  await user.type(reason, 'Most benefit under the ceiling');
  await user.click(within(dialog).getByRole('button', { name: 'Send for approval' }));
  await waitFor(() => expect(where()).toBe('/rounds/round-1/approval'));
  expect(link.asked.filter(({ operation }) => operation === 'SubmitSelection')).toMatchObject([
    { variables: { input: { runId: 'run-7', pointIndex: 2, reason: 'Most benefit under the ceiling' } } },
  ]);
});

test('keeps the reason when the round has changed since the run', async () => {
  const message = 'The round has changed since run 7. Run the search again.';
  const answers = { SubmitSelection: { submitSelection: { __typename: 'RunOutdated', message } } };
  const { user } = await open(linkFor({ runs: [aRun()], answers }));
  await user.click(await screen.findByRole('button', { name: 'Send A for approval' }));
  await user.type(await screen.findByLabelText('Reason for this choice'), 'Because');
  await user.click(screen.getByRole('button', { name: 'Send for approval' }));
  expect(await screen.findByRole('alert')).toHaveTextContent(message);
  expect(screen.getByLabelText('Reason for this choice')).toHaveValue('Because');
});

test('says why a portfolio above the ceiling cannot be sent', async () => {
  await open(linkFor({ runs: [aRun()] }), '?a=400000.00');
  const button = await screen.findByRole('button', { name: 'Send A for approval' });
  expect(button).toBeDisabled();
  expect(button).toHaveAccessibleDescription(/capital of A lies above the ceiling/u);
});

test('leaves out what a member may not do', async () => {
  await open(linkFor({ runs: [aRun()], roles: ['AUDITOR'] }));
  expect(await rod()).toBeVisible();
  expect(screen.queryByRole('button', { name: 'Send A for approval' })).toBeNull();
  expect(screen.queryByRole('button', { name: 'Run again' })).toBeNull();
});

test('shows the best found so far while searching, and the end when it comes', async () => {
  vi.useFakeTimers({ shouldAdvanceTime: true });
  const ended = aRun();
  const runs = [aRun({ state: 'SEARCHING', finishedAt: null, points: ended.points.slice(0, 2) })];
  const link = linkFor({ runs });
  await open(link);
  expect(await screen.findByText('Searching')).toBeVisible();
  expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent(/^200.k buys 50,5/u);
  expect(screen.getByRole('button', { name: 'Send A for approval' })).toBeDisabled();
  runs[0] = ended;
  await act(() => vi.advanceTimersByTimeAsync(1_100));
  expect(await screen.findByText('Ended, not yet proven')).toBeVisible();
  expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent(/^300.k buys 60,3/u);
  const asked = () => link.asked.filter(({ operation }) => /^Run(News|Progress)$/u.test(operation)).length;
  const before = asked();
  await act(() => vi.advanceTimersByTimeAsync(5_000));
  expect(asked()).toBe(before);
});

test('stops a search and keeps what it has found', async () => {
  const runs = [aRun({ state: 'SEARCHING', finishedAt: null })];
  const answers = { StopSearch: { stopSearch: { __typename: 'Run', id: 'run-7', stopRequested: true } } };
  const link = linkFor({ runs, answers });
  const { user } = await open(link);
  await user.click(await screen.findByRole('button', { name: 'Stop and keep' }));
  await waitFor(() =>
    expect(link.asked).toContainEqual(
      expect.objectContaining({ operation: 'StopSearch', variables: { runId: 'run-7' } }),
    ),
  );
});

test('tells a run whose limits collide from one that failed', async () => {
  const infeasible = aRun({
    state: 'INFEASIBLE',
    points: [],
    kneeIndex: null,
    notes: ['Floor area, Alder House: 102 of 96 m².'],
  });
  const failed = aRun({
    id: 'run-6',
    number: 6,
    state: 'FAILED',
    points: [],
    failure: 'The worker was lost.',
  });
  const { user } = await open(linkFor({ runs: [infeasible, failed] }));
  expect(await screen.findByText('Run 7: the limits cannot be met together.')).toBeVisible();
  expect(screen.getByText('Floor area, Alder House: 102 of 96 m².')).toBeVisible();
  await user.selectOptions(screen.getByLabelText('Run'), '6');
  expect(await screen.findByText('Run 6 stopped: The worker was lost.')).toBeVisible();
});
