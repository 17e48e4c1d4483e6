import { parentPort } from 'node:worker_threads';
import createHighs from 'highs';

// HiGHS computes for up to seconds without a pause: here it holds up nobody but those who asked.
const ready = createHighs();

parentPort?.on('message', async ({ id, programme, options }) => {
  const highs = await ready;
  const { Status, Columns, ObjectiveValue } = highs.solve(programme, options);
  parentPort?.postMessage({ id, status: Status, columns: Columns, cost: ObjectiveValue });
});
