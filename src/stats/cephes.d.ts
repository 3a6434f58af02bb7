/** The functions used here; the package's own types are not reachable through its `exports`. */
declare module 'cephes' {
  const cephes: {
    incbet(a: number, b: number, x: number): number;
    incbi(a: number, b: number, p: number): number;
    igamc(a: number, x: number): number;
    ndtri(p: number): number;
    lgam(x: number): number;
  };
  export default cephes;
}
