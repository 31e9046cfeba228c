// Lets a worker thread read TypeScript: `--import tsx` alone reaches only the main thread.
import { register } from 'tsx/esm/api';

register();
