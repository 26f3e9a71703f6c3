import 'reflect-metadata';
import { start } from './start';

// The read and write handles and the password hashes each occupy a thread of this pool; files and names need some too.
process.env.UV_THREADPOOL_SIZE ??= '8';

void start();
