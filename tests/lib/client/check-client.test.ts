import { describe, expect, it } from 'vitest';
import { createCheckClient, type WorkerLike } from '@/lib/client/check-client';
import type { CheckAnswer, CheckQuestion } from '@/lib/client/check-messages';
import { buildCheckResult, buildPlan, buildSheet } from '../../builders/check-result';

/** A worker that answers when it is told to, so that answers can come late and out of order. */
function slowWorker() {
  const asked: CheckQuestion[] = [];
  let onMessage: (event: MessageEvent<CheckAnswer>) => void = () => undefined;
  let onError: (event: ErrorEvent) => void = () => undefined;
  const worker: WorkerLike = {
    postMessage: (question) => void asked.push(question),
    addEventListener: (type: string, listener: never) => {
      if (type === 'message') onMessage = listener;
      else onError = listener;
    },
    terminate: () => undefined,
  };
  const answer = (id: number) =>
    onMessage({ data: { id, ok: true, result: buildCheckResult() } } as MessageEvent<CheckAnswer>);
  return { worker, asked, answer, fail: () => onError({ message: 'broken' } as ErrorEvent) };
}

const question = { plan: buildPlan(), sheet: buildSheet(), asOf: 0 };

function start() {
  const heard: CheckAnswer[] = [];
  const slow = slowWorker();
  return { ...slow, heard, client: createCheckClient(slow.worker, (answer) => heard.push(answer)) };
}

describe('createCheckClient', () => {
  it('hears the answer to its question once', () => {
    const { client, asked, answer, heard } = start();
    client.ask(question);
    answer(asked[0]!.id);
    answer(asked[0]!.id);
    expect(heard).toHaveLength(1);
  });

  it('drops the answer to an older question, whichever comes first', () => {
    const { client, asked, answer, heard } = start();
    client.ask(question);
    client.ask(question);
    answer(asked[0]!.id);
    expect(heard).toEqual([]);
    answer(asked[1]!.id);
    answer(asked[0]!.id);
    expect(heard.map((one) => one.id)).toEqual([asked[1]!.id]);
  });

  it('drops what was under way when the plan became something else', () => {
    const { client, asked, answer, heard } = start();
    client.ask(question);
    client.forget();
    answer(asked[0]!.id);
    expect(heard).toEqual([]);
  });

  it('says so when the worker breaks', () => {
    const { client, fail, heard } = start();
    client.ask(question);
    fail();
    expect(heard).toMatchObject([{ ok: false, message: 'broken' }]);
  });
});
