import type { CheckAnswer, CheckQuestion } from '@/lib/client/check-messages';

/** As much of a Worker as is needed, so that a test can stand in for the thread. */
export interface WorkerLike {
  postMessage(message: CheckQuestion): void;
  addEventListener(type: 'message', listener: (event: MessageEvent<CheckAnswer>) => void): void;
  addEventListener(type: 'error', listener: (event: ErrorEvent) => void): void;
  terminate(): void;
}

export interface CheckClient {
  /** Asks for a check; an answer to an older question is dropped when it comes. */
  ask(question: Omit<CheckQuestion, 'id'>): void;
  /** Makes every answer still under way stale. */
  forget(): void;
  close(): void;
}

/** Talks to one check worker. `onAnswer` hears only the answer to the newest question. */
export function createCheckClient(worker: WorkerLike, onAnswer: (answer: CheckAnswer) => void): CheckClient {
  let newestId = 0;
  let open = false;
  worker.addEventListener('message', (event) => {
    if (!open || event.data.id !== newestId) return;
    open = false;
    onAnswer(event.data);
  });
  worker.addEventListener('error', (event) => {
    open = false;
    onAnswer({ id: newestId, ok: false, message: event.message || 'The check could not be started.' });
  });
  return {
    ask(question) {
      newestId += 1;
      open = true;
      worker.postMessage({ ...question, id: newestId });
    },
    forget() {
      newestId += 1;
      open = false;
    },
    close() {
      open = false;
      worker.terminate();
    },
  };
}
