// Taylor series of one step of a light path: both coordinates obey x'' = αx + βx² + γx³ (PHYSICS §3).
// Written out order by order because V8 turns straight-line arithmetic into the fastest code.

/** Highest power of the Mino time kept in a step's series. */
export const order = 16;

/** Numbers one coordinate's series occupies. */
export const terms = order + 1;

/**
 * Fills series[offset + 2 … offset + 16] from x (series[offset]) and x' (series[offset + 1]), given
 * x'' = αx + βx² + γx³ with α, β, γ at force[at], force[at + 1], force[at + 2]. Dimensionless throughout.
 */
export function expandSeries(force: Float64Array, at: number, series: Float64Array, offset: number): void {
  const alpha = force[at]!;
  const beta = force[at + 1]!;
  const gamma = force[at + 2]!;
  const x0 = series[offset]!;
  const x1 = series[offset + 1]!;

  // w is x², g is βx + γx²; each order needs only the orders before it.
  const w0 = x0 * x0;
  const g0 = beta * x0 + gamma * w0;
  const x2 = (alpha * x0 + x0 * g0) * (1 / 2);
  const w1 = 2 * x0 * x1;
  const g1 = beta * x1 + gamma * w1;
  const x3 = (alpha * x1 + x0 * g1 + x1 * g0) * (1 / 6);
  const w2 = 2 * x0 * x2 + x1 * x1;
  const g2 = beta * x2 + gamma * w2;
  const x4 = (alpha * x2 + x0 * g2 + x1 * g1 + x2 * g0) * (1 / 12);
  const w3 = 2 * (x0 * x3 + x1 * x2);
  const g3 = beta * x3 + gamma * w3;
  const x5 = (alpha * x3 + x0 * g3 + x1 * g2 + x2 * g1 + x3 * g0) * (1 / 20);
  const w4 = 2 * (x0 * x4 + x1 * x3) + x2 * x2;
  const g4 = beta * x4 + gamma * w4;
  const x6 = (alpha * x4 + x0 * g4 + x1 * g3 + x2 * g2 + x3 * g1 + x4 * g0) * (1 / 30);
  const w5 = 2 * (x0 * x5 + x1 * x4 + x2 * x3);
  const g5 = beta * x5 + gamma * w5;
  const p5 = x0 * g5 + x1 * g4 + x2 * g3;
  const q5 = x3 * g2 + x4 * g1 + x5 * g0;
  const x7 = (alpha * x5 + p5 + q5) * (1 / 42);
  const w6 = 2 * (x0 * x6 + x1 * x5 + x2 * x4) + x3 * x3;
  const g6 = beta * x6 + gamma * w6;
  const p6 = x0 * g6 + x1 * g5 + x2 * g4 + x3 * g3;
  const q6 = x4 * g2 + x5 * g1 + x6 * g0;
  const x8 = (alpha * x6 + p6 + q6) * (1 / 56);
  const w7 = 2 * (x0 * x7 + x1 * x6 + x2 * x5 + x3 * x4);
  const g7 = beta * x7 + gamma * w7;
  const p7 = x0 * g7 + x1 * g6 + x2 * g5 + x3 * g4;
  const q7 = x4 * g3 + x5 * g2 + x6 * g1 + x7 * g0;
  const x9 = (alpha * x7 + p7 + q7) * (1 / 72);
  const w8 = 2 * (x0 * x8 + x1 * x7 + x2 * x6 + x3 * x5) + x4 * x4;
  const g8 = beta * x8 + gamma * w8;
  const p8 = x0 * g8 + x1 * g7 + x2 * g6 + x3 * g5 + x4 * g4;
  const q8 = x5 * g3 + x6 * g2 + x7 * g1 + x8 * g0;
  const x10 = (alpha * x8 + p8 + q8) * (1 / 90);
  const w9 = 2 * (x0 * x9 + x1 * x8 + x2 * x7 + x3 * x6 + x4 * x5);
  const g9 = beta * x9 + gamma * w9;
  const p9 = x0 * g9 + x1 * g8 + x2 * g7 + x3 * g6 + x4 * g5;
  const q9 = x5 * g4 + x6 * g3 + x7 * g2 + x8 * g1 + x9 * g0;
  const x11 = (alpha * x9 + p9 + q9) * (1 / 110);
  const w10 = 2 * (x0 * x10 + x1 * x9 + x2 * x8 + x3 * x7 + x4 * x6) + x5 * x5;
  const g10 = beta * x10 + gamma * w10;
  const p10 = x0 * g10 + x1 * g9 + x2 * g8 + x3 * g7 + x4 * g6 + x5 * g5;
  const q10 = x6 * g4 + x7 * g3 + x8 * g2 + x9 * g1 + x10 * g0;
  const x12 = (alpha * x10 + p10 + q10) * (1 / 132);
  const w11 = 2 * (x0 * x11 + x1 * x10 + x2 * x9 + x3 * x8 + x4 * x7 + x5 * x6);
  const g11 = beta * x11 + gamma * w11;
  const p11 = x0 * g11 + x1 * g10 + x2 * g9 + x3 * g8 + x4 * g7 + x5 * g6;
  const q11 = x6 * g5 + x7 * g4 + x8 * g3 + x9 * g2 + x10 * g1 + x11 * g0;
  const x13 = (alpha * x11 + p11 + q11) * (1 / 156);
  const w12 = 2 * (x0 * x12 + x1 * x11 + x2 * x10 + x3 * x9 + x4 * x8 + x5 * x7) + x6 * x6;
  const g12 = beta * x12 + gamma * w12;
  const p12 = x0 * g12 + x1 * g11 + x2 * g10 + x3 * g9 + x4 * g8 + x5 * g7 + x6 * g6;
  const q12 = x7 * g5 + x8 * g4 + x9 * g3 + x10 * g2 + x11 * g1 + x12 * g0;
  const x14 = (alpha * x12 + p12 + q12) * (1 / 182);
  const w13 = 2 * (x0 * x13 + x1 * x12 + x2 * x11 + x3 * x10 + x4 * x9 + x5 * x8 + x6 * x7);
  const g13 = beta * x13 + gamma * w13;
  const p13 = x0 * g13 + x1 * g12 + x2 * g11 + x3 * g10 + x4 * g9 + x5 * g8 + x6 * g7;
  const q13 = x7 * g6 + x8 * g5 + x9 * g4 + x10 * g3 + x11 * g2 + x12 * g1 + x13 * g0;
  const x15 = (alpha * x13 + p13 + q13) * (1 / 210);
  const w14 = 2 * (x0 * x14 + x1 * x13 + x2 * x12 + x3 * x11 + x4 * x10 + x5 * x9 + x6 * x8) + x7 * x7;
  const g14 = beta * x14 + gamma * w14;
  const p14 = x0 * g14 + x1 * g13 + x2 * g12 + x3 * g11 + x4 * g10 + x5 * g9 + x6 * g8 + x7 * g7;
  const q14 = x8 * g6 + x9 * g5 + x10 * g4 + x11 * g3 + x12 * g2 + x13 * g1 + x14 * g0;
  const x16 = (alpha * x14 + p14 + q14) * (1 / 240);

  series[offset + 2] = x2;
  series[offset + 3] = x3;
  series[offset + 4] = x4;
  series[offset + 5] = x5;
  series[offset + 6] = x6;
  series[offset + 7] = x7;
  series[offset + 8] = x8;
  series[offset + 9] = x9;
  series[offset + 10] = x10;
  series[offset + 11] = x11;
  series[offset + 12] = x12;
  series[offset + 13] = x13;
  series[offset + 14] = x14;
  series[offset + 15] = x15;
  series[offset + 16] = x16;
}
