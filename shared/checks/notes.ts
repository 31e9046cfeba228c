import type { ConfigurationResult } from '../schemas/analysis.ts';
import type { BoundaryFit, Estimate } from '../boundary/fitBoundary.ts';
import type { Absence } from '../boundary/profileInterval.ts';
import { judgedByMark } from '../limits/markDiscount.ts';
import type { JudgeRequest } from '../judge.ts';
import { acceleration, count, digits, percent } from './text.ts';

const because: Record<Absence, string> = {
  'not fitted': 'the model could not be fitted',
  separated:
    'the trials separate, so plain maximum likelihood has no estimate; use the firth estimator',
  falling: 'the share of slips does not rise with acceleration',
  flat: 'the trials do not yet show that the share of slips rises with acceleration (slope 0 is inside the interval)',
  'no slips': 'nothing slipped',
  'no holds': 'nothing held',
};

/** Every null of a result with its reason, and what else a reader should know. */
export function notesOf(
  fit: BoundaryFit,
  request: JudgeRequest,
  configurations: readonly ConfigurationResult[],
): string[] {
  const { data, settings } = fit;
  const notes: string[] = [];
  const explain = (what: string, { estimate, lower, upper, absence }: Estimate) => {
    if (absence !== null) notes.push(`${what} has no estimate: ${because[absence]}.`);
    const open = [lower === null ? 'below' : '', upper === null ? 'above' : ''].filter(Boolean);
    if (open.length > 0 && (absence === null || estimate !== null || absence !== 'not fitted')) {
      notes.push(`${what} is not bounded ${open.join(' and ')} by these trials.`);
    }
  };

  if (data.series.length > 0) {
    const trials = data.series.reduce((sum, s) => sum + s.trials, 0);
    notes.push(
      `${count(data.series.length, 'step-up series', 'step-up series')} (${count(trials, 'trial')}) stayed out of the fit: a part stepped up until it slips is one observation, not ${trials}.`,
    );
  }
  if (settings.failure === 'lost')
    notes.push('Only lost parts count as failures; slipped parts count as held.');
  for (const [name, model] of Object.entries(fit.models)) {
    if (model.status === 'separated') {
      notes.push(
        `Model ${name}: the trials separate, plain maximum likelihood has no maximum. Use the firth estimator.`,
      );
    }
    if (model.status === 'singular') notes.push(`Model ${name}: ${singular(name)}.`);
    if (model.status === 'iterationLimit') notes.push(`Model ${name} did not converge.`);
  }
  explain('The torque at half slip', fit.torque50);
  if (fit.noCommonCurve) {
    notes.push(
      'There is no common torque and no fitted μ: the configurations do not share one curve.',
    );
  } else if (configurations.some((c) => c.shape.state === 'early' || c.shape.state === 'late')) {
    explain('The common torque at half slip', fit.commonTorque50);
  }
  if (!fit.noCommonCurve && data.referenceTorque === null) {
    notes.push('There is no fitted μ: the seat torque per unit of μ is not known.');
  }
  if (fit.models.power.status !== 'singular') {
    const { exponent } = fit.models.power;
    explain('The exponent', { ...exponent, absence: fit.exponentAbsence });
  }
  const target = `α at ${percent(settings.target)}`;
  fit.configurations.forEach((own, c) => {
    const { label, trials } = configurations[c];
    if (trials === 0) notes.push(`${label}: no trial is left in the fit.`);
    if (configurations.length > 1)
      explain(`${label}: the half-slip acceleration of its own fit`, own.alpha50.offsets);
    explain(`${label}: ${target}`, own.target);
    if (configurations.length > 1)
      explain(`${label}: its torque against that of the others`, own.ratio);
    if (trials > 0 && settings.target < 1 / trials) {
      notes.push(
        `${label}: ${target} is extrapolated, ${count(trials, 'trial')} cannot show it directly.`,
      );
    }
    const result = configurations[c];
    if (result.demonstrated === null)
      notes.push(`${label}: no demonstrated limit, ${undemonstrated(fit, request, c)}.`);
    if (result.workingLimit === null) {
      notes.push(
        `${label}: no working limit, the rule "${request.rule}" lacks ${lacking(result, request)}.`,
      );
    }
    if (result.workingLimit === 0) {
      notes.push(
        `${label}: the working limit is below the drive's resolution and rounds down to 0.`,
      );
    }
    const { holding, lettingGo } = result.theory;
    if (holding !== null && lettingGo !== null && holding > lettingGo) {
      notes.push(
        `${label}: kinetic friction lies above static friction; the band is taken from the lower to the higher.`,
      );
    }
    if (result.margin.judged !== null && result.margin.trialsAtOrBelow === 0) {
      notes.push(
        `${label}: no trial at or below ${acceleration(result.margin.judged)}; the margin is judged by extrapolation only.`,
      );
    }
  });
  if (fit.noCommonCurve)
    notes.push(
      'No common curve: α and demonstrated limits come from every configuration by itself (offsets).',
    );
  for (const comparison of fit.comparisons) {
    if (comparison.p === null) {
      const why =
        comparison.df < 1 ? 'there is one configuration only' : 'one of them has no estimates';
      notes.push(`${comparison.simpler} and ${comparison.fuller} are not compared: ${why}.`);
    }
  }
  if (fit.drift.note) notes.push(fit.drift.note);
  notes.push(...scatterNotes(fit));
  if (configurations.some((c) => c.workingLimit === null)) {
    notes.push('No limit function: a configuration has no limit by the rule.');
  }
  return [...new Set(notes)];
}

function singular(name: string): string {
  if (name === 'power')
    return 'inertia and acceleration cannot be told apart (one inertia only, or too few levels)';
  if (name === 'separate')
    return 'a configuration with a single acceleration cannot bear its own slope';
  return 'all trials lie at one acceleration, a slope needs two';
}

function undemonstrated(fit: BoundaryFit, request: JudgeRequest, c: number): string {
  if (fit.configurations[c].demonstrated === null) {
    return 'its lower bound does not exist under every model it must hold for';
  }
  const own = fit.data.configurations[c];
  if (
    judgedByMark(own) &&
    (request.moveAngle === undefined || request.smallestVisibleSlip === undefined)
  ) {
    return 'trials were judged by end mark or by eye, so the move angle and the smallest slip that would have been seen are needed (moveAngle, smallestVisibleSlip)';
  }
  return 'the smallest visible slip is as large as the move, so no slip could have been seen';
}

function lacking(result: ConfigurationResult, request: JudgeRequest): string {
  const theory =
    result.theory.holding === null ? 'a theory limit (seat torque and kinetic friction)' : '';
  const shown = result.demonstrated === null ? 'a demonstrated limit' : '';
  if (request.rule === 'theory') return theory;
  if (request.rule === 'demonstrated') return shown;
  return [theory, shown].filter(Boolean).join(' and ');
}

function scatterNotes({ heterogeneity, data }: BoundaryFit): string[] {
  const { ratio, factor, between, clusters } = heterogeneity;
  const notes: string[] = [];
  if (ratio === null) {
    notes.push(
      'Scatter beyond chance is not judged: too few repeated levels, and no seating or batch is named for every trial.',
    );
  }
  if (factor > 1) {
    notes.push(
      `Trials scatter more between ${between} than chance allows (ratio ${digits(factor)}): all intervals and shift tests are widened by it.`,
    );
  }
  const seatings = new Set(data.sent.map((trial) => trial.seating));
  const named = data.sent.every((trial) => trial.seating !== undefined);
  if (!named || seatings.size < 5) {
    notes.push('Scatter between seatings is not known: name at least five seatings.');
  } else if (between === 'batches' && clusters < 2) notes.push('One pad batch only.');
  return notes;
}
