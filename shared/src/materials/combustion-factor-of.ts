/** EN 1991-1-2 E.3: 0.8 for mainly cellulosic goods, 1 for all others. */
export function combustionFactorOf(cellulosic: boolean): 0.8 | 1 {
  return cellulosic ? 0.8 : 1;
}
