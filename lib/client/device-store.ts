import { createStore, del, get, set, type UseStore } from "idb-keyval";

let opened: UseStore | null = null;

function store(): UseStore {
  opened ??= createStore("neaptide", "drafts");
  return opened;
}

const hasIndexedDb = () => typeof indexedDB !== "undefined";

/** Kept in IndexedDB, or in local storage where a browser has none to give. */
export async function readFromDevice(key: string): Promise<unknown> {
  if (hasIndexedDb()) return get(key, store());
  const text = localStorage.getItem(key);
  return text === null ? undefined : (JSON.parse(text) as unknown);
}

export async function keepOnDevice(key: string, value: unknown): Promise<void> {
  if (hasIndexedDb()) return set(key, value, store());
  localStorage.setItem(key, JSON.stringify(value));
}

export async function dropFromDevice(key: string): Promise<void> {
  if (hasIndexedDb()) return del(key, store());
  localStorage.removeItem(key);
}
