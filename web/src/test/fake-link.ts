import { ApolloLink } from '@apollo/client';
import { Observable } from 'rxjs';

type Answer = Record<string, unknown>;
type Answers = Record<string, Answer | ((variables: Record<string, unknown>) => Answer)>;

export interface FakeLink extends ApolloLink {
  /** What was asked, in order: operation name, variables, and the token that came along. */
  asked: { operation: string; variables: Record<string, unknown>; token?: string }[];
}

/** Answers operations by name. An answer may be a function of the variables, and may throw `refusal(…)`. */
export function fakeLink(answers: Answers): FakeLink {
  const asked: FakeLink['asked'] = [];
  const link = new ApolloLink((operation) => {
    const name = operation.operationName ?? '';
    const { token } = operation.getContext();
    asked.push({
      operation: name,
      variables: operation.variables,
      token,
    });
    return new Observable((observer) => {
      queueMicrotask(() => {
        observer.next(answerOf(name, answers[name], operation.variables));
        observer.complete();
      });
    });
  });
  return Object.assign(link, { asked });
}

/** The error the API answers with. */
export function refusal(code: string, message: string = code): Error {
  return Object.assign(new Error(message), { extensions: { code, requestId: 'req-1' } });
}

function answerOf(name: string, answer: Answers[string] | undefined, variables: Record<string, unknown>) {
  if (!answer)
    return { errors: [{ message: `No answer for ${name}.`, extensions: { code: 'INTERNAL_SERVER_ERROR' } }] };
  try {
    return { data: typeof answer === 'function' ? answer(variables) : answer };
  } catch (error) {
    const { message, extensions } = error as Error & { extensions?: Record<string, unknown> };
    return { errors: [{ message, extensions }] };
  }
}
