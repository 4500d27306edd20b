import type { ChildProcess } from 'node:child_process';
import { setTimeout as sleep } from 'node:timers/promises';
import { fingerprintOf } from '../src/frontier/fingerprint.js';
import { TestApp, type Member } from './app.js';
import { aDemoOrganisation, asOwner, inOrganisation, type DemoOrganisation } from './demo-organisation.js';
import { extendQuote } from './extend-quote.js';
import { search, type RunView } from './runs.js';
import { startWorker, stopWorker } from './worker-process.js';

const SUBMIT = `mutation ($input: SubmitSelectionInput!) {
  submitSelection(input: $input) {
    __typename
    ... on Selection { id number state version fingerprint reason submittedBy { name } }
    ... on SelectionAlreadyOpen { message }
    ... on RunOutdated { message }
  }
}`;
const DECIDE = `mutation ($input: DecideSelectionInput!) {
  decideSelection(input: $input) {
    __typename
    ... on Selection { id state version comment decidedBy { name } decidedAt }
    ... on SelectionAlreadyDecided { message }
    ... on OwnSubmission { message }
    ... on CommentNeeded { message }
  }
}`;
const MEMO = `query ($id: ID!) {
  selection(id: $id) {
    state fingerprint
    memo {
      roundName runNumber costAxis certificateStatus benefit capital { amount currency } lifeCycleCost { amount }
      ceiling { amount } spendable { amount } leftUnderCeiling { amount }
      lines { code quoteNumber vendorName capital { amount } benefit mandatory }
      leftOut { code capital { amount } benefit reason }
      cautions { title text } assumptions { name text } limitUses { name used least most }
    }
  }
}`;
const ROUND = 'query ($id: ID!) { round(id: $id) { stage selections { id number state } } }';
const TRAIL =
  'query ($id: ID!) { auditFeed(roundId: $id, first: 4) { items { sentence detail by { name } } } }';

let app: TestApp;
let worker: ChildProcess;
let organisation: DemoOrganisation;
let coordinator: Member;
let director: Member;
let run: RunView;

beforeAll(async () => {
  app = await TestApp.start();
  worker = await startWorker();
  organisation = await aDemoOrganisation('T2', { stage: 'SEARCH' });
  coordinator = await app.as(organisation.email('PURCHASING_COORDINATOR'));
  director = await app.as(organisation.email('FINANCE_DIRECTOR'));
  run = await search(coordinator, organisation.roundId);
}, 120_000);
afterAll(async () => {
  await stopWorker(worker);
  await app.stop();
});

const submitted = (own: Record<string, unknown> = {}, member = coordinator) =>
  member.ask(SUBMIT, {
    input: { runId: run.id, pointIndex: run.points.length - 1, reason: 'The most for the money', ...own },
  });
const submit = async (own: Record<string, unknown> = {}) => (await submitted(own)).data.submitSelection;
const decided = (id: string, own: Record<string, unknown> = {}, member = director) =>
  member.ask(DECIDE, { input: { id, version: 1, decision: 'APPROVE', comment: '', ...own } });
const decide = async (id: string, own: Record<string, unknown> = {}) =>
  (await decided(id, own)).data.decideSelection;
const round = async () => (await coordinator.get(ROUND, { id: organisation.roundId })).round;
const trail = async () => (await coordinator.get(TRAIL, { id: organisation.roundId })).auditFeed.items;
const memoOf = async (id: string) => (await coordinator.get(MEMO, { id })).selection.memo;
const change = (sql: string, parameters: unknown[] = []) =>
  asOwner((client) => inOrganisation(client, organisation.id, sql, parameters));

/** The text of the letter, once the worker has sent it and the inbox has it. The test's time limit ends the wait. */
async function letterOnce(role: string, subject: string): Promise<string> {
  for (;;) {
    const letters = (await (await fetch(`${process.env.INBOX_URL}/api/letters`)).json()) as {
      to: string[];
      subject: string;
      text: string;
    }[];
    const letter = letters.find(
      ({ to, subject: own }) => own === subject && to.includes(organisation.email(role)),
    );
    if (letter) return letter.text;
    await sleep(100);
  }
}

describe('a submission', () => {
  it('is refused for a point that the run does not have', async () => {
    const { errors } = await submitted({ pointIndex: 5_000 });
    expect(errors?.[0].extensions.code).toBe('BAD_USER_INPUT');
    expect(errors?.[0].message).toBe('Run 1 has no portfolio with the index 5000.');
  });

  it('is refused to a finance director, who decides', async () => {
    expect((await submitted({}, director)).errors?.[0].extensions.code).toBe('FORBIDDEN');
  });

  it('is refused while the run has no result', async () => {
    await change(
      `insert into metewand.run (round_id, number, cost_axis, seed, evaluations, effort, problem, items, fingerprint, started_by, state, failure)
       select round_id, 99, cost_axis, seed, evaluations, effort, problem, items, fingerprint, started_by, 'FAILED', 'broke off'
       from metewand.run where id = $1`,
      [run.id],
    );
    const [{ id }] = await change('select id from metewand.run where number = 99');
    const { errors } = await submitted({ runId: id });
    expect(errors?.[0].extensions.code).toBe('WRONG_STAGE');
    expect(errors?.[0].message).toBe('Run 99 has not ended with a result, so there is nothing to submit.');
    await change('delete from metewand.run where number = 99');
  });

  it('is refused once the round has changed since the run, and nothing is saved', async () => {
    const [before] = await change(
      'select id, points from metewand.score where candidate_id = $1 and points is not null order by id::text limit 1',
      [organisation.candidate('D02')],
    );
    const score = 'update metewand.score set points = $1 where id = $2';
    await change(score, [Number(before.points) === 0 ? 1 : 0, before.id]);
    expect(await submit()).toEqual({
      __typename: 'RunOutdated',
      message:
        'Candidates, quotes, scores or limits have changed since run 1 was started. Search again, then submit.',
    });
    expect(await round()).toEqual({ stage: 'SEARCH', selections: [] });
    await change(score, [before.points, before.id]);
  });
});

describe('a submitted portfolio', () => {
  let id: string;

  beforeAll(async () => {
    const selection = await submit();
    expect(selection).toMatchObject({
      __typename: 'Selection',
      number: 1,
      state: 'SUBMITTED',
      version: 1,
      submittedBy: { name: 'Callum Reed' },
    });
    id = selection.id;
  });

  it('takes the round to its decision, and the trail says who and why', async () => {
    expect(await round()).toEqual({ stage: 'DECIDE', selections: [{ id, number: 1, state: 'SUBMITTED' }] });
    expect((await trail()).slice(0, 2)).toEqual([
      {
        sentence: 'Round moved from Search to Decide',
        detail: 'Memo 1 submitted',
        by: { name: 'Callum Reed' },
      },
      {
        sentence: 'Portfolio of run 1 sent for approval, memo 1',
        detail: 'The most for the money',
        by: { name: 'Callum Reed' },
      },
    ]);
  });

  it('carries what is bought and what it costs', async () => {
    const memo = await memoOf(id);
    expect(memo).toMatchObject({
      roundName: 'Equipment round 2027',
      runNumber: 1,
      costAxis: 'CAPITAL',
      certificateStatus: 'COMPLETE',
      benefit: '308.9540',
      capital: { amount: '360800.40', currency: 'GBP' },
      ceiling: { amount: '380000.00' },
      spendable: { amount: '361000.00' },
      leftUnderCeiling: { amount: '199.60' },
    });
    const lines = memo.lines as { code: string; capital: { amount: string }; quoteNumber: string }[];
    expect(lines.map(({ code }) => code).join(' ')).toBe('D-02 D-03 D-06 D-09 D-11 D-13 D-14 D-15 D-19');
    expect(lines.reduce((sum, { capital }) => sum + Math.round(Number(capital.amount) * 100), 0)).toBe(
      36_080_040,
    );
    expect(lines.every(({ code, quoteNumber }) => quoteNumber.startsWith(code.replace('-', '')))).toBe(true);
  });

  it('gives every other candidate its reason', async () => {
    const { leftOut } = await memoOf(id);
    const reasons = new Map(
      (leftOut as { code: string; reason: string }[]).map(({ code, reason }) => [code, reason]),
    );
    expect(reasons.size).toBe(10);
    expect(reasons.get('D-05')).toBe('No quote is open on the decision date');
    expect(reasons.get('D-16')).toBe('Needs D-17, which cannot be bought in this round');
    expect(reasons.get('D-01')).toBe('Either this or D-02, which is in');
    for (const [code, reason] of reasons) {
      if (['D-01', 'D-05', 'D-16', 'D-17'].includes(code)) continue;
      expect(reason).toMatch(/^(Does not fit: |Would cost more than |Worth less than )/);
    }
  });

  it('warns of what nobody may overlook', async () => {
    const { cautions, limitUses, assumptions } = await memoOf(id);
    const titles = (cautions as { title: string }[]).map(({ title }) => title);
    expect(titles[0]).toMatch(/^D-05 .+ is mandatory and left out$/);
    expect(titles).toEqual(
      expect.arrayContaining(['Site needs to confirm before an order', 'Recalls and registration']),
    );
    expect(titles).not.toContain('The search is not proven complete');
    const needs = (cautions as { title: string; text: string }[]).find(({ title }) =>
      title.startsWith('Site needs'),
    );
    expect(needs?.text).toContain('A qualified person must confirm them in writing before an order.');
    expect(limitUses).toContainEqual(
      expect.objectContaining({ name: 'Installation days in house', most: '16.00' }),
    );
    expect(assumptions).toContainEqual({ name: 'Discount rate', text: '3.5 % a year, real' });
  });

  it('is asked of the finance director in a letter with a link', async () => {
    const letter = await letterOnce(
      'FINANCE_DIRECTOR',
      'Equipment round 2027: memo 1 asks for your decision',
    );
    expect(letter).toContain(`${process.env.PUBLIC_URL}/rounds/${organisation.roundId}/approval`);
    expect(letter.replaceAll('\u00a0', ' ')).toContain('360 800.40 GBP');
  });

  it('keeps every other one out until it is decided', async () => {
    expect(await submit({ pointIndex: 3 })).toEqual({
      __typename: 'SelectionAlreadyOpen',
      message: 'A portfolio of this round has been submitted or approved already. Nothing was submitted.',
    });
  });

  it('freezes the figures of the round', async () => {
    await expect(extendQuote(coordinator, organisation.quote('D05-Q1'), '2027-06-30')).rejects.toThrow(
      'WRONG_STAGE',
    );
  });

  it.each(['RETURN', 'DECLINE'])('needs a comment to %s it', async (decision) => {
    expect(await decide(id, { decision, comment: '  ' })).toEqual({
      __typename: 'CommentNeeded',
      message: 'Say in a comment why you return or decline it, so that the submitter knows what to do.',
    });
  });

  it('is not decided by a coordinator', async () => {
    expect((await decided(id, {}, coordinator)).errors?.[0].extensions.code).toBe('FORBIDDEN');
  });

  it('is not decided by whoever submitted it, whatever roles they have come to hold', async () => {
    const roles = `update metewand.membership set roles = $1 where email = $2`;
    const email = organisation.email('PURCHASING_COORDINATOR');
    await change(roles, ['{PURCHASING_COORDINATOR,FINANCE_DIRECTOR}', email]);
    expect((await decided(id, {}, coordinator)).data.decideSelection).toEqual({
      __typename: 'OwnSubmission',
      message: 'You submitted this portfolio, so somebody else has to decide on it.',
    });
    await change(roles, ['{PURCHASING_COORDINATOR}', email]);
  });

  it('is not decided over a version that is out of date', async () => {
    const { errors } = await decided(id, { version: 7 });
    expect(errors?.[0].extensions).toMatchObject({ code: 'CONFLICT', currentVersion: 1 });
    expect((await round()).stage).toBe('DECIDE');
  });

  it('is returned with a comment: the round searches on and the submitter is told', async () => {
    const comment = 'Ask for an extension of D-05 first.';
    expect(await decide(id, { decision: 'RETURN', comment })).toMatchObject({
      state: 'RETURNED',
      version: 2,
      comment,
      decidedBy: { name: 'Priya Nair' },
      decidedAt: expect.any(String),
    });
    expect((await round()).stage).toBe('SEARCH');
    expect((await trail()).slice(0, 2)).toEqual([
      {
        sentence: 'Round moved from Decide to Search',
        detail: 'Memo 1 returned',
        by: { name: 'Priya Nair' },
      },
      { sentence: 'Memo 1 returned', detail: comment, by: { name: 'Priya Nair' } },
    ]);
    expect(await letterOnce('PURCHASING_COORDINATOR', 'Equipment round 2027: memo 1 was returned')).toContain(
      comment,
    );
  });

  it('stays as it was decided', async () => {
    expect(await decide(id, { version: 2, decision: 'APPROVE' })).toEqual({
      __typename: 'SelectionAlreadyDecided',
      message: 'Memo 1 was returned already. Your decision was not saved.',
    });
  });
});

describe('the approval', () => {
  it('happens once, however often it is clicked, and lets the orders go out', async () => {
    const { id, number } = await submit();
    expect(number).toBe(2);
    const answers = await Promise.all([decide(id), decide(id)]);
    expect(answers.map((answer) => answer.__typename).sort()).toEqual([
      'Selection',
      'SelectionAlreadyDecided',
    ]);
    expect(await round()).toMatchObject({
      stage: 'ORDER',
      selections: [
        { number: 2, state: 'APPROVED' },
        { number: 1, state: 'RETURNED' },
      ],
    });
    expect(await decide(id, { version: 2, decision: 'DECLINE', comment: 'No' })).toMatchObject({
      __typename: 'SelectionAlreadyDecided',
      message: 'Memo 2 was approved already. Your decision was not saved.',
    });
    const letter = await letterOnce('PURCHASING_COORDINATOR', 'Equipment round 2027: memo 2 was approved');
    expect(letter).toContain('The orders can go out.');
  });

  it('leaves a whole audit trail, and the memo as it was submitted', async () => {
    const { auditVerify } = await coordinator.get('{ auditVerify { whole brokenSeqs } }');
    expect(auditVerify).toEqual({ whole: true, brokenSeqs: [] });
    const memos = await change('select memo, fingerprint from metewand.selection');
    expect(memos).toHaveLength(2);
    for (const { memo, fingerprint } of memos) expect(fingerprintOf(memo)).toBe(fingerprint);
  });

  it('is out of sight for another organisation', async () => {
    const other = await aDemoOrganisation('T1');
    const stranger = await app.as(other.email('FINANCE_DIRECTOR'));
    const [{ id }] = (await round()).selections;
    expect((await decided(id, {}, stranger)).errors?.[0].extensions.code).toBe('NOT_FOUND');
    expect(
      (await stranger.ask('query ($id: ID!) { selection(id: $id) { id } }', { id })).errors?.[0].extensions
        .code,
    ).toBe('NOT_FOUND');
  });
});
