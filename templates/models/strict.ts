/**
 * A page model in which reading a key that is not there, or a number that is not finite, throws: a template cannot drop a notice
 * or print a gap in silence.
 *
 * @param value  a plain model of objects, lists, text, booleans and numbers
 * @param place  where in the model it stands, for the message
 */
export function strict<T>(value: T, place = "model"): T {
  if (typeof value === "number" && !Number.isFinite(value)) throw new Error(`${place}: a page cannot print ${value}`);
  if (value === undefined || value === null) throw new Error(`${place}: the page model holds no value here`);
  if (typeof value !== "object") return value;
  return new Proxy(value, {
    get: (target, key) => {
      if (typeof key === "symbol") return Reflect.get(target, key);
      if (key in target) {
        const found = Reflect.get(target, key) as unknown;
        return typeof found === "function" ? found : strict(found, `${place}.${key}`);
      }
      throw new Error(`${place}.${key}: the page model has no such key`);
    },
  });
}
