import { join } from 'node:path';

/** What the bundler tells of the modules. */
interface ModuleGraph {
  getModuleInfo(id: string): {
    readonly importedIds: readonly string[];
    readonly dynamicallyImportedIds: readonly string[];
  } | null;
}

const source = join(import.meta.dirname, 'src');
const page = (name: string): string => join(source, 'pages', `${name}-page.tsx`);

const ENTRY = join(source, 'main.tsx');
const THREAD = join(source, 'book', 'session', 'calculation-worker.ts');

const isPage = (id: string): boolean => /[\\/]pages[\\/][a-z-]+-page\.tsx$/.test(id);

/**
 * Names the file a module travels in that the Book fetches after the plan can be edited: `engine` for what only the
 * calculating thread and the page of all workings run, `book-parts` for what no other page shows. Each part is small;
 * apart they would be dozens of requests that compress badly. Modules that more pages need are left to the bundler, so
 * neither file is ever fetched for a few lines of it.
 */
export function laterChunk(): (id: string, graph: ModuleGraph) => string | null {
  let chunks: ReadonlyMap<string, string> | undefined;
  return (id, graph) => {
    chunks ??= laterChunks(graph);
    return chunks.get(id) ?? null;
  };
}

function laterChunks(graph: ModuleGraph): ReadonlyMap<string, string> {
  const otherPages = pagesOf(graph).filter((id) => id !== page('book'));
  const atFirst = reach(graph, [ENTRY, page('book')], false);
  const calculating = reach(graph, [THREAD], false);
  const onOthers = reach(graph, otherPages, true);
  const beyondWorkings = reach(
    graph,
    otherPages.filter((id) => id !== page('workings')),
    true,
  );
  const chunks = new Map<string, string>();
  for (const id of reach(graph, [page('book'), THREAD], true)) {
    if (atFirst.has(id) || id === THREAD) continue;
    if (calculating.has(id) && !beyondWorkings.has(id)) chunks.set(id, 'engine');
    if (!calculating.has(id) && !onOthers.has(id)) chunks.set(id, 'book-parts');
  }
  return chunks;
}

function pagesOf(graph: ModuleGraph): readonly string[] {
  const entered = [...reach(graph, [ENTRY], false)];
  return entered.flatMap((id) => graph.getModuleInfo(id)?.dynamicallyImportedIds.filter(isPage) ?? []);
}

/** Every module reached from `starts`; `lazily` with what is fetched on the way, save other pages. */
function reach(graph: ModuleGraph, starts: readonly string[], lazily: boolean): ReadonlySet<string> {
  const seen = new Set<string>();
  const visit = (id: string): void => {
    const module = seen.has(id) ? null : graph.getModuleInfo(id);
    if (module === null) return;
    seen.add(id);
    module.importedIds.forEach(visit);
    if (lazily) module.dynamicallyImportedIds.filter((below) => !isPage(below)).forEach(visit);
  };
  starts.forEach(visit);
  return seen;
}
