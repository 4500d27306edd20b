import type { MessagePort } from 'node:worker_threads';
import type { ExchangeReply, SearchMessage } from './run-result.js';
import type { ExchangeAnswer, ExchangeRequest, TaskExchange } from './threads/task-exchange.js';

/** The exchange as the thread of a search reaches it: by messages to its process, which has the database. */
export class PortExchange implements TaskExchange {
  private asked = 0;
  private readonly waiting = new Map<number, (reply: ExchangeReply) => void>();

  constructor(private readonly port: MessagePort) {
    port.on('message', (reply: ExchangeReply) => {
      this.waiting.get(reply.number)?.(reply);
      this.waiting.delete(reply.number);
    });
  }

  async exchange(request: ExchangeRequest): Promise<ExchangeAnswer> {
    const number = ++this.asked;
    const message: SearchMessage = { kind: 'exchange', number, request };
    const reply = await new Promise<ExchangeReply>((resolve) => {
      this.waiting.set(number, resolve);
      this.port.postMessage(message);
    });
    if (!reply.answer) throw new Error('The exchange is out of reach.');
    return reply.answer;
  }
}
