// A thread starts with plain Node.js: it learns TypeScript here, whichever runner its process was started by.
require('tsx/cjs/api').register();
require('./run-nest.ts');
