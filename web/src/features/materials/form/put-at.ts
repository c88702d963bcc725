type Node = Record<string, unknown> | unknown[];

const isNode = (value: unknown): value is Node => typeof value === 'object' && value !== null;

/** Sets a value at a place such as `runs/0/mass_kg`, making the objects and lists on the way. */
export function putAt(root: Record<string, unknown>, place: string, value: unknown): void {
  const steps = place.split('/');
  let here: Node = root;
  steps.forEach((step, index) => {
    const next = steps[index + 1];
    if (next === undefined) {
      put(here, step, value);
      return;
    }
    const known = get(here, step);
    const child: Node = isNode(known) ? known : /^\d+$/.test(next) ? [] : {};
    if (child !== known) put(here, step, child);
    here = child;
  });
}

/** The value at a place; undefined where nothing is there. */
export function getAt(root: unknown, place: string): unknown {
  let here: unknown = root;
  for (const step of place.split('/')) {
    if (!isNode(here)) return undefined;
    here = get(here, step);
  }
  return here;
}

function get(node: Node, step: string): unknown {
  return Array.isArray(node) ? node[Number(step)] : node[step];
}

function put(node: Node, step: string, value: unknown): void {
  if (Array.isArray(node)) node[Number(step)] = value;
  else node[step] = value;
}
