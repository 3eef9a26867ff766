/** The planning thread as a thread of Node, for the bench. */
import { parentPort } from 'node:worker_threads';
import { loadHighs } from '../../src/numeric/linearProgram/highsSolver.ts';
import { PlanServer } from '../../src/worker/planServer.ts';

const port = parentPort!;
const server = new PlanServer(loadHighs(), (reply) => port.postMessage(reply));
port.on('message', (message) => server.handle(message));
