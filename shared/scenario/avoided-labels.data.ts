import type { ScenarioFamily } from './scenario-types';

/**
 * Letter and number of residues known from the literature (numbers recalled from it, as in the test fixture `landmarks.json`). No invented protein may carry one of them in its
 * own family, so that nobody can take the demo for a real organism.
 */
const known: Record<ScenarioFamily, string> = {
  c: 'D61 E54 E56 E58 E59 E61 E62 E63 E65 E67 E79 E137 E139 E145 E188',
  a:
    'R159 R169 R176 R186 R188 R189 R210 R226 R227 R239 R563 R735 S206 N214 G218 E145 E162 E196 E203 E219 E223 ' +
    'H168 H185 H245 Q210 Q230 Q252',
  β:
    'K155 K156 K162 K164 K212 T156 T163 T165 E181 E182 E185 E186 E188 E190 E192 E238 R182 R183 R189 R191 R246 R247 R260 ' +
    'D242 D243 D252 D256 D380 D390 D394 Y297 Y311 Y331 Y332 Y341 Y345',
  γ: 'C87 M23 S107 S193',
};

const sets = new Map(Object.entries(known).map(([family, labels]) => [family, new Set(labels.split(' '))]));

/** Whether a letter with a number would name a residue known from a real organism. */
export function isKnownLabel(family: ScenarioFamily, letter: string, number: number): boolean {
  return sets.get(family)?.has(`${letter}${number}`) ?? false;
}
