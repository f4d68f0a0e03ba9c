/** The part of jstat that is used; the package ships no types. */
declare module 'jstat' {
  export const jStat: {
    /** Complementary error function, relative error about 1e-15. */
    erfc(x: number): number;
    normal: { inv(probability: number, mean: number, sd: number): number };
  };
}
