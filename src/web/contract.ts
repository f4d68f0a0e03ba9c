import { z } from 'zod';
import {
  catalogueDefaults,
  catalogueGrainItem,
  catalogueItem,
  invalidRowRule,
  rejectItem,
} from '@/src/catalogues/schema';
import { changeItem, changeSearch } from '@/src/audit/schema';
import { columnMapping } from '@/src/catalogues/mapping';
import { materialItem } from '@/src/materials/schema';
import { grainQuery } from '@/src/runs/grain-query';
import { curveRequest, runRequest } from '@/src/runs/request-schema';
import { curveAnswer, histogramBy, runCurves, runGrainItem, runHistogram, runItem } from '@/src/runs/schema';
import { catalogueGrainQuery } from '@/src/catalogues/grain-query';
import { newShare, shareItem, shareRequest } from '@/src/sharing/schema';
import { starItem } from '@/src/stars/schema';
import type { Endpoint } from './endpoint';
import { pageOf, pageQuery } from './page-schema';

const params = z.object({ id: z.uuid() });
const accepted = z.object({ id: z.uuid(), status: z.string() });
const withTotal = <T extends z.ZodType>(item: T) =>
  pageOf(item).extend({ total: z.number().int().describe('Rows that match the filter') });

export const contract = {
  listCatalogues: {
    method: 'get',
    path: '/catalogues',
    summary: "The group's catalogues, newest first",
    query: pageQuery,
    reply: pageOf(catalogueItem),
  },
  uploadCatalogue: {
    method: 'post',
    path: '/catalogues',
    summary: 'Upload a catalogue of grains; it is checked in the background',
    form: z.object({
      file: z.string().describe('The file, CSV').meta({ format: 'binary' }),
      name: z.string().max(200),
      mapping: columnMapping.optional().describe('JSON: column -> field and unit'),
      defaults: catalogueDefaults.optional(),
      onInvalidRows: invalidRowRule.optional(),
    }),
    reply: accepted,
    status: 202,
    limit: 'upload',
  },
  getCatalogue: { method: 'get', path: '/catalogues/{id}', summary: 'One catalogue', params, reply: catalogueItem },
  listCatalogueGrains: {
    method: 'get',
    path: '/catalogues/{id}/grains',
    summary: 'Its grains, sorted and filtered over all rows',
    params,
    query: catalogueGrainQuery,
    reply: withTotal(catalogueGrainItem),
  },
  listRejects: {
    method: 'get',
    path: '/catalogues/{id}/rejects',
    summary: 'Rows that were not accepted, and why',
    params,
    query: pageQuery,
    reply: withTotal(rejectItem),
  },
  downloadRejects: {
    method: 'get',
    path: '/catalogues/{id}/rejects.csv',
    summary: 'The same as CSV',
    params,
    reply: 'text/csv',
  },
  downloadOriginal: {
    method: 'get',
    path: '/catalogues/{id}/original',
    summary: 'The very bytes that were uploaded',
    params,
    reply: 'application/octet-stream',
  },
  listStars: {
    method: 'get',
    path: '/stars',
    summary: 'Star presets, newest published version of each',
    reply: pageOf(starItem),
  },
  listMaterials: {
    method: 'get',
    path: '/materials',
    summary: 'Materials, newest published version of each',
    reply: pageOf(materialItem),
  },
  computeCurve: {
    method: 'post',
    path: '/curves',
    summary: 'The calculator: efficiency and beta over radius for one material and star; nothing is stored',
    body: curveRequest,
    reply: curveAnswer,
    limit: 'curve',
  },
  listRuns: {
    method: 'get',
    path: '/runs',
    summary: "The group's runs, newest first",
    query: pageQuery.extend({ catalogueId: z.uuid().optional() }),
    reply: pageOf(runItem),
  },
  requestRun: {
    method: 'post',
    path: '/runs',
    summary: 'Request a run; it is computed in the background',
    body: runRequest,
    reply: accepted,
    status: 202,
    limit: 'run',
  },
  getRun: { method: 'get', path: '/runs/{id}', summary: 'One run: status, inputs, summary', params, reply: runItem },
  cancelRun: {
    method: 'post',
    path: '/runs/{id}/cancel',
    summary: 'Stop a run that is queued or running',
    params,
    reply: accepted,
  },
  listRunGrains: {
    method: 'get',
    path: '/runs/{id}/grains',
    summary: 'What a run says of each grain, sorted and filtered over all rows',
    params,
    query: grainQuery,
    reply: withTotal(runGrainItem),
  },
  getRunHistogram: {
    method: 'get',
    path: '/runs/{id}/histogram',
    summary: 'The size distribution split by fate',
    params,
    query: z.object({ by: z.enum(histogramBy).default('number') }),
    reply: runHistogram,
  },
  getRunCurves: {
    method: 'get',
    path: '/runs/{id}/curves',
    summary: 'The efficiency and beta curves that the run used',
    params,
    reply: runCurves,
  },
  exportRun: {
    method: 'get',
    path: '/runs/{id}/export.csv',
    summary: 'All grains of a run as CSV',
    params,
    reply: 'text/csv',
  },
  listShares: {
    method: 'get',
    path: '/runs/{id}/shares',
    summary: 'Links under which a run is shared',
    params,
    reply: pageOf(shareItem),
  },
  makeShare: {
    method: 'post',
    path: '/runs/{id}/shares',
    summary: 'Share a finished run by a link',
    params,
    body: shareRequest,
    reply: newShare,
    status: 201,
    limit: 'run',
  },
  revokeShare: {
    method: 'delete',
    path: '/shares/{id}',
    summary: 'Revoke a link at once',
    params,
    reply: z.undefined(),
    status: 204,
  },
  downloadImpact: {
    method: 'get',
    path: '/stars/{id}/impact.csv',
    summary: 'What a version of a star would change in finished runs',
    params,
    reply: 'text/csv',
  },
  listChanges: {
    method: 'get',
    path: '/changes',
    summary: 'The record of changes: of the own group, for administrators of all',
    query: changeSearch.extend({ after: z.string().max(600).optional() }),
    reply: pageOf(changeItem),
  },
  downloadChanges: {
    method: 'get',
    path: '/changes.csv',
    summary: 'The same as CSV, all that match',
    query: changeSearch,
    reply: 'text/csv',
  },
} as const satisfies Record<string, Endpoint>;
