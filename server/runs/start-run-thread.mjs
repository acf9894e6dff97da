// A worker thread takes no loader over from its process: it is given tsx here.
import { register } from 'tsx/esm/api';

register();
await import('./run-thread.ts');
