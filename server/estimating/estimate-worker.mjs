// A worker thread starts without the loader that the program was started with.
import { register } from 'tsx/esm/api';

register();
await import('./estimate-job.ts');
