export const hasGlob = (path: string): boolean => /[*?]/u.test(path);

/** `*` and `?` within a name, `**` across folders; everything else stands for itself. */
export function globPattern(glob: string): RegExp {
  const source = glob
    .split('/')
    .map((part) => (part === '**' ? '(?:[^/]+/)*' : `${nameSource(part)}/`))
    .join('');
  return new RegExp(`^${source.replace(/\/$/u, '')}$`.replace('(?:[^/]+/)*$', '(?:.*)$'), 'u');
}

const nameSource = (name: string): string =>
  [...name].map((c) => (c === '*' ? '[^/]*' : c === '?' ? '[^/]' : c.replace(/[.+^${}()|[\]\\]/gu, '\\$&'))).join('');
