import type { Dialect } from './writeLog.ts';

const words = { held: 'held', slipped: 'slipped', lost: 'lost' };

/** What the bench PC writes by itself. */
export const benchPc: Dialect = {
  delimiter: ',',
  decimal: '.',
  run: 'run',
  time: 'time_utc',
  position: { header: 'position_mm', unit: 'mm' },
  acceleration: { header: 'acceleration_rad_s2', unit: 'rad/s²' },
  outcome: { header: 'outcome', words },
  slip: 'peak_lag_deg',
  seating: 'seating',
  batch: 'pad_batch',
  judged: 'judged_by',
};

/** A sheet exported where the decimal sign is a comma. */
export const semicolonSheet: Dialect = {
  delimiter: ';',
  decimal: ',',
  run: 'Run',
  position: { header: 'Position [mm]', unit: 'mm' },
  acceleration: { header: 'Acceleration [rad/s²]', unit: 'rad/s²' },
  outcome: { header: 'Outcome', words: { held: 'Held', slipped: 'Slipped', lost: 'Lost' } },
  slip: 'Slip angle [°]',
  seating: 'Seating',
  batch: 'Pad batch',
  judged: 'Judged by',
};

/** The drive's own recorder: degrees and tabs. */
export const driveRecorder: Dialect = {
  delimiter: '\t',
  decimal: '.',
  run: 'Run no.',
  time: 'Timestamp',
  position: { header: 'Slide position (mm)', unit: 'mm' },
  acceleration: { header: 'Peak acceleration (deg/s²)', unit: 'deg/s²' },
  outcome: { header: 'Result', words: { held: 'OK', slipped: 'slip', lost: 'part lost' } },
  slip: 'Slip angle (deg)',
  seating: 'Seating',
  judged: 'Method',
};

/** Copied by hand from a clipboard. */
export const clipboard: Dialect = {
  delimiter: ',',
  decimal: '.',
  run: 'No.',
  position: { header: 'Mass position (cm)', unit: 'cm' },
  acceleration: { header: 'Accel (rad/s^2)', unit: 'rad/s²' },
  outcome: { header: 'Result', words: { held: 'pass', slipped: 'fail', lost: 'lost' } },
  judged: 'Judged by',
  seating: 'Seating',
};
