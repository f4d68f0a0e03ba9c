/** Three invented rows with every kind of column, to be filled in by people who begin with an empty table. */
export const exampleCatalogue = [
  'label,radius_um,radius_um_sigma,density_g_cm3,density_g_cm3_sigma,material,count',
  'example-1,0.35,0.02,2.9,0.2,astrosil,1',
  'example-2,1.8,0.1,1.6,0.1,carbon_be,1',
  'example-3,12,0.5,0.95,0.05,water_ice,3',
  '',
].join('\n');

export const exampleHref = `data:text/csv;charset=utf-8,${encodeURIComponent(exampleCatalogue)}`;
