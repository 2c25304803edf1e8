import { database, type PhoneDatabase } from '../database/database';

const megabyte = 1024 * 1024;
const ballastMegabytes = 20;

/**
 * Room kept for text. It is laid in after the first save and given up at the first quota error, so that entries still
 * fit when photographs have filled the phone. Random bytes: constant fill is compressed and would reserve nothing.
 */
export async function layBallast(db: PhoneDatabase = database()): Promise<void> {
  for (let n = await db.ballast.count(); n < ballastMegabytes; n += 1) {
    await db.ballast.put({ n, bytes: randomMegabyte() });
  }
}

/** Gives the room up; false when there was none left. */
export async function dropBallast(db: PhoneDatabase = database()): Promise<boolean> {
  const count = await db.ballast.count();
  await db.ballast.clear();
  return count > 0;
}

function randomMegabyte(): ArrayBuffer {
  const bytes = new Uint8Array(megabyte);
  for (let at = 0; at < megabyte; at += 65_536) crypto.getRandomValues(bytes.subarray(at, at + 65_536));
  return bytes.buffer;
}
