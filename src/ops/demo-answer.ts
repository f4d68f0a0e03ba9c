import { Run } from '@/entities';
import type { RunSummary } from '@/entities/run-summary';
import { demo } from '@/fixtures/demo';
import { closeOrm, forkEm } from '@/src/db';

const longestWaitMs = 300_000;

/** Waits for the demonstration's runs and prints what they found. */
async function demoAnswer(): Promise<void> {
  const deadline = Date.now() + longestWaitMs;
  for (const { run: name } of demo.catalogues) {
    const run = await endedRun(name, deadline);
    if (run.status !== 'done' || !run.summary)
      throw new Error(`The run "${name}" is ${run.status}: ${run.error ?? 'no reason given'}`);
    console.log(`\n${name}`);
    for (const line of answerLines(run.summary)) console.log(`  ${line}`);
  }
  console.log();
}

async function endedRun(name: string, deadline: number): Promise<Run> {
  while (Date.now() < deadline) {
    const run = await (await forkEm()).findOneOrFail(Run, { name }, { orderBy: { createdAt: 'desc' } });
    if (run.status !== 'queued' && run.status !== 'running') return run;
    await new Promise((resume) => setTimeout(resume, 200));
  }
  throw new Error(`The run "${name}" did not end in time: see .local/log/`);
}

function answerLines({ grains, betaCritical, unbound, perMaterial }: RunSummary): string[] {
  const [low, high] = unbound.interval95;
  return [
    `${percent(unbound.numberShare)} of the grains are unbound (95 % interval ${percent(low)} to ${percent(high)}), ` +
      `${percent(unbound.areaShare)} of the cross-section, ${percent(unbound.massShare)} of the mass; ${grains} rows, critical beta ${betaCritical.toPrecision(4)}`,
    ...perMaterial.map(({ name, unboundIntervalsUm, betaMax, radiusAtBetaMaxUm }) => {
      const where = unboundIntervalsUm.map(intervalWords).join(' and ');
      const never = `never (beta is at most ${betaMax.toPrecision(4)}, at ${radiusAtBetaMaxUm.toPrecision(4)} um)`;
      return `${name}: unbound ${where || never}`;
    }),
  ];
}

function intervalWords([lo, hi]: [number, number | null]): string {
  if (hi === null) return lo === 0 ? 'at all radii' : `above ${lo.toPrecision(4)} um`;
  return lo === 0 ? `below ${hi.toPrecision(4)} um` : `between ${lo.toPrecision(4)} and ${hi.toPrecision(4)} um`;
}

const percent = (share: number): string => `${(100 * share).toPrecision(4)} %`;

try {
  await demoAnswer();
} finally {
  await closeOrm();
}
