/** The bytes of a typed array as the driver wants them; nothing is copied. */
export function toBytes(values: Float64Array | Float32Array | Uint8Array): Buffer {
  return Buffer.from(values.buffer, values.byteOffset, values.byteLength);
}

/** Float64 values out of a bytea; copied, since the driver's buffers begin anywhere in a shared pool. */
export function toFloat64(bytes: Buffer): Float64Array {
  return new Float64Array(new Uint8Array(bytes).buffer);
}
