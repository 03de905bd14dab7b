import { describe, expect, test } from 'vitest';
import { InputError } from '../../pipeline/base/input-error.ts';
import { formatMessage } from '../../pipeline/base/message.ts';
import { parseStudy } from '../../pipeline/study/parse-study.ts';

/** The example of the study format, every key of it. */
const whole = `pilotlaw: 1
title: Pellets dissolving in the 60 L vessel
transfer: mass
equipment: suspended-solids
trials:
  file: trials.csv
  sheet: Trials
  trial: run
  campaign: week
  readings: average
  setting: point
  order: started
  missing: ["NA", "-9999"]
  leave_out: [{trial: 007, reason: baffle came loose}]
quantities:
  rotation_speed: {column: N, unit: rpm, random: 0.5 %, systematic: 1 %}
  impeller_diameter: {value: 120 mm, systematic: 0.5 mm}
  temperature: {column: "T [degC]", random: 0.1 K, systematic: 0.3 K, instrument: TT-1}
  flow: {column: F, accuracy: 1 % of 50 L/min, per: campaign, kind: set}
  length: {value: 0.40, unit: m, expanded: 0.2 mm, k: 2}
  density: 997 kg/m^3
  power_number: 5
  tip_speed: {formula: pi * rotation_speed * impeller_diameter}
fluid: {name: water, temperature: temperature}
coefficient: {route: pellet-dissolution, balance: 25 %, series: {file: log.csv, trial: run, time: t, value: c, window: [0 s, 120 s]}}
groups:
  Re: impeller
  Sh: {basis: impeller, at: film}
  X: {column: Re, random: 3 %}
laws:
  - Sh = C * Re^a * Sc^(1/3)
  - {name: offset, form: "Sh = 2 + C * Re^a * Sc^(1/3)", start: {a: 0.5}, bounds: {a: [0, 1], C: [0, .inf]}, in: {velocity: ft/s}, parameters: [C, a]}
fit: {error: relative, weights: uncertainty, scatter: estimate, campaign_effect: auto, confidence: 95 %, resamples: 200, monte_carlo: True}
audit: {against: [a-1990, b-2001], analogy: false, tolerance: 20 %, own: our-correlations.yaml}
plant: {file: plant.csv, case: name, conservative: high, target: {heat_rate: 250 kW, find: area}, quantities: {rotation_speed: 400 to 600 rpm}, fluid: water}
rig: {rotation_speed: [100 rpm, 600 rpm], temperature: {levels: [15 degC, 40 degC], cost: 3}, campaigns: either}
output: {folder: out, assets: shared}
`;

const least = `pilotlaw: 1
title: T
transfer: heat
trials: trials.csv
laws: [Nu = C * Re^a]
`;

/** The messages of a study that must be refused. */
function told(text: string): readonly string[] {
  try {
    parseStudy(text, 'study.yaml');
  } catch (error) {
    expect(error).toBeInstanceOf(InputError);
    expect((error as InputError).exit).toBe(2);
    return (error as InputError).messages.map(formatMessage);
  }
  throw new Error('was accepted');
}

describe('a whole study', () => {
  const study = parseStudy(whole, 'study.yaml');

  test('keeps every value as written, with its place', () => {
    expect(study.quantities.rotation_speed!.is.unit).toEqual({
      is: 'rpm',
      place: { file: 'study.yaml', line: 16, column: 37, key: 'quantities.rotation_speed.unit' },
    });
    expect(study.quantities.length!.is.value!.is).toBe('0.40');
    expect(study.quantities.power_number!.is.value!.is).toBe('5');
    expect(study.quantities.density!.is).toEqual({
      value: { is: '997 kg/m^3', place: { file: 'study.yaml', line: 21, column: 12, key: 'quantities.density' } },
    });
    expect(study.trials.leaveOut[0]!.trial.is).toBe('007');
    expect(study.trials.missing).toEqual(['NA', '-9999']);
  });

  test('names bare laws after their place and keeps start, bounds, units', () => {
    expect(study.laws.map(({ name }) => name.is)).toEqual(['law 1', 'offset']);
    expect(study.laws[1]!.bounds).toMatchObject({ a: { is: [0, 1] }, C: { is: [0, Number.POSITIVE_INFINITY] } });
    expect(study.laws[1]!.in.velocity!.is).toBe('ft/s');
  });

  test('reads shares, truth values and lists where both spellings are natural', () => {
    expect(study.fit).toMatchObject({ confidence: 0.95, resamples: 200, monteCarlo: true });
    expect(study.audit).toMatchObject({ against: { is: ['a-1990', 'b-2001'] }, tolerance: 0.2, analogy: false });
    expect(study.groups).toMatchObject({ Re: { is: { basis: { is: 'impeller' } } }, Sh: { is: { at: { is: 'film' } } } });
    expect(study.rig).toMatchObject({
      campaigns: 'either',
      settings: { rotation_speed: { from: { is: '100 rpm' }, cost: 1 }, temperature: { cost: 3 } },
    });
    expect(study.coefficient).toMatchObject({
      route: { is: 'pellet-dissolution' },
      settings: { balance: { is: '25 %' } },
      series: { time: { is: 't' }, window: [{ is: '0 s' }, { is: '120 s' }] },
    });
    expect(study.plant).toMatchObject({ conservative: 'high', fluid: { own: { is: { name: { is: 'water' } } } } });
  });
});

test('the least study takes the defaults of the format', () => {
  const study = parseStudy(least, 'study.yaml');
  expect(study.trials.file.is).toBe('trials.csv');
  expect(study.equipment.is).toBe('other');
  expect(study.fit).toMatchObject({
    error: 'relative',
    weights: { is: 'uncertainty' },
    scatter: 'estimate',
    campaignEffect: 'auto',
    confidence: 0.95,
    resamples: 2000,
  });
  expect(study.audit).toMatchObject({ against: { is: 'applicable' }, analogy: true, tolerance: 0.2 });
  expect(study.output).toMatchObject({ folder: { is: 'results' }, assets: 'inline' });
  expect(study.invented).toBe(false);
  expect(parseStudy(`${least}audit: none\n`, 's').audit).toBeUndefined();
});

test('two streams, by name or by map', () => {
  const { fluid } = parseStudy(`${least}fluid: {own: water, other: {name: steam, temperature: T_s}}\n`, 's');
  expect(fluid).toMatchObject({ own: { is: { name: { is: 'water' } } }, other: { is: { at: { temperature: { is: 'T_s' } } } } });
});

test('aliases are written out', () => {
  const study = parseStudy(`${least}quantities: {a: &u {value: 3 mm, systematic: 1 %}, b: *u}\n`, 's');
  expect(study.quantities.b!.is.value!.is).toBe('3 mm');
});

describe('every fault at its place, with what was read and what would be right', () => {
  test.each([
    ['an unknown key', `${least}quantitys: {}\n`, 'study.yaml:6:1  quantitys: unknown key "quantitys"; did you mean "quantities"?'],
    [
      'an unknown inner key',
      `${least}quantities: {d: {vlaue: 3 mm}}\n`,
      'study.yaml:6:18  quantities.d.vlaue: unknown key "vlaue"; did you mean "value"?',
    ],
    ['a missing key', least.replace('title: T\n', ''), 'study.yaml:1:1  title: is missing; give a title for the study'],
    [
      'a missing inner key',
      least.replace('trials: trials.csv', 'trials: {trial: run}'),
      'study.yaml:4:9  trials.file: is missing; give the table of trials, such as trials.csv',
    ],
    [
      'a word that is none of the known',
      least.replace('heat', 'haet'),
      'study.yaml:3:11  transfer: "haet" is not one of heat, mass; did you mean "heat"?',
    ],
    ['equipment that is not known', `${least}equipment: tubes\n`, /"tubes" is not one of tube, .*did you mean "tube"\?$/],
    [
      'another format',
      least.replace('pilotlaw: 1', 'pilotlaw: 2'),
      'study.yaml:1:11  pilotlaw: "2" is not a format of study files that this version reads; it reads 1',
    ],
    ['an empty value', `${least}fluid:\n`, /^study.yaml:6:\d+ {2}fluid: is empty; give the name of a fluid/],
    ['a key twice', `${least}title: again\n`, 'study.yaml:6:1  title: "title" stands here for the second time; a key may be given once'],
    ['a tab', `${least}fit:\n\terror: relative\n`, /^study.yaml:7:1: this line is indented by a tab/],
    ['an open bracket', `${least}fit: {error: relative\n`, /^study.yaml:\d+:\d+: not YAML: /],
    [
      'an unknown alias',
      `${least}fluid: *w\n`,
      'study.yaml:6:8  fluid: nothing above is named &w, so *w means nothing; a text that starts with * goes in quotes',
    ],
    ['an alias of itself', `${least}quantities: &q {a: *q}\n`, /stands inside what it refers to/],
    ['a tag', `${least}fluid: !!js/function x\n`, /^study.yaml:6:8: .*a study file needs no tags/],
    ['a second document', `${least}---\na: 1\n`, /^study.yaml:\d:\d: a second document starts here/],
    ['nothing', '', /nothing in it/],
    ['only a comment', '# hello\n', /nothing in it/],
    ['a list', '- a\n', /a list is not a map of keys/],
    [
      'value and column',
      `${least}quantities: {d: {value: 3 mm, column: d}}\n`,
      'study.yaml:6:17  quantities.d: column and value contradict each other; give one of column, value, formula',
    ],
    ['no origin', `${least}quantities: {d: {unit: mm}}\n`, 'study.yaml:6:17  quantities.d: give one of column, value, formula'],
    [
      'two systematic statements',
      `${least}quantities: {d: {value: 3 mm, systematic: 1 %, accuracy: 0.1 mm}}\n`,
      /systematic and accuracy contradict each other/,
    ],
    [
      'an expanded uncertainty without k',
      `${least}quantities: {d: {value: 3 mm, expanded: 0.1 mm}}\n`,
      /expanded says nothing without its coverage factor k/,
    ],
    [
      'a start outside its bounds',
      least.replace('[Nu = C * Re^a]', '[{form: Nu = C * Re^a, start: {a: 2}, bounds: {a: [0, 1]}}]'),
      'study.yaml:5:41  laws[1].start.a: a starts at 2, outside its bounds 0 to 1',
    ],
    ['reversed bounds', least.replace('[Nu = C * Re^a]', '[{form: Nu = C * Re^a, bounds: {a: [1, 0]}}]'), /1 to 0 is no interval/],
    [
      'a law name twice',
      least.replace('[Nu = C * Re^a]', '[{name: p, form: Nu = C * Re^a}, {name: p, form: Nu = C}]'),
      /a second law named "p"/,
    ],
    ['no law', least.replace('[Nu = C * Re^a]', '[]'), /a list is not a list of laws, such as/],
    [
      'a way out of the folder',
      least.replace('trials.csv', '../x/trials.csv'),
      'study.yaml:4:9  trials: "../x/trials.csv" leads out of the study\'s folder; give a path inside it, such as data/trials.csv',
    ],
    ['an absolute path', `${least}plant: /etc/passwd\n`, /leads out of/],
    ['a drive', `${least}audit: {own: 'C:\\x.yaml'}\n`, /leads out of/],
    ['a way up inside', `${least}output: a/../../b\n`, /leads out of/],
    ['a truth value where a text is wanted', `${least}fluid: true\n`, /true \(a truth value; in quotes it is a text\) is not/],
    ['a share out of range', `${least}fit: {confidence: 95}\n`, /"95" is not a confidence from 0.5 to 0.9999/],
    ['a number with a letter', `${least}fit: {resamples: 2000x}\n`, /"2000x" is not a whole number of resamples/],
    ['an infinite number', `${least}fit: {resamples: 1e999}\n`, /"1e999" is not a whole number of resamples/],
    ['too many resamples', `${least}fit: {resamples: 1000000}\n`, /from 0 to 100000/],
    [
      'a reason that is missing',
      least.replace('trials: trials.csv', 'trials: {file: t.csv, leave_out: [{trial: R1}]}'),
      /trials.leave_out\[1\].reason: is missing; give the reason/,
    ],
    ['a name that is none', `${least}quantities: {"2d": 3 mm}\n`, /quantities.2d: "2d" is not a name/],
    ['a name that is dangerous', `${least}quantities: {__proto__: 3 mm}\n`, /"__proto__" cannot be used as a name/],
    ['a map as a key', `${least}? {a: 1}\n: 2\n`, /a key must be a plain word/],
    ['a control character', `${least}equipment: "a\\0b"\n`, /control character/],
    [
      'an unknown key beside a right one',
      `${least}fluid: {name: water, temprature: T}\n`,
      /unknown key "temprature"; did you mean "temperature"\?/,
    ],
    ['a misspelt second stream', `${least}fluid: {own: water, othr: steam}\n`, /unknown key "othr"; did you mean "other"\?/],
    ['name and table', `${least}fluid: {name: water, table: t.csv, by: [temperature]}\n`, /name and table contradict each other/],
    ['a plant without cases', `${least}plant: {conservative: low}\n`, /plant needs a file with cases, or quantities/],
    ['one end of a range', `${least}rig: {rotation_speed: [100 rpm]}\n`, /a list is not a range such as/],
  ])('%s', (_, text, expected) => {
    const messages = told(text);
    expect(messages).toHaveLength(1);
    if (typeof expected === 'string') expect(messages[0]).toBe(expected);
    else expect(messages[0]).toMatch(expected);
  });

  test('all together, in the order of the file', () => {
    const messages = told(
      `pilotlaw: 1\ntransfer: haet\ntrials: {file: ../t.csv}\nlaws: [{form: Nu = C, bounds: {C: [2, 1]}}]\nquantities: {d: {value: 1 m, column: d}, e: {colum: 3}}\ntitel: x\n`,
    );
    expect(messages.map((text) => /^study.yaml:(\d+)/.exec(text)![1])).toEqual(['1', '2', '3', '4', '5', '5', '6']);
  });

  test('a great many faults are counted', () => {
    const keys = Array.from({ length: 300 }, (_, k) => `x${k}: 1`).join('\n');
    const messages = told(`${least}${keys}\n`);
    expect(messages).toHaveLength(51);
    expect(messages[50]).toBe('study.yaml: and 250 more faults');
  });
});
