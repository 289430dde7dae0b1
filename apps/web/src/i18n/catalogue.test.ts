import { catalogue } from './catalogue';

type Tree = { [key: string]: string | Tree };

function leaves(tree: Tree, path: string): [string, string][] {
  return Object.entries(tree).flatMap(([key, value]) =>
    typeof value === 'string'
      ? [[`${path}.${key}`, value] as [string, string]]
      : leaves(value, `${path}.${key}`),
  );
}

const all = Object.entries(catalogue).flatMap(([name, tree]) => leaves(tree, name));

describe('the catalogue', () => {
  it('has no placeholder that is cut short', () => {
    const wrong = all.filter(([, words]) => words.split('{{').length !== words.split('}}').length);
    expect(wrong).toEqual([]);
  });

  it('has both forms wherever it counts', () => {
    const keys = new Set(all.map(([key]) => key));
    const alone = [...keys].filter(
      (key) =>
        (key.endsWith('_one') && !keys.has(key.replace(/_one$/, '_other'))) ||
        (key.endsWith('_other') && !keys.has(key.replace(/_other$/, '_one'))),
    );
    expect(alone).toEqual([]);
  });
});
