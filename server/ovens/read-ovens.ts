import { join } from 'node:path';
import { checkDiagram } from '../../shared/oven/check-layout.ts';
import { ovenLayout, type OvenLayout } from '../../shared/oven/layout.ts';
import { parseOven } from '../../shared/oven/parse-oven.ts';
import { OvenLibrary, type Oven } from './oven-library.ts';
import { readJsonFolder, type JsonFile, type Mistake, type OnBadFile } from './read-json-folder.ts';

const layoutEnding = '.layout';

function readLayout(content: unknown): { layout: OvenLayout } | { mistakes: Mistake[] } {
  const parsed = ovenLayout.safeParse(content);
  if (parsed.success) return { layout: parsed.data };
  return {
    mistakes: parsed.error.issues.map(({ path, message }) => ({
      path: `layout: ${path.join('.')}`,
      message,
    })),
  };
}

function readOven(
  file: JsonFile,
  layoutFile: JsonFile | undefined,
): Oven | { mistakes: Mistake[] } {
  const parsed = parseOven(file.content);
  const layout = layoutFile
    ? readLayout(layoutFile.content)
    : { mistakes: [{ path: 'layout', message: `${file.name}${layoutEnding}.json is missing` }] };
  const mistakes = [
    ...(parsed.ok ? [] : parsed.problems),
    ...('mistakes' in layout ? layout.mistakes : []),
  ];
  if (parsed.ok && parsed.oven.id !== file.name) {
    mistakes.push({ path: 'id', message: `${parsed.oven.id} must be the name of the file` });
  }
  if (parsed.ok && 'layout' in layout) {
    mistakes.push(
      ...checkDiagram(parsed.oven, layout.layout).map(({ path, message }) => ({
        path: `layout: ${path}`,
        message,
      })),
    );
  }
  if (parsed.ok && 'layout' in layout && mistakes.length === 0) {
    return { definition: parsed.oven, layout: layout.layout };
  }
  return { mistakes };
}

/** Reads `<id>.json` and `<id>.layout.json`. A bad oven is told with every mistake and left out. */
export async function readOvens(folder: string, onBadFile: OnBadFile): Promise<OvenLibrary> {
  const files = await readJsonFolder(folder, onBadFile);
  const layouts = new Map(files.map((file) => [file.name, file]));
  const ovens: Oven[] = [];
  for (const file of files.filter(({ name }) => !name.endsWith(layoutEnding))) {
    const oven = readOven(file, layouts.get(`${file.name}${layoutEnding}`));
    if ('mistakes' in oven) onBadFile(join(folder, `${file.name}.json`), oven.mistakes);
    else ovens.push(oven);
  }
  return new OvenLibrary(ovens);
}
