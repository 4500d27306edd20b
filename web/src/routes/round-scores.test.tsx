import { screen, waitFor, within } from '@testing-library/react';
import { afterEach, expect, test, vi } from 'vitest';
import { aRound, aViewer } from '../test/factories';
import { fakeLink, refusal } from '../test/fake-link';
import { renderRoute } from '../test/render-route';

const PATH = '/rounds/round-1/scoring';
const CRITERIA = ['Patient safety', 'Access'];
const CANDIDATES = ['Mobile X-ray unit', 'Bone densitometer'];

const criteria = CRITERIA.map((name, index) => ({
  __typename: 'Criterion',
  id: `k-${index}`,
  name,
  lowAnchor: `nothing of ${name}`,
  highAnchor: `all of ${name}`,
  weight: '0.500000',
}));

const candidates = CANDIDATES.map((name, index) => ({
  __typename: 'Candidate',
  id: `c-${index}`,
  code: `C-0${index}`,
  name,
  need: 'Asked for.',
  department: { __typename: 'Department', id: 'd', name: 'Imaging' },
  site: { __typename: 'Site', id: 's', name: 'Alder House' },
  benefit: null,
}));

const given = (candidateId: string, criterionId: string, points: number, membershipId = 'm-1') => ({
  __typename: 'Score',
  id: `${candidateId}-${criterionId}-${membershipId}`,
  candidateId,
  criterionId,
  membershipId,
  points,
  cannotJudge: false,
  reason: '',
  version: 1,
});

function sheet(over: Record<string, unknown> = {}) {
  const { id, name, scoringClosesOn } = aRound();
  const round = { __typename: 'Round', id, name, scoringClosesOn, stage: 'SCORE' };
  const own = [given('c-0', 'k-0', 40)];
  return {
    scoreSheet: {
      __typename: 'ScoreSheet',
      round,
      candidates,
      criteria,
      own,
      others: [],
      assessors: [],
      ...over,
    },
  };
}

const savedAsAsked = ({ input }: Record<string, unknown>) => ({
  saveScore: { __typename: 'Score', id: 'new', membershipId: 'm-1', version: 1, ...(input as object) },
});

function assessor(answers: Parameters<typeof fakeLink>[0] = {}) {
  const viewer = { viewer: aViewer({ roles: ['CLINICAL_ASSESSOR'] }) };
  return fakeLink({ Viewer: viewer, RoundScores: sheet(), SaveScore: savedAsAsked, ...answers });
}

const saves = (link: ReturnType<typeof fakeLink>) =>
  link.asked.filter(({ operation }) => operation === 'SaveScore').map(({ variables }) => variables.input);

afterEach(() => void vi.restoreAllMocks());

function onPhone() {
  vi.spyOn(window, 'matchMedia').mockImplementation(
    (media) =>
      ({
        matches: media.includes('max-width: 767px'),
        media,
        addEventListener() {},
        removeEventListener() {},
      }) as unknown as MediaQueryList,
  );
}

test('scores by keyboard alone, saving when a cell is left', async () => {
  const link = assessor();
  const { user } = await renderRoute(PATH, link);
  const grid = within(await screen.findByRole('grid', { name: 'Your scores' }));
  await user.click(grid.getByRole('gridcell', { name: 'Mobile X-ray unit, Access: no score' }));
  await user.keyboard('72{Enter}x');
  expect(await grid.findByRole('gridcell', { name: 'Mobile X-ray unit, Access: 72' })).toBeVisible();
  expect(grid.getByRole('gridcell', { name: 'Bone densitometer, Access: n/a' })).toHaveFocus();
  expect(saves(link)).toEqual([
    { candidateId: 'c-0', criterionId: 'k-1', points: 72, cannotJudge: false, reason: '' },
    { candidateId: 'c-1', criterionId: 'k-1', points: null, cannotJudge: true, reason: '' },
  ]);
  expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent('You have given 3 of 4 scores');
});

test('takes score, reason and "cannot judge" on a phone', async () => {
  onPhone();
  const link = assessor();
  const { user } = await renderRoute(PATH, link);
  const safety = within(await screen.findByRole('group', { name: 'Patient safety' }));
  expect(safety.getByLabelText('Patient safety')).toHaveAccessibleDescription(/nothing of Patient safety/u);
  await user.type(safety.getByLabelText('Your reason'), 'Seen in use.');
  await user.click(safety.getByLabelText('I cannot judge this'));
  expect(safety.getByLabelText('Patient safety')).toHaveValue('');
  await user.type(safety.getByLabelText('Patient safety'), '55');
  await user.tab();
  await waitFor(() => expect(safety.getByLabelText('I cannot judge this')).not.toBeChecked());
  const cell = { candidateId: 'c-0', criterionId: 'k-0', reason: 'Seen in use.' };
  expect(saves(link)).toEqual([
    { ...cell, points: 40, cannotJudge: false },
    { ...cell, points: null, cannotJudge: true },
    { ...cell, points: 55, cannotJudge: false },
  ]);
});

test('keeps nothing above 100 and says so', async () => {
  const link = assessor();
  const { user } = await renderRoute(PATH, link);
  await user.click(await screen.findByRole('gridcell', { name: /^Mobile X-ray unit, Access/u }));
  await user.keyboard('101{Enter}');
  expect(await screen.findByRole('alert')).toHaveTextContent('Scores go from 0 to 100, so 101 was not kept.');
  expect(saves(link)).toEqual([]);
});

test('keeps a score that did not arrive and sends it again when asked', async () => {
  let up = false;
  const link = assessor({
    SaveScore: (variables) => {
      if (!up) throw refusal('WRONG_STAGE', 'Scoring is closed.');
      return savedAsAsked(variables);
    },
  });
  const { user } = await renderRoute(PATH, link);
  await user.click(await screen.findByRole('gridcell', { name: /^Bone densitometer, Access/u }));
  await user.keyboard('5{ArrowUp}');
  expect(await screen.findByRole('alert')).toHaveTextContent('Scoring is closed.');
  expect(screen.getByRole('gridcell', { name: 'Bone densitometer, Access: 5' })).toBeVisible();
  up = true;
  await user.click(screen.getByRole('button', { name: 'Send them again' }));
  expect(await screen.findByText(/^Saved,/u)).toBeVisible();
  expect(screen.queryByRole('alert')).not.toBeInTheDocument();
});

test('shows those who do not score how far it is, and no score', async () => {
  const assessors = [
    {
      __typename: 'AssessorProgress',
      given: 3,
      of: 4,
      membership: { __typename: 'Membership', id: 'm-2', name: 'Ruben Adeyi', title: 'Imaging' },
    },
  ];
  const link = fakeLink({ Viewer: { viewer: aViewer() }, RoundScores: sheet({ own: [], assessors }) });
  await renderRoute(PATH, link);
  expect(await screen.findByText('3 of 4')).toBeVisible();
  expect(screen.queryByRole('grid')).not.toBeInTheDocument();
});

test('opens everybody’s scores after closing, with those far apart in words', async () => {
  const round = { ...sheet().scoreSheet.round, stage: 'SEARCH' };
  const others = [given('c-0', 'k-0', 85, 'm-2')];
  const link = assessor({ RoundScores: sheet({ round, others }) });
  await renderRoute(PATH, link);
  expect(await screen.findByRole('img', { name: '40 to 85, far apart, yours 40' })).toBeInTheDocument();
});
