import { workerData } from 'node:worker_threads';
import { register } from 'tsx/esm/api';

/* A thread of the server starts here: Node's own flag for loaders does not reach threads, so the loader is set up first. */

register();
await import(workerData.script);
