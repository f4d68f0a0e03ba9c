import { describe, expect, test } from 'vitest';
import { readHeaderName } from '@/src/catalogues/header-name';

const said = (header: string) => {
  const reading = readHeaderName(header);
  return reading.kind === 'column' ? [reading.field, reading.unit?.symbol ?? null] : [reading.kind];
};

describe('a header on its own', () => {
  test.each([
    ['label', 'label', null],
    ['radius_um', 'radius', 'um'],
    ['radius_nm', 'radius', 'nm'],
    ['DIAMETER_MM', 'diameter', 'mm'],
    ['diameter_m', 'diameter', 'm'],
    ['mass_kg', 'mass', 'kg'],
    ['mass_g', 'mass', 'g'],
    ['mass_ng', 'mass', 'ng'],
    ['density_g_cm3', 'density', 'g_cm3'],
    ['density_kg_m3', 'density', 'kg_m3'],
    ['Material', 'material', null],
    ['count', 'count', null],
    ['radius_um_sigma', 'radiusSigma', 'um'],
    ['diameter_nm_sigma', 'diameterSigma', 'nm'],
    ['mass_pg_sigma', 'massSigma', 'pg'],
    ['density_g_cm3_sigma', 'densitySigma', 'g_cm3'],
    ['radius (um)', 'radius', 'um'],
    ['radius [\u00b5m]', 'radius', 'um'],
    ['Radius (\u03bcm) sigma', 'radiusSigma', 'um'],
    ['density (g/cm\u00b3)', 'density', 'g_cm3'],
  ])('%s holds %s in %s', (header, field, unit) => expect(said(header)).toEqual([field, unit]));

  test.each(['radius', 'Diameter', 'mass', 'density', 'radius ()', 'density_sigma'])('%s lacks its unit', (header) =>
    expect(said(header)).toEqual(['unitMissing']),
  );

  test.each(['size', 'size_um', 'size (um)', 'grain size [um]'])('%s does not say radius or diameter', (header) =>
    expect(said(header)).toEqual(['radiusOrDiameter']),
  );

  test.each(['radius_furlong', 'notes', '__proto__', 'constructor', '', 'material_sigma', 'radius_kg'])(
    '%s is unknown',
    (header) => expect(said(header)).toEqual(['unknown']),
  );

  test('a unit in brackets that is not known is not passed over', () =>
    expect(said('radius (furlong)')).toEqual(['unitUnknown']));

  test.each(['radius_um_err', 'e_radius', 'density_unc'])('%s is an error column of unknown kind', (header) =>
    expect(said(header)).toEqual(['errorOfUnknownKind']),
  );
});
