import { z } from 'zod';
import {
  logAnswerSchema,
  logMappingInputSchema,
  trialLogListSchema,
  trialLogSchema,
} from '../../shared/schemas/trialLog.ts';
import { defineRoute } from '../http/defineRoute.ts';
import { getLog, getRawLog, listLogs, previewLog, storeLog } from '../services/logs.ts';

const maxBytes = 16 * 1024 * 1024;

/** The form's text field: JSON that says how to read the file. */
const uploadFieldsSchema = z.strictObject({
  mapping: z
    .string()
    .transform((text, context): unknown => {
      try {
        return JSON.parse(text);
      } catch {
        context.addIssue({ code: 'custom', message: 'must be JSON' });
        return z.NEVER;
      }
    })
    .pipe(logMappingInputSchema)
    .optional(),
});

export const logRoutes = [
  defineRoute({
    method: 'get',
    path: '/api/fixtures/:id/logs',
    access: 'read',
    summary: 'Uploaded logs, newest first',
    answers: { 200: trialLogListSchema },
    async handle({ params, deps }) {
      return { status: 200, body: await listLogs(deps, params.id) };
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/fixtures/:id/logs',
    access: 'uploadLogs',
    summary: 'Upload a trial log, or see what uploading it would do (dryRun)',
    query: z.strictObject({ dryRun: z.enum(['true', 'false']).optional() }),
    body: uploadFieldsSchema,
    upload: { maxBytes, fields: ['mapping'] },
    answers: { 200: logAnswerSchema, 201: logAnswerSchema },
    async handle({ params, query, body, file, user, deps }) {
      if (file === null) throw new Error('an upload route has a file');
      const upload = { fixtureId: params.id, file, mapping: body.mapping ?? {} };
      if (query.dryRun === 'true') return { status: 200, body: await previewLog(deps, upload) };
      const { stored, answer } = await storeLog(deps, upload, user);
      return { status: stored ? 201 : 200, body: answer };
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/logs/:id',
    access: 'read',
    summary: 'One log with its refused rows',
    answers: { 200: trialLogSchema },
    async handle({ params, deps }) {
      return { status: 200, body: await getLog(deps, params.id) };
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/logs/:id/raw',
    access: 'read',
    summary: 'The uploaded file, byte for byte',
    answers: { 200: null },
    async handle({ params, deps }) {
      const { fileName, raw } = await getRawLog(deps, params.id);
      const headers = {
        'Content-Type': 'text/plain; charset=utf-8',
        'Content-Disposition': `attachment; filename*=UTF-8''${encodeURIComponent(fileName)}`,
        'Content-Security-Policy': 'sandbox',
      };
      return { status: 200, bytes: raw, headers };
    },
  }),
];
