import { createHash } from 'node:crypto';
import { deflateRawSync, inflateRawSync } from 'node:zlib';
import type { ProofTask, ProofTaskResult } from '@metewand/frontier';

/** A task by its id and by what is in it: a search begun again by a newer version may mean another task by an id. */
export interface TaskName {
  readonly id: string;
  /** SHA-256 of the task's JSON, in hex. */
  readonly digest: string;
}

export interface PackedTask extends TaskName {
  readonly task: Uint8Array;
}

export interface PackedResult extends TaskName {
  readonly result: Uint8Array;
}

export function packTask(task: ProofTask): PackedTask {
  const json = toJson(task);
  const digest = createHash('sha256').update(json).digest('hex');
  return { id: task.id, digest, task: deflateRawSync(json, { level: 1 }) };
}

export function unpackTask(packed: Uint8Array): ProofTask {
  return fromJson(packed) as ProofTask;
}

export function packResult(name: TaskName, result: ProofTaskResult): PackedResult {
  return { id: name.id, digest: name.digest, result: deflateRawSync(toJson(result), { level: 1 }) };
}

export function unpackResult(packed: Uint8Array): ProofTaskResult {
  return fromJson(packed) as ProofTaskResult;
}

/** JSON, in which lists of whole numbers stand as { "int32": […] }. */
function toJson(value: ProofTask | ProofTaskResult): string {
  return JSON.stringify(value, (_key, each: unknown) =>
    each instanceof Int32Array ? { int32: Array.from(each) } : each,
  );
}

function fromJson(packed: Uint8Array): unknown {
  return JSON.parse(inflateRawSync(packed).toString(), (_key, each: unknown) =>
    isInt32(each) ? Int32Array.from(each.int32) : each,
  );
}

function isInt32(value: unknown): value is { int32: number[] } {
  return typeof value === 'object' && value !== null && 'int32' in value && Array.isArray(value.int32);
}
