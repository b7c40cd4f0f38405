import { type ClientFiles, resolveClientFile } from '../../../server/http/client-files';

const clientOf = (...files: string[]): ClientFiles => ({ root: '/client', files: new Set(files), scriptHashes: [] });

describe('a client exported page by page', () => {
  const client = clientOf('index.html', '+not-found.html', 'parts.html', 'scenarios/index.html', 'scenarios/[scenarioId]/index.html', 'scenarios/[scenarioId]/curves.html', 'review/[token].html', '[team]/new.html', 'scenarios/new.html', 'assets/icon.png');

  test.each([
    ['/', 'index.html'],
    ['/parts', 'parts.html'],
    ['/scenarios', 'scenarios/index.html'],
    ['/scenarios/42', 'scenarios/[scenarioId]/index.html'],
    ['/scenarios/42/curves', 'scenarios/[scenarioId]/curves.html'],
    ['/review/abc', 'review/[token].html'],
    ['/scenarios/new', 'scenarios/new.html'],
    ['/others/new', '[team]/new.html'],
    ['/assets/icon.png', 'assets/icon.png'],
  ])('answers %s with %s', (address, file) => {
    expect(resolveClientFile(client, address)).toEqual({ file, status: 200 });
  });

  test.each(['/nowhere', '/scenarios/42/curves/more', '/assets/gone.png'])('says that there is no %s', (address) => {
    expect(resolveClientFile(client, address)).toEqual({ file: '+not-found.html', status: 404 });
  });
});

describe('a client exported as one page', () => {
  const client = clientOf('index.html', '_expo/static/js/entry.js');

  test('answers every address with it', () => {
    expect(resolveClientFile(client, '/scenarios/42')).toEqual({ file: 'index.html', status: 200 });
  });

  test('but not a file that is not there', () => {
    expect(resolveClientFile(client, '/_expo/static/js/old.js')).toBeNull();
  });
});
