const fourThirdsPi = (4 / 3) * Math.PI;

export const radiusOfSphereM = (massKg: number, densityKgM3: number): number =>
  Math.cbrt(massKg / (fourThirdsPi * densityKgM3));

export const densityOfSphereKgM3 = (massKg: number, radiusM: number): number =>
  massKg / (fourThirdsPi * radiusM * radiusM * radiusM);
