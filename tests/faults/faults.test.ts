import { afterAll, afterEach, beforeAll } from 'vitest';
import { fullStore } from './full-store.ts';
import { killedProcesses } from './killed-processes.ts';
import { mailServer } from './mail-server.ts';
import { storesAway } from './stores-away.ts';
import { createFaultStage, type FaultStage } from './setup/fault-stage.ts';
import { beginStory, type Story } from './setup/story.ts';

/** One stage for all of it: processes are costly to start, and what one fault leaves must not trouble the next. */
let stage: FaultStage;
let story: Story;

beforeAll(async () => {
  stage = await createFaultStage();
  await Promise.all([stage.startWeb(), stage.startWorker()]);
  story = await beginStory(stage);
});
afterEach(({ task }) => {
  if (task.result?.state === 'fail') process.stderr.write(`\n--- The processes said:\n${stage.said()}\n`);
});
afterAll(() => stage?.close());

killedProcesses(() => ({ stage, story }));
storesAway(() => ({ stage, story }));
fullStore(() => ({ stage, story }));
mailServer(() => ({ stage, story }));
