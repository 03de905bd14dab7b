import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { makePlan } from '../../pipeline/plan/make-plan.ts';
import { beginStudy } from '../../pipeline/study/begin.ts';
import { parseStudy } from '../../pipeline/study/parse-study.ts';
import { guessColumns } from '../../pipeline/trials/guess-columns.ts';
import { readTable } from '../../pipeline/trials/read-table.ts';

const tableOf = (text: string) => readTable(Buffer.from(text), { file: 'trials.csv' });
const begun = (text: string) => beginStudy(guessColumns(tableOf(text)));
/** Header -> `key` where it is used, `key?` where it is asked, or what else it is. */
const guesses = (header: string, row = header.split(';').map(() => '1')): readonly string[] =>
  guessColumns(tableOf(`${header}\n${row.join(';')}\n${row.join(';')}\n`)).columns.map(({ is, key, question }) =>
    key === undefined ? is : question === undefined ? key : `${key}?`,
  );

/** Headers as rigs write them (common practice, no source). */
const known: readonly (readonly [header: string, key: string])[] = [
  ['N [rpm]', 'rotation_speed'],
  ['Drehzahl (1/min)', 'rotation_speed'],
  ['Rührerdrehzahl [U/min]', 'rotation_speed'],
  ['stirrer speed [rpm]', 'rotation_speed'],
  ['T [°C]', 'temperature'],
  ['Temperatur [°C]', 'temperature'],
  ['T_bulk [degC]', 'temperature'],
  ['T_in [degC]', 'inlet_temperature'],
  ['Zulauftemperatur [°C]', 'inlet_temperature'],
  ['T Vorlauf [°C]', 'inlet_temperature'],
  ['T_out (C)', 'outlet_temperature'],
  ['Temp. Ablauf [°C]', 'outlet_temperature'],
  ['T_w [°C]', 'wall_temperature'],
  ['T_wall [K]', 'wall_temperature'],
  ['"Wandtemperatur, °C"', 'wall_temperature'],
  ['T_amb [°C]', 'ambient_temperature'],
  ['Raumtemperatur [°C]', 'ambient_temperature'],
  ['T0 [°C]', 'initial_temperature'],
  ['T_end [°C]', 'final_temperature'],
  ['jacket T in [°C]', 'inlet_temperature_other'],
  ['Kühlwasser T aus [°C]', 'outlet_temperature_other'],
  ['T_cold_out [°C]', 'outlet_temperature_other'],
  ['Flow (L/min)', 'volume_flow'],
  ['Volumenstrom [m³/h]', 'volume_flow'],
  ['V̇ / L min⁻¹', 'volume_flow'],
  ['Durchfluss [l/h]', 'volume_flow'],
  ['ṁ / kg h⁻¹', 'mass_flow'],
  ['Massenstrom [kg/h]', 'mass_flow'],
  ['p bar(g)', 'pressure'],
  ['Druck [mbar]', 'pressure'],
  ['p_amb [hPa]', 'ambient_pressure'],
  ['v m/s', 'velocity'],
  ['Geschwindigkeit [m/s]', 'velocity'],
  ['d [mm]', 'diameter'],
  ['bore (mm)', 'diameter'],
  ['d_p [mm]', 'particle_diameter'],
  ['pellet diameter [mm]', 'particle_diameter'],
  ['D_imp [mm]', 'impeller_diameter'],
  ['Behälterdurchmesser [mm]', 'vessel_diameter'],
  ['L [m]', 'length'],
  ['Länge [mm]', 'length'],
  ['level [mm]', 'depth'],
  ['Wanddicke [mm]', 'wall_thickness'],
  ['A [m2]', 'area'],
  ['V [L]', 'liquid_volume'],
  ['P [W]', 'power'],
  ['Leistung [kW]', 'power'],
  ['Q [W]', 'heat_rate'],
  ['heat duty [kW]', 'heat_rate'],
  ['t [min]', 'time'],
  ['Zeit (s)', 'time'],
  ['m0 [g]', 'initial_mass'],
  ['loss [g]', 'mass_loss'],
  ['c_s [g/L]', 'saturation_concentration'],
  ['Sättigung [g/L]', 'saturation_concentration'],
  ['c_in [mol/m³]', 'inlet_concentration'],
  ['c [mg/L]', 'bulk_concentration'],
  ['rho [kg/m3]', 'density'],
  ['Dichte [kg/m³]', 'density'],
  ['η [mPa s]', 'viscosity'],
  ['mu [cP]', 'viscosity'],
  ['ν [mm²/s]', 'kinematic_viscosity'],
  ['D [10⁻⁹ m²/s]', 'diffusivity'],
  ['λ [W/(m K)]', 'thermal_conductivity'],
  ['cp [J/(kg K)]', 'heat_capacity'],
  ['alpha [W/(m² K)]', 'heat_transfer_coefficient'],
  ['h / W/(m² K)', 'heat_transfer_coefficient'],
  ['U [W/m2 K]', 'overall_coefficient'],
  ['kLa [1/s]', 'volumetric_coefficient'],
  ['kLa [1/h]', 'volumetric_coefficient'],
  ['k [m/s]', 'mass_transfer_coefficient'],
  ['I_lim [mA]', 'limiting_current'],
  ['eps', 'voidage'],
  ['rF [%]', 'relative_humidity'],
  ['Np', 'power_number'],
  ['impeller_diameter [mm]', 'impeller_diameter'],
  ['thermal_expansion [1/K]', 'thermal_expansion'],
  ['T_hot_in_C', 'inlet_temperature'],
  ['cold_flow_L_per_h', 'volume_flow_other'],
  ['velocity_fps', 'velocity'],
  ['depth_ft', 'depth'],
  ['Re', 'Re'],
  ['Nu [-]', 'Nu'],
  ['run', 'trial'],
  ['Versuch Nr.', 'trial'],
  ['week', 'campaign'],
];

describe('what a column seems to be', () => {
  test.each(known)('%s: %s', (header, key) => {
    expect(guesses(header)).toEqual([key]);
  });

  test.each([
    ['T', 'temperature?'],
    ['Durchfluss', 'volume_flow?'],
    ['N [rmp]', 'unknown?'],
    ['Q [NL/min]', 'volume_flow?'],
    ['channel 7 [mA]', 'limiting_current?'],
    ['flow [kg/h]', 'mass_flow'],
    ['T [bar]', 'number'],
    ['dp [mbar]', 'number'],
    ['delta T [K]', 'number'],
    ['slope_10_x_4', 'number'],
  ])('%s is %s', (header, key) => {
    expect(guesses(header)).toEqual([key]);
  });

  test('dates are an order, words are texts, a second candidate is asked', () => {
    expect(guesses('when;who;T [°C];T_fluid [°C]', ['2024-05-01 08:30', 'Muster', '20', '21'])).toEqual([
      'order',
      'text',
      'temperature',
      'temperature?',
    ]);
  });
});

describe('the study file it writes', () => {
  test('guesses in doubt are comments with their question, and all questions are returned', () => {
    const { yaml, questions } = begun('run;N [rpm];T;Q [NL/min]\nR1;300;20,5;3\nR2;400;n.d.;4\n');
    expect(yaml).toContain('  rotation_speed: {column: "N [rpm]"}');
    expect(yaml).toContain('#  temperature: {column: "T", unit: "K"}');
    expect(yaml).toContain('missing: ["n.d."]');
    for (const question of questions) expect(yaml).toContain(`# QUESTION: ${question}`);
    expect(questions.some((question) => question.includes('reference temperature and pressure'))).toBe(true);
    expect(parseStudy(yaml, 'study.yaml').quantities).toHaveProperty('rotation_speed');
  });

  test.each([
    ['pellets', 'run,N [rpm],T [degC],d0 [mm],t [min],m0 [g],loss [g],cs [g/L]\nP1,300,20,5,10,20,1,2\n', 'pellet-dissolution', 'Sh'],
    ['a tube', 'run,flow [L/min],T_in [degC],T_out [degC],T_wall [degC]\nA,10,20,30,60\n', 'log-mean-difference', 'Nu'],
    [
      'two streams',
      'run,T_hot_in_C,T_hot_out_C,T_cold_in_C,T_cold_out_C,hot_flow_L_per_h\nA,60,40,15,30,600\n',
      'log-mean-difference',
      'overall_coefficient',
    ],
    ['a cooling sphere', 'run,T0 [degC],T_end [degC],t [s],T_amb [degC]\nA,100,50,300,20\n', 'sphere-cooling', 'Nu'],
    ['coefficients ready', 'run,v [m/s],kLa [1/h]\nA,0.1,30\n', 'measured', 'volumetric_coefficient'],
  ])('%s: its route and response', (_, text, route, response) => {
    const study = parseStudy(begun(text).yaml, 'study.yaml');
    expect(study.coefficient!.route.is).toBe(route);
    expect(study.laws[0]!.form.is.startsWith(`${response} = `)).toBe(true);
  });

  test('groups that stand ready need neither fluid nor route', () => {
    const { yaml, questions } = begun('run,Re,Pr,Nu\nA,1e4,7,80\n');
    const study = parseStudy(yaml, 'study.yaml');
    expect([Object.keys(study.groups), study.laws[0]!.form.is, study.coefficient]).toEqual([
      ['Re', 'Pr', 'Nu'],
      'Nu = C * Re^a * Pr^b',
      undefined,
    ]);
    expect(questions.length).toBe(2);
  });

  const plan = (text: string) =>
    makePlan(parseStudy(begun(text).yaml, 'study.yaml'), { trials: tableOf(text), tables: new Map(), catalogue: [], own: [] });

  test('check accepts it where the columns are enough, and lists what is missing where they are not', () => {
    expect(plan('run,Re,Pr,Nu\nA,1e4,7,80\n').laws[0]!.form.constants).toEqual(['C', 'a', 'b']);
    expect(plan('run,power_x,y\nA,1,2\n').laws[0]!.form.constants).toEqual(['C', 'a']);
    expect(() => plan('run,flow [L/min],T_in [degC],T_out [degC],T_wall [degC]\nA,10,20,30,60\n')).toThrow(/diameter/u);
  });

  test('whatever the headers, the file parses (1,000 seeded)', () => {
    const header = fc.oneof(
      fc.string({ maxLength: 12, unit: 'grapheme' }).filter((text) => !/[";\n\r\0]/u.test(text)),
      fc.constantFrom(
        ...known.map(([text]) => text),
        '=1+1',
        '# x',
        'a: b',
        "it's",
        '{x}',
        '- y',
        '!tag',
        '&a',
        '*a',
        '| z',
        'null',
        'true',
        '<b>',
        '__proto__',
      ),
    );
    fc.assert(
      fc.property(
        fc.array(header, { minLength: 2, maxLength: 8 }),
        fc.array(fc.constantFrom('1', '2,5', 'n.d.', 'x', '2024-05-01', ''), { minLength: 8, maxLength: 8 }),
        (headers, cells) => {
          const row = headers.map((_, k) => cells[k]!).join(';');
          let table: ReturnType<typeof tableOf>;
          try {
            table = tableOf(`${headers.join(';')}\n${row}\n${headers.map(() => '1').join(';')}\n`);
          } catch {
            return true;
          }
          const { yaml } = beginStudy(guessColumns(table));
          return parseStudy(yaml, 'study.yaml').laws.length > 0;
        },
      ),
      { seed: 26, numRuns: 1000 },
    );
  });
});
