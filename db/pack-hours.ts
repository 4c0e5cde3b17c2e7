import type { HourColumns } from '@/lib/simulation/results';
import type { PackedColumn } from './schema';
import { toBytes } from './pack-floats';

/** Lays all hourly columns of a run into one block, each on a boundary of four bytes. */
export function packHours(columns: HourColumns): { layout: PackedColumn[]; bytes: Buffer } {
  const layout: PackedColumn[] = [];
  let end = 0;
  const entries = Object.entries(columns) as [string, Float32Array | Uint8Array][];
  for (const [name, column] of entries) {
    const type = column instanceof Float32Array ? 'float32' : 'uint8';
    layout.push({ name, type, byteOffset: end, length: column.length });
    end += Math.ceil(column.byteLength / 4) * 4;
  }
  const bytes = Buffer.alloc(end);
  entries.forEach(([, column], i) => toBytes(column).copy(bytes, layout[i]!.byteOffset));
  return { layout, bytes };
}

/** Takes the columns out again; the block is copied once, so that each column stands on its boundary. */
export function unpackHours(layout: readonly PackedColumn[], bytes: Buffer): HourColumns {
  const block = new Uint8Array(bytes).buffer;
  const columns = layout.map(({ name, type, byteOffset, length }) => {
    const Column = type === 'float32' ? Float32Array : Uint8Array;
    return [name, new Column(block, byteOffset, length)] as const;
  });
  return Object.fromEntries(columns) as unknown as HourColumns;
}
