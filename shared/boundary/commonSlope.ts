import type { Cells, Partition } from './cells.ts';
import type { LinkFunction } from './link.ts';

/**
 * none: ℓ; common: ℓ + ½ ln det I of "one intercept per group, one slope"; separate: the same
 * with one slope per group as well.
 */
export type Penalty = 'none' | 'common' | 'separate';

/**
 * Objective, gradient and curvature of a model with one intercept per group and a common slope,
 * η = a_g + b·z, at the last point asked for. All derivatives are with respect to (a₁ … a_G, b).
 */
export interface CommonSlope {
  cells: Cells;
  groups: number;
  groupOf: Int32Array;
  link: LinkFunction;
  /** Groups marked 1 take no part in the unpenalised likelihood. */
  skip: Uint8Array;
  logLik: number;
  /** logLik + penalty. */
  value: number;
  gradA: Float64Array;
  gradB: number;
  /** −∂² of the objective, without the rank-one part of the common penalty. */
  hessAA: Float64Array;
  hessAB: Float64Array;
  hessBB: number;
  /** ∂ ln ΣV: −∂² gains ½ v vᵀ. */
  rankA: Float64Array;
  rankB: number;
  /** Expected information: Σw, Σwz per group, Σwz². */
  infoAA: Float64Array;
  infoAB: Float64Array;
  infoBB: number;
  evaluate: (a: Float64Array, b: number, penalty: Penalty) => void;
}

/**
 * The determinant splits: ln det I = Σ_g ln S_g + ln Σ_g V_g with S_g = Σw and V_g = Σw(z − m_g)²,
 * m_g the weighted mean of group g (for separate slopes Σ_g ln V_g), so that value, score and exact
 * Hessian of the penalised likelihood cost one pass over the cells whatever the number of groups.
 *
 * @source Firth 1993, Biometrika 80:27 (penalty); Heinze & Schemper 2002, Stat. Med. 21:2409; the
 * split is the Schur complement of the arrow-shaped information matrix
 */
export function createCommonSlope(
  cells: Cells,
  partition: Partition,
  link: LinkFunction,
): CommonSlope {
  const { size, configuration, z, n, k } = cells;
  const G = partition.groups;
  const group = Int32Array.from(configuration, (c) => partition.groupOf[c]);
  const out = new Float64Array(7);
  const w = new Float64Array(size);
  const w1 = new Float64Array(size);
  const w2 = new Float64Array(size);
  const sumW = new Float64Array(G);
  const sumWz = new Float64Array(G);
  const mean = new Float64Array(G);
  // moments about the weighted mean: Σw′u^j (0–3), Σw″u^j (0–4), Σwu²
  const P = new Float64Array(4 * G);
  const R = new Float64Array(5 * G);
  const V = new Float64Array(G);

  const model: CommonSlope = {
    cells,
    groups: G,
    groupOf: partition.groupOf,
    link,
    skip: new Uint8Array(G),
    logLik: NaN,
    value: NaN,
    gradA: new Float64Array(G),
    gradB: 0,
    hessAA: new Float64Array(G),
    hessAB: new Float64Array(G),
    hessBB: 0,
    rankA: new Float64Array(G),
    rankB: 0,
    infoAA: sumW,
    infoAB: sumWz,
    infoBB: 0,
    evaluate,
  };

  function evaluate(a: Float64Array, b: number, penalty: Penalty): void {
    const { gradA, hessAA, hessAB, skip } = model;
    gradA.fill(0);
    hessAA.fill(0);
    hessAB.fill(0);
    sumW.fill(0);
    sumWz.fill(0);
    let logLik = 0;
    let gradB = 0;
    let hessBB = 0;
    let infoBB = 0;
    for (let i = 0; i < size; i++) {
      const g = group[i];
      if (skip[g] === 1) continue;
      const zi = z[i];
      link.at(a[g] + b * zi, out);
      const slips = k[i];
      const holds = n[i] - slips;
      const r1 = out[2];
      const r0 = out[3];
      const g1 = out[4];
      const g0 = out[5];
      if (slips > 0) logLik += slips * out[0];
      if (holds > 0) logLik += holds * out[1];
      const score = slips * r1 - holds * r0;
      const curve = holds * r0 * g0 - slips * r1 * g1;
      gradA[g] += score;
      gradB += score * zi;
      hessAA[g] += curve;
      hessAB[g] += curve * zi;
      hessBB += curve * zi * zi;
      const wi = n[i] * r1 * r0;
      const u = g1 + g0;
      w[i] = wi;
      w1[i] = wi * u;
      w2[i] = wi * (u * u + out[6]);
      sumW[g] += wi;
      sumWz[g] += wi * zi;
      infoBB += wi * zi * zi;
    }
    model.logLik = logLik;
    model.value = logLik;
    model.gradB = gradB;
    model.hessBB = hessBB;
    model.infoBB = infoBB;
    model.rankA.fill(0);
    model.rankB = 0;
    if (penalty !== 'none') penalise(penalty);
  }

  function penalise(penalty: 'common' | 'separate'): void {
    P.fill(0);
    R.fill(0);
    V.fill(0);
    for (let g = 0; g < G; g++) mean[g] = sumWz[g] / sumW[g];
    for (let i = 0; i < size; i++) {
      const g = group[i];
      const u = z[i] - mean[g];
      const u2 = u * u;
      V[g] += w[i] * u2;
      const p = w1[i];
      const r = w2[i];
      const at = 4 * g;
      P[at] += p;
      P[at + 1] += p * u;
      P[at + 2] += p * u2;
      P[at + 3] += p * u2 * u;
      const to = 5 * g;
      R[to] += r;
      R[to + 1] += r * u;
      R[to + 2] += r * u2;
      R[to + 3] += r * u2 * u;
      R[to + 4] += r * u2 * u2;
    }
    let total = 0;
    for (let g = 0; g < G; g++) total += V[g];
    let logDet = penalty === 'common' ? Math.log(total) : 0;
    for (let g = 0; g < G; g++) {
      const S = sumW[g];
      logDet += Math.log(S);
      const v = penalty === 'common' ? total : V[g];
      if (penalty === 'separate') logDet += Math.log(v);
      const [p0, p1, p2, p3] = [P[4 * g], P[4 * g + 1], P[4 * g + 2], P[4 * g + 3]];
      const to = 5 * g;
      // derivatives by (a + b·m, b) about the weighted mean m, where ΣwU = 0
      const gradA = 0.5 * (p0 / S + p2 / v);
      const gradB = 0.5 * (p1 / S + p3 / v);
      let aa = R[to] / S - (p0 / S) ** 2 + (R[to + 2] - (2 * p1 * p1) / S) / v;
      let ab = R[to + 1] / S - (p0 * p1) / (S * S) + (R[to + 3] - (2 * p1 * p2) / S) / v;
      let bb = R[to + 2] / S - (p1 / S) ** 2 + (R[to + 4] - (2 * p2 * p2) / S) / v;
      const [va, vb] = [p2 / v, p3 / v];
      const m = mean[g];
      if (penalty === 'common') {
        model.rankA[g] = va;
        model.rankB += vb + m * va;
      } else {
        aa -= va * va;
        ab -= va * vb;
        bb -= vb * vb;
      }
      model.gradA[g] += gradA;
      model.gradB += gradB + m * gradA;
      model.hessAA[g] -= 0.5 * aa;
      model.hessAB[g] -= 0.5 * (ab + m * aa);
      model.hessBB -= 0.5 * (bb + 2 * m * ab + m * m * aa);
    }
    model.value = model.logLik + 0.5 * logDet;
  }

  return model;
}
