import highsLoader from 'highs';
import { parentPort, workerData } from 'node:worker_threads';

// The thread of one HiGHS model: it blocks while it solves, so it has a thread of its own. It is given the model at
// birth and answers questions one after the other; a question changes row bounds and names a portfolio to start from.

const highs = await highsLoader();
const STATUS = new Map(Object.entries(highs.constants.modelStatus).map(([name, code]) => [code, name]));
const source = {
  ...workerData.model,
  sense: highs.constants.objectiveSense.maximize,
  integrality: new Int32Array(workerData.model.numCols).fill(highs.constants.variableType.integer),
};

parentPort.on('message', (question) => {
  try {
    parentPort.postMessage(answer(question));
  } catch (error) {
    parentPort.postMessage({ failure: String(error?.message ?? error) });
  }
});

/** Each question gets a native model of its own, so that nothing of another question can linger in it. */
function answer({ rowBounds, start, seconds }) {
  return highs.withModel(source, (model) => {
    for (const [row, lower, upper] of rowBounds) model.changeRowBounds(row, lower, upper);
    model.options.set({
      output_flag: false,
      time_limit: seconds,
      mip_rel_gap: 0,
      mip_abs_gap: workerData.absoluteGap,
      mip_feasibility_tolerance: 1e-8,
      primal_feasibility_tolerance: 1e-8,
    });
    if (start) model.setSolution({ colValue: start });
    model.run();
    const status = STATUS.get(model.getModelStatus()) ?? `status ${model.getModelStatus()}`;
    const found = model.info.get('primal_solution_status') === highs.constants.solutionStatus.feasible;
    return {
      status,
      columns: found ? model.getSolution().colValue : undefined,
      bound: model.info.get('mip_dual_bound'),
    };
  });
}
