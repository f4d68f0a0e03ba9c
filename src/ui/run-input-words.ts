import type { RunInputs } from '@/entities/run-inputs';
import { exactText as exact } from './run-figures';

/** A name, a value in words and, where there is one, a remark. */
export type InputLine = { term: string; value: string; remark?: string };

/** The frozen inputs of a run, readable. */
export function inputLines(inputs: RunInputs): InputLine[] {
  return [
    {
      term: 'Catalogue',
      value: inputs.catalogue.name,
      remark: `${inputs.catalogue.rows.toLocaleString('en-US')} rows`,
    },
    starLine(inputs.star),
    {
      term: 'Spectrum',
      value: inputs.star.spectrum ? 'table' : 'black body',
      remark: inputs.star.citation || undefined,
    },
    ...releaseLines(inputs),
    opticsLine(inputs.optics),
    ...surroundings(inputs),
    ...inputs.materials.map(({ name, version, densityKgM3, citation }) => ({
      term: 'Optical constants',
      value: `${name}, version ${version}, ${exact(densityKgM3 / 1000)} g/cm³`,
      remark: citation,
    })),
  ];
}

function starLine({ name, slug, version, massSun, luminositySun, teffK }: RunInputs['star']): InputLine {
  const numbers = `${exact(massSun)} M☉, ${exact(luminositySun)} L☉, ${exact(teffK)} K`;
  return slug === null
    ? { term: 'Star', value: numbers, remark: 'own numbers' }
    : { term: 'Star', value: name, remark: `${numbers}; version ${version}` };
}

function releaseLines({ release, betaCritical }: RunInputs): InputLine[] {
  const where = {
    pericentre: 'at pericentre',
    apocentre: 'at apocentre',
    anomaly: `at true anomaly ${exact(release.trueAnomalyDeg ?? 0)}°`,
  };
  const parent = release.parentBeta ? `; parent with beta ${exact(release.parentBeta)}` : '';
  return [
    {
      term: 'Release',
      value: `${exact(release.distanceAu)} au from the star, ${where[release.at]}`,
      remark: `parent orbit of eccentricity ${exact(release.eccentricity)}${parent}`,
    },
    { term: 'Critical beta', value: exact(betaCritical), remark: 'grains with this beta or more are unbound' },
  ];
}

const mixingNames = { bruggeman: 'Bruggeman', maxwellGarnett: 'Maxwell Garnett' };

function opticsLine({ model, qpr, porosity, mixing, mantle }: RunInputs['optics']): InputLine {
  const term = 'Optics';
  if (model === 'constant') return { term, value: `constant Q_pr of ${exact(qpr ?? 1)}` };
  if (mantle)
    return {
      term,
      value: 'Mie theory of coated spheres',
      remark: `coating of ${mantle.material}, ${exact(mantle.volumeFraction * 100)} % of the volume`,
    };
  if (porosity === undefined || porosity === 0) return { term, value: 'Mie theory of solid spheres' };
  const rule = `${mixingNames[mixing ?? 'bruggeman']} mixing`;
  const share = porosity === 'fromDensity' ? 'porosity of each grain from its density' : `porosity ${exact(porosity)}`;
  return { term, value: 'Mie theory of porous spheres', remark: `${share}, ${rule}` };
}

function surroundings({ wind, disc, charging }: RunInputs): InputLine[] {
  const lines: InputLine[] = [];
  if (wind) {
    const value = `${exact(wind.massLossSunPerYr)} M☉ per year at ${exact(wind.speedKmS)} km/s`;
    lines.push({ term: 'Stellar wind', value, remark: `momentum transfer ${exact(wind.qsw)}` });
  }
  if (disc)
    lines.push({
      term: 'Disc',
      value: `optical depth ${exact(disc.opticalDepth)}`,
      remark: 'face on, at the release distance',
    });
  if (charging)
    lines.push({
      term: 'Charging',
      value: `${exact(charging.potentialV)} V`,
      remark: `azimuthal field ${exact(charging.fieldNT)} nT`,
    });
  return lines;
}
