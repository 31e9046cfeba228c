import {
  analysisRequestSchema,
  analysisResultSchema,
  boundarySchema,
  storedAnalysisInputSchema,
  storedAnalysisListSchema,
  storedAnalysisSchema,
} from '../../shared/schemas/analysis.ts';
import { overviewSchema } from '../../shared/schemas/overview.ts';
import { defineRoute } from '../http/defineRoute.ts';
import { getAnalysis, listAnalyses, saveAnalysis } from '../services/analyses.ts';
import { getBoundary } from '../services/currentBoundary.ts';
import { getOverview } from '../services/overview.ts';
import { runAnalysis } from '../services/runAnalysis.ts';

/** Room for 20,000 trials with every optional field. */
const analysisBodyLimit = 8 * 1024 * 1024;

export const analysisRoutes = [
  defineRoute({
    method: 'post',
    path: '/api/analysis',
    access: 'read',
    summary: 'Analyse the trials in the body; nothing is stored',
    body: analysisRequestSchema,
    bodyLimit: analysisBodyLimit,
    answers: { 200: analysisResultSchema },
    async handle({ body, deps }) {
      return { status: 200, body: await runAnalysis(deps, body) };
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/fixtures/:id/boundary',
    access: 'read',
    summary: 'The analysis of the trials as they are now, at default options',
    answers: { 200: boundarySchema },
    async handle({ params, deps }) {
      return { status: 200, body: await getBoundary(deps, params.id) };
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/fixtures/:id/analyses',
    access: 'read',
    summary: 'Kept analyses, newest first',
    answers: { 200: storedAnalysisListSchema },
    async handle({ params, deps }) {
      return { status: 200, body: await listAnalyses(deps, params.id) };
    },
  }),
  defineRoute({
    method: 'post',
    path: '/api/fixtures/:id/analyses',
    access: 'saveAnalyses',
    summary: 'Run on the stored trials and keep the result',
    body: storedAnalysisInputSchema,
    answers: { 201: storedAnalysisSchema },
    async handle({ params, body, user, deps }) {
      return { status: 201, body: await saveAnalysis(deps, params.id, body, user) };
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/analyses/:id',
    access: 'read',
    summary: 'A kept analysis',
    answers: { 200: storedAnalysisSchema },
    async handle({ params, deps }) {
      return { status: 200, body: await getAnalysis(deps, params.id) };
    },
  }),
  defineRoute({
    method: 'get',
    path: '/api/overview',
    access: 'read',
    summary: "The manager's table and the parity picture",
    answers: { 200: overviewSchema },
    async handle({ deps }) {
      return { status: 200, body: await getOverview(deps) };
    },
  }),
];
