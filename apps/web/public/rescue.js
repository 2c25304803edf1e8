// Exports the phone's database without the app: no framework, no schema knowledge beyond the tables it reads. The file
// that it writes is the app's own export bundle (src/phone/export/FORMAT.md).
'use strict';

const say = (text) => {
  document.getElementById('state').textContent = text;
};

/** Opens the database as it is. One that does not exist is not made. */
function openRaw() {
  return new Promise((resolve, reject) => {
    const request = indexedDB.open('rimeward');
    request.onupgradeneeded = () => request.transaction.abort();
    request.onsuccess = () => resolve(request.result);
    request.onerror = () => reject(request.error);
    request.onblocked = () => reject(new Error('blocked'));
  });
}

function each(db, table, range, visit) {
  return new Promise((resolve, reject) => {
    if (!db.objectStoreNames.contains(table)) return resolve();
    const request = db.transaction(table).objectStore(table).openCursor(range);
    request.onerror = () => reject(request.error);
    request.onsuccess = () => {
      const cursor = request.result;
      if (!cursor) return resolve();
      visit(cursor.value);
      cursor.continue();
    };
  });
}

const section = (header, content) => new Blob([JSON.stringify(header) + '\n', content, '\n']);

async function bundle(db) {
  const encoder = new TextEncoder();
  const devices = [];
  const faults = [];
  const entries = [];
  const photos = [];
  const attempt = async (what, work) => {
    try {
      await work();
    } catch (error) {
      faults.push(what + ': ' + (error && error.name ? error.name : String(error)));
    }
  };
  await attempt('devices', () => each(db, 'devices', null, (row) => devices.push(row.deviceId)));
  await attempt('entries', () =>
    each(db, 'entries', null, ({ device, seq, hash, text }) => {
      const content = encoder.encode(text);
      entries.push(section({ kind: 'entry', device, seq, hash, bytes: content.length }, content));
    }),
  );
  const rows = [];
  await attempt('photos', () => each(db, 'photos', null, (row) => rows.push(row)));
  for (const { device, sha256, type, state } of rows) {
    if (state === 'complete') continue;
    await attempt('photo ' + sha256, async () => {
      const chunks = [];
      const range = IDBKeyRange.bound([sha256, 0], [sha256, Infinity]);
      await each(db, 'chunks', range, (chunk) => chunks.push(chunk.bytes));
      const content = new Blob(chunks);
      if (content.size > 0)
        photos.push(section({ kind: 'photo', device, sha256, type, bytes: content.size }, content));
    });
  }
  const manifest = encoder.encode(
    JSON.stringify({ devices, appVersion: 'rescue', madeAt: new Date().toISOString(), faults }),
  );
  const head = section({ kind: 'manifest', bytes: manifest.length }, manifest);
  return {
    file: new Blob(['RIMEWARD-BUNDLE 1\n', head, ...entries, ...photos], {
      type: 'application/octet-stream',
    }),
    counts: { entries: entries.length, photos: photos.length, faults: faults.length },
  };
}

async function save() {
  const button = document.getElementById('save');
  button.disabled = true;
  say('Reading … / Leyendo …');
  try {
    const db = await openRaw();
    const { file, counts } = await bundle(db);
    db.close();
    const link = document.createElement('a');
    link.href = URL.createObjectURL(file);
    link.download = 'rimeward-rescue-' + new Date().toISOString().slice(0, 10) + '.bundle';
    link.click();
    const unread =
      counts.faults > 0
        ? ' Could not be read: ' + counts.faults + '. / No se pudo leer: ' + counts.faults + '.'
        : '';
    say(
      'Saved: ' +
        counts.entries +
        ' entries, ' +
        counts.photos +
        ' photographs. / Guardado: ' +
        counts.entries +
        ' anotaciones, ' +
        counts.photos +
        ' fotografías.' +
        unread,
    );
  } catch (error) {
    const name = error && error.name ? error.name : String(error);
    say(
      'The storage could not be read (' +
        name +
        '). Close all other tabs of the app and try again. / ' +
        'No se pudo leer el almacenamiento (' +
        name +
        '). Cierre las demás pestañas de la aplicación e inténtelo de nuevo.',
    );
  }
  button.disabled = false;
}

document.getElementById('save').addEventListener('click', () => void save());
