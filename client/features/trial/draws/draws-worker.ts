import { serveDraws } from './serve-draws.ts';

serveDraws(self);
