/** The part of jstat that is used; the package ships no types. */
declare module 'jstat' {
  const jStat: {
    /** Complementary error function, relative error about 1e-15. */
    erfc(x: number): number;
  };
  export default jStat;
}
