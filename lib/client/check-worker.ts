import { loadLand } from '@/lib/client/load-land';
import type { CheckAnswer, CheckQuestion } from '@/lib/client/check-messages';
import { checkPassage } from '@/lib/passage-check/check-passage';
import { planToPassage } from '@/lib/schemas/to-passage';

/**
 * The check away from the page's own thread, with the same code as the server's. Without the land it still answers, and
 * the result says that land was not checked.
 */
const scope = self as unknown as DedicatedWorkerGlobalScope;
let newestId = 0;

scope.onmessage = (event: MessageEvent<CheckQuestion>) => {
  newestId = Math.max(newestId, event.data.id);
  void answer(event.data).then((reply) => {
    if (reply) scope.postMessage(reply);
  });
};

async function answer(question: CheckQuestion): Promise<CheckAnswer | null> {
  const land = await loadLand().catch(() => undefined);
  // While the land loaded or an older question was worked, a newer one may have come.
  if (question.id < newestId) return null;
  try {
    const passage = planToPassage(question.plan, question.sheet, question.asOf);
    return { id: question.id, ok: true, result: checkPassage(passage, land ? { land } : {}) };
  } catch (error) {
    return { id: question.id, ok: false, message: error instanceof Error ? error.message : String(error) };
  }
}
