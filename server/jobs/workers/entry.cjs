// Worker threads do not inherit the TypeScript loader of the process in a way that holds on every Node 20: it is
// registered here, before the tasks are read.
require('tsx/cjs');
module.exports = require('./tasks.ts');
