import 'mathjs';

/** Left out of the types that mathjs 15 ships. */
declare module 'mathjs' {
  export function solveODE(
    slope: (t: number, y: number[]) => number[],
    span: number[],
    start: number[],
    options: { readonly method: 'RK23' | 'RK45'; readonly tol: number; readonly maxIter: number },
  ): { readonly t: number[]; readonly y: number[][] };
}
