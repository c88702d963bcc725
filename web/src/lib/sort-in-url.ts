interface SortInUrl {
  readonly key: string;
  readonly direction: 'ascending' | 'descending';
}

/** The sort a table's address asks for: `?sort=rooms` upwards, `?sort=-rooms` downwards; null: as it comes. */
export function readSort(url: URLSearchParams): SortInUrl | null {
  const text = url.get('sort');
  if (text === null || text === '' || text === '-') return null;
  return text.startsWith('-') ? { key: text.slice(1), direction: 'descending' } : { key: text, direction: 'ascending' };
}

export function writeSort(url: URLSearchParams, sort: SortInUrl): void {
  url.set('sort', sort.direction === 'descending' ? `-${sort.key}` : sort.key);
}
