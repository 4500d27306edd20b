import { parentPort, workerData } from 'node:worker_threads';
import { modelOf, workTask, type Problem, type ProofTask } from '@metewand/frontier';

// Entry of a worker thread: works on tasks of one problem as they come.

const model = modelOf(workerData as Problem);
if (!model) throw new Error('No portfolio is possible, so there can be no task.');
parentPort!.on('message', (task: ProofTask) => parentPort!.postMessage(workTask(model, task)));
parentPort!.postMessage('ready');
