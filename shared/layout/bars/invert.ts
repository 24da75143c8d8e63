/** The inverse of a square matrix, row by row in one array: Gauss and Jordan with the largest pivot of each column. */
export function invert(a: Float64Array, size: number): Float64Array {
  const b = new Float64Array(size * size);
  for (let i = 0; i < size; i += 1) b[i * size + i] = 1;
  const swap = (m: Float64Array, p: number, q: number) => {
    const kept = m.slice(p * size, (p + 1) * size);
    m.copyWithin(p * size, q * size, (q + 1) * size);
    m.set(kept, q * size);
  };
  const less = (m: Float64Array, row: number, share: number, from: number) => {
    for (let k = 0; k < size; k += 1)
      m[row * size + k] = (m[row * size + k] ?? 0) - share * (m[from * size + k] ?? 0);
  };
  for (let col = 0; col < size; col += 1) {
    let pivot = col;
    for (let row = col + 1; row < size; row += 1)
      if (Math.abs(a[row * size + col] ?? 0) > Math.abs(a[pivot * size + col] ?? 0)) pivot = row;
    if (pivot !== col) {
      swap(a, pivot, col);
      swap(b, pivot, col);
    }
    const by = a[col * size + col] ?? 1;
    for (let k = 0; k < size; k += 1) {
      a[col * size + k] = (a[col * size + k] ?? 0) / by;
      b[col * size + k] = (b[col * size + k] ?? 0) / by;
    }
    for (let row = 0; row < size; row += 1) {
      const share = a[row * size + col] ?? 0;
      if (row === col || share === 0) continue;
      less(a, row, share, col);
      less(b, row, share, col);
    }
  }
  return b;
}
