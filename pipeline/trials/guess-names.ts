/** A quantity as people write it above a column, in English and German; common practice, no source. */
export interface NamePattern {
  readonly key: string;
  /** On the name in plain words: lower case, umlauts spelt out, words apart. */
  readonly name: RegExp;
}

/** `T_in` -> `t in`, `Kühlwasser-Zulauf` -> `kuehlwasser zulauf`, `ṁ` -> `m dot`. */
export function plainWords(name: string): string {
  return name
    .replace(/([\p{Ll}\d])(\p{Lu})/gu, '$1 $2')
    .toLowerCase()
    .replace(/ä/gu, 'ae')
    .replace(/ö/gu, 'oe')
    .replace(/ü/gu, 'ue')
    .replace(/ß/gu, 'ss')
    .replace(/ϑ|ϴ|θ|ϑ/gu, 'theta')
    .replace(/δ|∆/gu, ' delta ')
    .replace(/ρ/gu, 'rho')
    .replace(/[μµ]/gu, 'mu')
    .replace(/η/gu, 'eta')
    .replace(/ν/gu, 'nu')
    .replace(/λ/gu, 'lambda')
    .replace(/α/gu, 'alpha')
    .replace(/β/gu, 'beta')
    .replace(/ε/gu, 'eps')
    .replace(/σ/gu, 'sigma')
    .replace(/φ|ϕ/gu, 'phi')
    .normalize('NFD')
    .replace(/\u0307/gu, 'dot')
    .replace(/[^\p{ASCII}]/gu, ' ')
    .replace(/[^a-z0-9*%]+/gu, ' ')
    .trim();
}

export const secondStream = /\b(?:cold|kalt\w*|cool\w*|kuehl\w*|jacket|mantel\w*|shell|utility|service|secondary|sekundaer|cw)\b/u;

/** `T w`, `temperature wall`, `wall temperature`: the whole name, with one of the words behind or in front. */
const temperature = (behind: string, front: string): RegExp => {
  const word = '(?:t|theta|temp|temperature|temperatur)';
  return new RegExp(`^(?:${word} ?(?:${behind})|(?:${front}) ?${word})$`, 'u');
};

/** In this order; the first that fits the name and the unit's dimension is the guess. */
export const namePatterns: readonly NamePattern[] = [
  // temperatures
  { key: 'wall_temperature', name: temperature('w|wall|wand|surf|surface|oberfl\\w*|skin', 'wall|wand|surface|oberflaechen?') },
  { key: 'film_temperature', name: temperature('f|film', 'film') },
  { key: 'ambient_temperature', name: temperature('amb\\w*|room|raum|umg\\w*|inf', 'ambient|room|raum|umgebungs?') },
  {
    key: 'inlet_temperature',
    name: /^(?=.*(?:\bt\b|\btheta\b|temp))(?=.*\b(?:in|inlet|ein|eintritts?\w*|zulauf\w*|vorlauf\w*|feed|zu|entering|eingang\w*)\b).*/u,
  },
  {
    key: 'outlet_temperature',
    name: /^(?=.*(?:\bt\b|\btheta\b|temp))(?=.*\b(?:out|outlet|aus|austritts?\w*|ablauf\w*|ruecklauf\w*|return|ab|leaving|ausgang\w*)\b).*/u,
  },
  { key: 'initial_temperature', name: temperature('0|start|initial|anf\\w*|begin', 'initial|start|anfangs?') },
  { key: 'final_temperature', name: temperature('1|end|ende|final', 'final|end') },
  {
    key: 'temperature',
    name: temperature(
      'bulk|fluid|water|wasser|liquid|fluessigkeit|mean|mittel|bath|bad|tank|vessel|behaelter|m|b|l|',
      'bulk|fluid|water|wasser|liquid|fluessigkeits?|mean|mittlere|bath|bad|tank|vessel|behaelter|',
    ),
  },
  // pressures
  {
    key: 'ambient_pressure',
    name: /\b(?:p|press\w*|druck) ?(?:amb\w*|umg\w*|atm|baro\w*)\b|\b(?:ambient|baro\w*|umgebungs?|luft) ?(?:pressure|druck)/u,
  },
  { key: 'vapour_pressure', name: /\b(?:p|druck) ?(?:v|vap\w*|dampf|sat)\b|\b(?:vapou?r|dampf) ?(?:pressure|druck)/u },
  { key: 'pressure', name: /^(?:p|press\w*|druck)(?: (?:abs|in|1|system|vessel|behaelter))?$/u },
  // flows
  { key: 'gas_velocity', name: /\b(?:u|v|w) ?(?:g|gas)\b|\b(?:gas|superficial gas|leerrohr) ?(?:velocity|geschw\w*)/u },
  {
    key: 'volume_flow',
    name: /\b(?:q|v ?dot|vdot|vol\w* ?str\w*|vol\w* ?flow|volumenstrom|durchfluss|flow|flowrate|foerderstrom|feed rate|qv|strom)\b/u,
  },
  { key: 'mass_flow', name: /\b(?:m ?dot|mdot|mass ?flow|massenstrom|massestrom|flow|flowrate|durchsatz|qm|g)\b/u },
  { key: 'velocity', name: /\b(?:v|u|w|velocity|geschw\w*|speed)\b/u },
  { key: 'film_flow_per_width', name: /\b(?:gamma|berieselung\w*|film flow)\b/u },
  // agitation
  { key: 'rotation_speed', name: /\b(?:n|rpm|speed|stirr\w*|agit\w*|drehzahl|ruehrer\w*|rotation\w*|impeller speed|rev\w*)\b/u },
  { key: 'power_ungassed', name: /\b(?:p0|ungassed|unbegast\w*)\b/u },
  { key: 'heat_loss', name: /\b(?:q ?(?:loss|verl\w*)|(?:heat|waerme) ?(?:loss|verlust))\b/u },
  { key: 'heat_rate', name: /\b(?:q ?(?:dot)?|heat\w*|duty|heiz\w*|waerme\w*|phi)\b/u },
  { key: 'power', name: /\b(?:p|power|leistung|shaft|motor\w*|wellenl\w*)\b/u },
  { key: 'power_per_volume', name: /\b(?:p ?v|power|leistung\w*|eps)\b/u },
  { key: 'power_per_mass', name: /\b(?:eps\w*|power|leistung\w*|dissipation)\b/u },
  // geometry
  { key: 'impeller_diameter', name: /\bd ?(?:imp\w*|r|ruehr\w*|2)\b|\b(?:impeller|ruehrer) ?(?:d|dia\w*|durchm\w*)/u },
  { key: 'vessel_diameter', name: /\bd ?(?:v|ves\w*|tank|beh\w*|t)\b|\b(?:vessel|tank|behaelter) ?(?:d|dia\w*|durchm\w*)/u },
  {
    key: 'particle_diameter',
    name: /\bd ?(?:p|part\w*|0|pellet\w*|korn|k|50)\b|\b(?:particle|pellet|korn|partikel) ?(?:d|dia\w*|durchm\w*|size|groesse)/u,
  },
  { key: 'bubble_diameter', name: /\bd ?(?:b|bubble|32|blase\w*)\b|\b(?:bubble|blasen) ?(?:d|dia\w*|durchm\w*)/u },
  { key: 'hydraulic_diameter', name: /\bd ?(?:h|hyd\w*)\b|\bhydraul\w* ?(?:d|dia\w*|durchm\w*)/u },
  { key: 'outer_diameter', name: /\b(?:d ?(?:o|a|out\w*|aussen)|od)\b|\b(?:outer|outside|aussen) ?(?:d|dia\w*|durchm\w*)/u },
  { key: 'diameter', name: /\b(?:d|di|dia\w*|durchm\w*|bore|id)\b/u },
  { key: 'wall_thickness', name: /\b(?:wall thickness|wandd\w*|wandst\w*|dicke|thickness|s)\b/u },
  { key: 'depth', name: /\b(?:h|depth|level|height|fuellh\w*|fuellst\w*|hoehe|tiefe)\b/u },
  { key: 'gap', name: /\b(?:gap|spalt\w*)\b/u },
  { key: 'length', name: /\b(?:l|length|laenge)\b/u },
  { key: 'area', name: /\b(?:a|area|flaeche|surface)\b/u },
  { key: 'cross_section', name: /\b(?:cross\w*|querschn\w*)\b/u },
  { key: 'liquid_volume', name: /\b(?:v|vol\w*|hold ?up|inhalt)\b/u },
  { key: 'specific_area', name: /\b(?:a|specific area|spez\w* oberfl\w*)\b/u },
  // times
  { key: 'probe_time', name: /\b(?:tau|probe|sonde\w*|response|ansprech\w*)\b/u },
  { key: 'time_since_cleaning', name: /\b(?:since|seit)\b.*\b(?:clean\w*|reinig\w*)\b/u },
  { key: 'time', name: /\b(?:t|time|zeit|dauer|duration|laufzeit|versuchsdauer)\b/u },
  // masses and concentrations
  { key: 'initial_mass', name: /\b(?:m ?0|m ?(?:start|init\w*|anf\w*)|(?:initial|start|anfangs?) ?mass\w*|einwaage)\b/u },
  { key: 'mass_loss', name: /\b(?:loss|delta m|dm|verlust|abnahme|massenverlust|mass loss|dissolved)\b/u },
  { key: 'saturation_concentration', name: /\bc ?(?:s|sat\w*|\*|eq|star|sg)\b|\b(?:satur\w*|saettig\w*|solubility|loeslichk\w*)\b|c\*/u },
  { key: 'inlet_concentration', name: /^(?=.*\b(?:c|conc\w*|konz\w*|y|x)\b)(?=.*\b(?:in|ein|inlet|zulauf|eintritt|feed)\b).*/u },
  { key: 'outlet_concentration', name: /^(?=.*\b(?:c|conc\w*|konz\w*|y|x)\b)(?=.*\b(?:out|aus|outlet|ablauf|austritt)\b).*/u },
  { key: 'density', name: /\b(?:rho|density|dichte)\b(?! s\b)/u },
  { key: 'bulk_concentration', name: /\b(?:c|conc\w*|konz\w*|cb)\b/u },
  { key: 'molar_mass', name: /\b(?:m|molar mass|molmasse|mol\w* gew\w*)\b/u },
  { key: 'mass_rate', name: /\b(?:rate|evaporation|verdunst\w*|transfer)\b/u },
  { key: 'limiting_current', name: /\b(?:i ?(?:lim\w*|l|grenz\w*)?|current|strom|grenzstrom)\b/u },
  // properties
  { key: 'viscosity', name: /\b(?:mu|eta|visc\w*|visk\w*)\b/u },
  { key: 'kinematic_viscosity', name: /\b(?:nu|kin\w*)\b/u },
  { key: 'diffusivity', name: /\b(?:d|diff\w*|d ?ab)\b/u },
  { key: 'thermal_conductivity', name: /\b(?:lambda|k|conduct\w*|waermeleit\w*)\b/u },
  { key: 'heat_capacity', name: /\b(?:cp|c p|heat cap\w*|waermekap\w*)\b/u },
  { key: 'surface_tension', name: /\b(?:sigma|gamma|surface tension|oberflaechensp\w*)\b/u },
  // coefficients
  { key: 'overall_coefficient', name: /\b(?:u|k|overall\w*|k wert)\b/u },
  { key: 'heat_transfer_coefficient', name: /\b(?:h|alpha|htc|heat transfer\w*|waermeueberg\w*)\b/u },
  { key: 'volumetric_coefficient', name: /\b(?:k ?l? ?a|kla|kga)\b/u },
  { key: 'mass_transfer_coefficient', name: /\b(?:k|kc|kl|kg|ks|beta|mass transfer\w*|stoffueberg\w*)\b/u },
  // plain numbers
  { key: 'relative_humidity', name: /\b(?:r ?[hf]|phi|(?:rel\w*) ?(?:hum\w*|feucht\w*)|feucht\w*|humidity)\b/u },
  { key: 'gas_holdup', name: /\b(?:eps ?g|gas ?holdup|holdup|gasgehalt)\b/u },
  { key: 'voidage', name: /\b(?:eps\w*|void\w*|poros\w*|lueckengrad)\b/u },
  { key: 'mass_fraction', name: /\b(?:w|x|mass fraction|massenant\w*|gehalt|content)\b/u },
  { key: 'power_number', name: /\b(?:np|ne|power number|newtonzahl|po)\b/u },
];

/** Dimensionless groups that a table may hold ready. */
export const groupNames: readonly string[] = [
  'Re',
  'Nu',
  'Sh',
  'Pr',
  'Sc',
  'Gr',
  'Ra',
  'Le',
  'Ga',
  'Ar',
  'Fr',
  'We',
  'Bi',
  'Fo',
  'Pe',
  'St',
];

export const trialNames =
  /^(?:run|trial|test|exp\w*|versuch\w*|v ?nr|lauf|nr|no|number|nummer|id|point|punkt|messung|messpunkt|sample|probe|name|reading|case|lfd nr)(?: ?(?:no|nr|id|number|nummer|name))?$/u;
export const campaignNames =
  /^(?:campaign|kampagne|week|woche|kw|block|day|tag|serie|series|batch|charge|study|setup|aufbau|messreihe)(?: ?(?:no|nr|id))?$/u;
export const orderNames =
  /^(?:order|reihenfolge|seq\w*|started|start|date|datum|time ?stamp|zeitstempel|uhrzeit|datum uhrzeit|date time)$/u;
