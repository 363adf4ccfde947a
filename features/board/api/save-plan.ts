import { isLostConnection, ProblemError, send } from '@/lib/http/client';
import type { SaveAnswer, SaveRequest } from '../store/save-answer';
import { planUrl } from './plan-url';
import type { PlanAnswer } from './fetch-plan';

/** Statuses after which the same request may well succeed: the server is busy, restarting or briefly away. */
const passing: readonly number[] = [429, 502, 503, 504];

/** Saves a plan's content; never throws, whatever becomes of it. */
export const savePlan = async (siteId: string, planId: string, { version, content, summary }: SaveRequest): Promise<SaveAnswer> => {
  try {
    const saved = await send<{ version: number }>('PUT', planUrl(siteId, planId), { body: { content, summary }, version });
    return { kind: 'saved', version: saved.version };
  } catch (error) {
    if (!(error instanceof ProblemError)) return { kind: 'unreachable' };
    const { problem } = error;
    if (isLostConnection(error) || passing.includes(problem.status)) return { kind: 'unreachable' };
    if (problem.code === 'stale' && problem.current !== undefined) {
      const current = problem.current as PlanAnswer;
      return { kind: 'stale', version: current.version, content: current.content, by: current.byYou ? 'Another window of yours' : current.changedBy };
    }
    return { kind: 'refused', words: problem.detail };
  }
};
