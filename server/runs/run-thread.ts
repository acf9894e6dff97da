import { parentPort } from 'node:worker_threads';
import { makeDocument } from './make-document.ts';
import { makeRecord } from './make-record.ts';
import { makeReport } from './make-report.ts';
import { summariseMember } from './summarise-member.ts';
import type { Order } from './tasks.ts';

/** The other thread: makes one thing after another, in the order of the orders. */

function make(order: Order) {
  switch (order.task) {
    case 'summaries':
      return order.given.members.map((member) => summariseMember(order.given.basis, member));
    case 'record':
      return makeRecord(order.given);
    case 'document':
      return makeDocument(order.given);
    case 'report':
      return makeReport(order.given);
    default:
      return order satisfies never;
  }
}

parentPort?.on('message', async (order: Order) => {
  try {
    parentPort?.postMessage({ made: await make(order) });
  } catch (error) {
    parentPort?.postMessage({ error });
  }
});
