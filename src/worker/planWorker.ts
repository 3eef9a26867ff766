/** The planning thread: HiGHS is loaded here, and here alone in the page. */
import { loadHighs } from '../numeric/linearProgram/highsSolver.ts';
import type { Request, Withdrawal } from './messages.ts';
import { PlanServer } from './planServer.ts';

const server = new PlanServer(loadHighs(), (reply) => self.postMessage(reply));

self.addEventListener('message', ({ data }: MessageEvent<Request | Withdrawal>) => server.handle(data));
