import { config } from 'zod';

// zod compiles its checks with `new Function` where it may; the content policy forbids even trying.
// So it is told before any schema is made: the application comes after it.
config({ jitless: true });
void import('./app/start.tsx');
