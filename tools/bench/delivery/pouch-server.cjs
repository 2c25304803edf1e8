// One office for the comparison: express-pouchdb on LevelDB, in a process of its own like our API.
const express = require('express-pouchdb/node_modules/express');
const PouchDB = require('pouchdb');

const folder = process.argv[2];
const app = express();
const Office = PouchDB.defaults({ prefix: `${folder}/` });
app.use(
  require('express-pouchdb')(Office, {
    mode: 'minimumForPouchDB',
    inMemoryConfig: true,
    logPath: `${folder}/log.txt`,
  }),
);
const server = app.listen(0, '127.0.0.1', () => process.send({ port: server.address().port }));
