import type { Cells, Partition } from './cells.ts';
import { createCellTerms, type LinkFunction } from './link.ts';

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
  /** Whether a penalised likelihood with several local maxima must be reckoned with. */
  careful: boolean;
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
  /** Largest |Δη| over the cells when intercepts change by `a` and the slope by `b`. */
  reach: (a: Float64Array, b: number) => number;
  /** Takes the trials of some groups out of the unpenalised likelihood (and puts all others back). */
  leaveOut: (groups: (group: number) => boolean) => void;
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
  const { size, configuration } = cells;
  const G = partition.groups;
  const groupAt = (i: number) => partition.groupOf[configuration[i]];
  // cells sorted by group, so that every sum runs over a stretch
  const order = Int32Array.from(cells.z.keys()).sort((i, j) => groupAt(i) - groupAt(j));
  const start = new Int32Array(G + 1);
  for (let i = 0; i < size; i++) start[groupAt(i) + 1]++;
  for (let g = 0; g < G; g++) start[g + 1] += start[g];
  const z = Float64Array.from(order, (i) => cells.z[i]);
  const n = Float64Array.from(order, (i) => cells.n[i]);
  const k = Float64Array.from(order, (i) => cells.k[i]);
  const eta = new Float64Array(size);
  const terms = createCellTerms(size);
  const { score, curve, w, w1, w2 } = terms;
  const sumW = new Float64Array(G);
  const sumWz = new Float64Array(G);
  // per group: weighted mean m, V = Σw(z − m)², Σw′(z − m)^j (0–3), Σw″(z − m)^j (0–4)
  const mean = new Float64Array(G);
  const V = new Float64Array(G);
  const P = new Float64Array(4 * G);
  const R = new Float64Array(5 * G);

  const model: CommonSlope = {
    cells,
    groups: G,
    groupOf: partition.groupOf,
    link,
    careful: true,
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
    reach,
    leaveOut,
  };

  const lowest = new Float64Array(G).fill(Infinity);
  const highest = new Float64Array(G).fill(-Infinity);
  for (let i = 0; i < size; i++) {
    const g = groupAt(i);
    lowest[g] = Math.min(lowest[g], cells.z[i]);
    highest[g] = Math.max(highest[g], cells.z[i]);
  }

  function reach(a: Float64Array, b: number): number {
    let largest = 0;
    for (let g = 0; g < G; g++) {
      largest = Math.max(largest, Math.abs(a[g] + b * lowest[g]), Math.abs(a[g] + b * highest[g]));
    }
    return largest;
  }

  function leaveOut(groups: (group: number) => boolean): void {
    for (let g = 0; g < G; g++) {
      const out = groups(g);
      for (let i = start[g]; i < start[g + 1]; i++) {
        n[i] = out ? 0 : cells.n[order[i]];
        k[i] = out ? 0 : cells.k[order[i]];
      }
    }
  }

  function evaluate(a: Float64Array, b: number, penalty: Penalty): void {
    for (let g = 0; g < G; g++) {
      const own = a[g];
      for (let i = start[g]; i < start[g + 1]; i++) eta[i] = own + b * z[i];
    }
    model.logLik = link.terms(eta, n, k, terms);
    model.value = model.logLik;
    let gradB = 0;
    let hessBB = 0;
    let infoBB = 0;
    for (let g = 0; g < G; g++) {
      let [u0, h0, h1, s, t] = [0, 0, 0, 0, 0];
      for (let i = start[g]; i < start[g + 1]; i++) {
        const zi = z[i];
        u0 += score[i];
        gradB += score[i] * zi;
        const h = curve[i];
        h0 += h;
        h1 += h * zi;
        hessBB += h * zi * zi;
        const wi = w[i];
        s += wi;
        t += wi * zi;
        infoBB += wi * zi * zi;
      }
      model.gradA[g] = u0;
      model.hessAA[g] = h0;
      model.hessAB[g] = h1;
      sumW[g] = s;
      sumWz[g] = t;
    }
    model.gradB = gradB;
    model.hessBB = hessBB;
    model.infoBB = infoBB;
    if (penalty !== 'none') penalise(penalty);
  }

  function penalise(penalty: 'common' | 'separate'): void {
    model.rankA.fill(0);
    model.rankB = 0;
    for (let g = 0; g < G; g++) {
      const m = sumWz[g] / sumW[g];
      let [v, p0, p1, p2, p3] = [0, 0, 0, 0, 0];
      let [r0, r1, r2, r3, r4] = [0, 0, 0, 0, 0];
      for (let i = start[g]; i < start[g + 1]; i++) {
        const u = z[i] - m;
        const u2 = u * u;
        v += w[i] * u2;
        const p = w1[i];
        const pu = p * u;
        p0 += p;
        p1 += pu;
        p2 += p * u2;
        p3 += pu * u2;
        const r = w2[i];
        const ru = r * u;
        const ru2 = r * u2;
        r0 += r;
        r1 += ru;
        r2 += ru2;
        r3 += ru * u2;
        r4 += ru2 * u2;
      }
      mean[g] = m;
      V[g] = v;
      P.set([p0, p1, p2, p3], 4 * g);
      R.set([r0, r1, r2, r3, r4], 5 * g);
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
