/** Plain dense linear algebra for test references, so that they share no matrix code with what they check. */

/** Least-squares solution of rows * x = right by Householder transformations. */
export function householderSolve(rows: readonly (readonly number[])[], right: readonly number[]): number[] {
  const a = rows.map((row) => [...row]);
  const b = [...right];
  const [m, n] = [a.length, a[0]!.length];
  for (let k = 0; k < n; k++) {
    let size = 0;
    for (let i = k; i < m; i++) size += a[i]![k]! ** 2;
    size = Math.sqrt(size) * (a[k]![k]! > 0 ? -1 : 1);
    if (size === 0) continue;
    const v = a.map((row, i) => (i < k ? 0 : row[k]!));
    v[k]! -= size;
    const vv = v.reduce((s, x) => s + x * x, 0);
    for (let j = k; j < n; j++) {
      const f = (2 * v.reduce((s, x, i) => s + x * a[i]![j]!, 0)) / vv;
      for (let i = k; i < m; i++) a[i]![j]! -= f * v[i]!;
    }
    const f = (2 * v.reduce((s, x, i) => s + x * b[i]!, 0)) / vv;
    for (let i = k; i < m; i++) b[i]! -= f * v[i]!;
  }
  const x = new Array<number>(n).fill(0);
  for (let k = n - 1; k >= 0; k--) {
    let s = b[k]!;
    for (let j = k + 1; j < n; j++) s -= a[k]![j]! * x[j]!;
    x[k] = s / a[k]![k]!;
  }
  return x;
}

/** Inverse by Gauss-Jordan elimination with row pivots. */
export function invert(matrix: readonly (readonly number[])[]): number[][] {
  const n = matrix.length;
  const a = matrix.map((row, i) => [...row, ...row.map((_, j) => (i === j ? 1 : 0))]);
  for (let k = 0; k < n; k++) {
    let pivot = k;
    for (let i = k + 1; i < n; i++) if (Math.abs(a[i]![k]!) > Math.abs(a[pivot]![k]!)) pivot = i;
    [a[k], a[pivot]] = [a[pivot]!, a[k]!];
    const d = a[k]![k]!;
    for (let j = 0; j < 2 * n; j++) a[k]![j]! /= d;
    for (let i = 0; i < n; i++) {
      if (i === k) continue;
      const f = a[i]![k]!;
      if (f !== 0) for (let j = 0; j < 2 * n; j++) a[i]![j]! -= f * a[k]![j]!;
    }
  }
  return a.map((row) => row.slice(n));
}
