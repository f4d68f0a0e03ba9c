import { defineEntity, p, type InferEntity } from '@mikro-orm/core';
import { Catalogue } from './catalogue';
import { createdAt, id, moment, real } from './columns';
import { Person } from './person';
import { ResearchGroup } from './research-group';
import type { RunInputs } from './run-inputs';
import type { RunHistograms, RunSummary } from './run-summary';

export const runStatuses = ['queued', 'running', 'done', 'failed', 'cancelled'] as const;
export type RunStatus = (typeof runStatuses)[number];

export const Run = defineEntity({
  name: 'Run',
  tableName: 'run',
  properties: {
    id: id(),
    group: () => p.manyToOne(ResearchGroup),
    requestedBy: () => p.manyToOne(Person),
    catalogue: () => p.manyToOne(Catalogue).deleteRule('restrict'),
    name: p.string().length(200),
    status: p.enum([...runStatuses]),
    progress: real().default(0),
    stage: p.string().length(100).default(''),
    error: p.text().nullable(),
    inputs: p.json().$type<RunInputs>(),
    engineVersion: p.string().length(20),
    summary: p.json().$type<RunSummary | null>().nullable(),
    histograms: p.json().$type<RunHistograms | null>().nullable(),
    resultSha256: p.string().length(64).nullable(),
    claim: p.uuid().nullable(),
    attempts: p.integer().default(0),
    heartbeatAt: moment().nullable(),
    createdAt: createdAt(),
    startedAt: moment().nullable(),
    finishedAt: moment().nullable(),
  },
  indexes: [{ name: 'run_of_group', properties: ['group', 'createdAt', 'id'] }],
  checks: [
    { name: 'run_progress_share', expression: 'progress between 0 and 1' },
    {
      name: 'run_done_has_answer',
      expression: "(status = 'done') = (summary is not null) and (status = 'done') = (result_sha256 is not null)",
    },
    { name: 'run_failed_says_why', expression: "(status = 'failed') = (error is not null)" },
  ],
});
export type Run = InferEntity<typeof Run>;
