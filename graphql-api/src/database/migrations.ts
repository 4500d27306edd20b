import { Foundation1764600001000 } from './migrations/01-foundation.js';
import { Organisations1764600002000 } from './migrations/02-organisations.js';
import { Identity1764600003000 } from './migrations/03-identity.js';
import { Audit1764600004000 } from './migrations/04-audit.js';
import { Rounds1764600005000 } from './migrations/05-rounds.js';
import { Candidates1764600006000 } from './migrations/06-candidates.js';
import { Quotes1764600007000 } from './migrations/07-quotes.js';
import { Limits1764600008000 } from './migrations/08-limits.js';
import { Scoring1764600009000 } from './migrations/09-scoring.js';
import { Runs1764600010000 } from './migrations/10-runs.js';
import { Selections1764600011000 } from './migrations/11-selections.js';
import { Letters1764600012000 } from './migrations/12-letters.js';
import { Jobs1764600013000 } from './migrations/13-jobs.js';
import { PatientJobs1764600014000 } from './migrations/14-patient-jobs.js';
import { RunEffort1764600015000 } from './migrations/15-run-effort.js';
import { RunTasks1764600016000 } from './migrations/16-run-tasks.js';

/** In the order in which they are run. */
export const migrations = [
  Foundation1764600001000,
  Organisations1764600002000,
  Identity1764600003000,
  Audit1764600004000,
  Rounds1764600005000,
  Candidates1764600006000,
  Quotes1764600007000,
  Limits1764600008000,
  Scoring1764600009000,
  Runs1764600010000,
  Selections1764600011000,
  Letters1764600012000,
  Jobs1764600013000,
  PatientJobs1764600014000,
  RunEffort1764600015000,
  RunTasks1764600016000,
];
