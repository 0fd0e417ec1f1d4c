import { uploadLimits } from '@leeside/contracts/files';

interface Sized { size: number }
export interface BatchLimits { fileBytes: number; requestBytes: number; filesPerRequest: number }

/** Files in as few requests as the limits allow, in their order; those too large for any are set apart before a byte is sent. */
export function fileBatches<Item extends Sized>(files: readonly Item[], limits: BatchLimits = uploadLimits): { batches: Item[][]; tooLarge: Item[] } {
  const tooLarge = files.filter((file) => file.size > limits.fileBytes);
  const batches: Item[][] = [];
  let room = 0;
  for (const file of files) {
    if (file.size > limits.fileBytes) continue;
    const current = batches.at(-1);
    if (current && current.length < limits.filesPerRequest && file.size <= room) {
      current.push(file);
      room -= file.size;
    } else {
      batches.push([file]);
      room = limits.requestBytes - file.size;
    }
  }
  return { batches, tooLarge };
}

/** How much of each file has left, told from the bytes of the request: they go one after the other. */
export function sentShares(sizes: readonly number[], sentBytes: number): number[] {
  let before = 0;
  return sizes.map((size) => {
    const share = size === 0 ? (sentBytes >= before ? 1 : 0) : Math.min(1, Math.max(0, (sentBytes - before) / size));
    before += size;
    return share;
  });
}
