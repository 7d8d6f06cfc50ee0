/** The one distribution of jstat that the tests call; the package brings no types. */
declare module 'jstat' {
  const jStat: {
    normal: {
      pdf(x: number, mean: number, sd: number): number;
      cdf(x: number, mean: number, sd: number): number;
    };
  };
  export default jStat;
}
