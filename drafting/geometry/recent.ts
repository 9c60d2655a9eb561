/**
 * A small memory of the values last derived from immutable objects, found by identity. A draft asks for the same few paths
 * again and again and then never more: a short ring is several times cheaper than a WeakMap, above all for the garbage
 * collector.
 */
export const recent = <Key extends object, Value>(
  derive: (key: Key) => Value,
  size = 16,
): ((key: Key) => Value) => {
  const keys: (Key | undefined)[] = new Array<Key | undefined>(size).fill(undefined)
  const values: (Value | undefined)[] = new Array<Value | undefined>(size).fill(undefined)
  let next = 0
  return (key) => {
    for (let i = 0; i < size; i++) if (keys[i] === key) return values[i] as Value
    const value = derive(key)
    keys[next] = key
    values[next] = value
    next = (next + 1) % size
    return value
  }
}
