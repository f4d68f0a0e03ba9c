import { describe, expect, it } from 'vitest';
import type { RunInputs } from '@/entities/run-inputs';
import { draftOfInputs } from '@/src/ui/run-draft-of-inputs';
import { emptyDraft, ownStar, usesAdvanced, type RunDraft } from '@/src/ui/run-draft';
import { requestOfDraft } from '@/src/ui/run-request-of-draft';

const catalogueId = '0d4ff3a3-7a63-4c8f-9d3e-0c9bdf3f2a11';
const draft = (changed: Partial<RunDraft> = {}): RunDraft => ({ ...emptyDraft, catalogueId, star: 'sun', ...changed });

describe('reading the run form', () => {
  it('sends only what was asked for', () => {
    expect(requestOfDraft(draft()).request).toEqual({
      catalogueId,
      starSlug: 'sun',
      release: { distanceAu: 1, eccentricity: 0, at: 'pericentre' },
      optics: { model: 'mie' },
    });
  });
  it('sends own numbers of a star instead of a preset', () => {
    const { request } = requestOfDraft(draft({ star: ownStar, massSun: '1.7', luminositySun: '8.7', teffK: '8000' }));
    expect(request?.star).toEqual({ massSun: 1.7, luminositySun: 8.7, teffK: 8000 });
    expect(request).not.toHaveProperty('starSlug');
  });
  it('sends each way of building a grain', () => {
    const opticsOf = (changed: Partial<RunDraft>) => requestOfDraft(draft(changed)).request?.optics;
    expect(opticsOf({ structure: 'porous', porosity: '0.6' })).toEqual({
      model: 'mie',
      porosity: 0.6,
      mixing: 'bruggeman',
    });
    expect(opticsOf({ structure: 'fromDensity', mixing: 'maxwellGarnett' })).toEqual({
      model: 'mie',
      porosity: 'fromDensity',
      mixing: 'maxwellGarnett',
    });
    expect(opticsOf({ structure: 'coated', mantleMaterial: 'water_ice', mantleFraction: '0.2' })).toEqual({
      model: 'mie',
      mantle: { material: 'water_ice', volumeFraction: 0.2 },
    });
    expect(opticsOf({ model: 'constant', qpr: '1', structure: 'porous' })).toEqual({ model: 'constant', qpr: 1 });
  });
  it('names the field and says why', () => {
    const problemsOf = (changed: Partial<RunDraft>) => requestOfDraft(draft(changed)).problems;
    expect(problemsOf({ eccentricity: '1.2' })).toEqual({ 'release.eccentricity': 'Must be below 1.' });
    expect(problemsOf({ distanceAu: '1,5' })).toMatchObject({
      'release.distanceAu': 'Write a number such as 0.5 or 2e-3.',
    });
    expect(problemsOf({ distanceAu: ' ' })).toMatchObject({ 'release.distanceAu': 'Give a number.' });
    expect(problemsOf({ at: 'anomaly' })).toMatchObject({ 'release.trueAnomalyDeg': 'Give a number.' });
    expect(problemsOf({ structure: 'porous', porosity: '1.5' })).toEqual({
      'optics.porosity': 'Must be at most 0.99.',
    });
    expect(problemsOf({ catalogueId: '' })).toMatchObject({ catalogueId: 'Choose a catalogue.' });
    expect(problemsOf({ star: '' })).toMatchObject({ starSlug: 'Choose a star.' });
    expect(problemsOf({ hasDisc: true, opticalDepth: '0' })).toEqual({ 'disc.opticalDepth': 'Must be above 0.' });
  });
});

describe('running again with changes', () => {
  const inputs: RunInputs = {
    catalogue: { id: catalogueId, name: 'c', sha256: 'x', rows: 3 },
    star: {
      slug: 'f5v',
      version: 1,
      name: 'F5 V',
      massSun: 1.3,
      luminositySun: 3.2,
      teffK: 6500,
      radiusSun: null,
      spectrum: null,
      citation: '',
    },
    release: { distanceAu: 2, eccentricity: 0.3, at: 'anomaly', trueAnomalyDeg: 90, parentBeta: 0.1 },
    optics: { model: 'mie', porosity: 0.4, mixing: 'maxwellGarnett' },
    wind: { massLossSunPerYr: 2e-14, speedKmS: 400, qsw: 1 },
    disc: { opticalDepth: 0.001 },
    charging: { potentialV: 5, fieldNT: 3 },
    betaCritical: 0.4,
    materials: [],
  };
  it('asks for exactly the inputs of the earlier run', () => {
    const { request } = requestOfDraft(draftOfInputs(inputs, 'first'));
    expect(request).toMatchObject({
      starSlug: 'f5v',
      release: inputs.release,
      optics: inputs.optics,
      wind: inputs.wind,
      disc: inputs.disc,
      charging: inputs.charging,
    });
  });
  it('keeps a porosity of zero solid, and own stars own', () => {
    const changed = draftOfInputs(
      { ...inputs, star: { ...inputs.star, slug: null }, optics: { model: 'mie' } },
      'first',
    );
    expect(changed.structure).toBe('solid');
    expect(requestOfDraft(changed).request?.star).toEqual({ massSun: 1.3, luminositySun: 3.2, teffK: 6500 });
  });
  it('opens the advanced part when it is used', () => {
    expect(usesAdvanced(emptyDraft)).toBe(false);
    expect(usesAdvanced(draftOfInputs(inputs, 'first'))).toBe(true);
  });
});
