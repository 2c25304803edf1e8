/** One entry as it is committed at the office. */
export interface Row {
  position: number;
  device: string;
  seq: number;
  text: string;
  hash: string;
  held: string | null;
}

/** What survives a killed server, and what a backup of it holds. */
export interface OfficeDisk {
  epoch: string;
  rows: Row[];
  chains: Map<string, { seq: number; hash: string }>;
  complete: Map<string, Uint8Array>;
}

export function emptyOffice(): OfficeDisk {
  return { epoch: 'epoch-1', rows: [], chains: new Map(), complete: new Map() };
}

export function copyOf(disk: OfficeDisk): OfficeDisk {
  return {
    epoch: disk.epoch,
    rows: [...disk.rows],
    chains: new Map(disk.chains),
    complete: new Map(disk.complete),
  };
}
