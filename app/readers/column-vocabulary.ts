import type { ColumnReading } from "./reading";

export interface NameRule {
  role: ColumnReading["role"];
  /** Tried on the spaced name: lower case, no accents, words apart (`Spd40mNMax` → `spd 40 m n max`). */
  words?: RegExp;
  /** All of these must match too. */
  also?: RegExp;
  not?: RegExp;
  /** Whole names, squashed: lower case letters and digits only. */
  whole?: readonly string[];
  note?: string;
}

const WIND =
  /\b(?:winds?\b|wind(?:speed|dir|gust|geschw|richt|boe|bo|spitze|stark)|windgeschwindigkeit|windrichtung|ventos?|vientos?|vents?\b|wnd|wspd|spd|speed|anemom)/;
const SPEED =
  /(?:speed|spd|veloc|vitesse|geschw|windstark|force|intensidade|sustain|mean|avg|average|media|moyen|mittel)/;
const DIRECTION = /(?:\bdir|direc|richtung|bearing|winddir|\bdegt?\b|\bfrom\b|\btowards?\b|\bto\b)/;
const GUST = /(?:gust|rajada|racha|rafaga|rafale|\bboen?\b|\bbo\b|windbo|windspitze|spitze|peak)/;
const TEMPERATURE = /(?:temp|tmp|\btair\b|\btwat|celsius|\bt \d+ m\b|\bair t[cf]?\b)/;

/**
 * Words that name a quantity in English, Portuguese, Spanish, French and German, most particular first: the first rule
 * that fits wins. What a rule here gives is a proposal that the reading sheet shows.
 */
export const NAME_RULES: readonly NameRule[] = [
  {
    role: "leftOut",
    words:
      /\b(?:std|stdev|stddev|std dev|sd|sigma|desv\w*|ecart|standardabw\w*|variance|flag|flags|qc|quality|qualit\w*|batt\w*|samples|station|stn|latitude|lat|longitude|lon|elevation|elev|altitude|name|id|wmo|icao|expver|turbulence)\b/,
    note: "spread, flag or housekeeping column",
  },
  {
    role: "leftOut",
    words: /(?<!\d )\b(?:min|mini|minimum|minima|minimo|minimal\w*)\b/,
    note: "minimum of the interval",
  },
  {
    role: "leftOut",
    words: /\b(?:stress|taux|tauy|tau|esfuerzo|schubspannung)\b/,
    note: "a stress is not a wind",
  },
  {
    role: "leftOut",
    words:
      /\b(?:wave|waves|swell|sea state|ondas?|oleaje|houle|wellen\w*|seegang|mwd|wvht|current|currents|corrente|corriente|courant|stromung\w*|chill|index|feels)\b/,
    note: "waves, currents or an index",
  },
  {
    role: "windU",
    words: /\b(?:u wind|wind u|uwnd|eastward wind|wind east\w*|zonal wind|u component|wind x)\b/,
    whole: ["u", "u10", "u10m", "10u", "uwnd", "uwind", "windu", "ugrd", "u10n", "us"],
  },
  {
    role: "windV",
    words: /\b(?:v wind|wind v|vwnd|northward wind|wind north\w*|meridional wind|v component|wind y)\b/,
    whole: ["v", "v10", "v10m", "10v", "vwnd", "vwind", "windv", "vgrd", "v10n", "vs"],
  },
  {
    role: "windGust",
    words: GUST,
    whole: ["gust", "gst", "wg", "wgust", "fx", "fg", "sgust", "vmax"],
    not: /\b(?:dir|direction|time|hour|gdr|gtime)\b/,
  },
  { role: "windGust", words: WIND, also: /\bmax\w*\b/, not: /(?:\bdir|direc|richtung|sustain)/ },
  { role: "windFrom", words: WIND, also: DIRECTION, not: GUST },
  {
    role: "windFrom",
    words: /^(?:dir|wd|wdir)\b(?!ect)/,
    whole: [
      "wd",
      "wdir",
      "winddir",
      "drct",
      "dir",
      "direction",
      "wdr",
      "winddirection",
      "wdirection",
      "vd",
      "dv",
      "windrichtung",
    ],
    not: GUST,
  },
  { role: "windSpeed", words: WIND, also: SPEED, not: /(?:\bmax\b|direc|richtung|power|run\b)/ },
  {
    role: "windSpeed",
    whole: [
      "ws",
      "wspd",
      "wind",
      "spd",
      "sknt",
      "smph",
      "ff",
      "speed",
      "windspeed",
      "wsp",
      "wndspd",
      "vv",
      "vento",
      "viento",
      "vent",
    ],
    words: /^(?:wspd|ws|wind speed)\b/,
  },
  { role: "leftOut", words: /\bmax\w*\b/, note: "maximum of the interval" },
  {
    role: "dewPoint",
    words: /(?:\bdew|orvalho|rocio|rosee|taupunkt|dwp|dewp)/,
    whole: ["td", "dwpf", "dwpc", "d2m", "dewp"],
  },
  {
    role: "seaTemperature",
    words:
      /\b(?:sea surface temp\w*|sst|wtmp|sea temp\w*|water temp\w*|temp\w* (?:da|de|del|de l|do)? ?(?:agua|mar|eau|mer)|wassertemp\w*|meerestemp\w*|seetemp\w*|tsm)\b/,
    whole: ["sst", "wtmp", "tsea", "twater", "watertemp", "tw"],
  },
  { role: "seaTemperature", words: TEMPERATURE, also: /\b(?:sea|water|agua|mar|eau|mer|wasser|meer)\b/ },
  {
    role: "relativeHumidity",
    words: /(?:humid|umid|humed|feucht)/,
    whole: ["rh", "relh", "ur", "hr", "rh2m", "hur"],
    not: /(?:specific|absolut|mixing|soil)/,
  },
  { role: "relativeHumidity", words: /^rh\b/ },
  {
    role: "airPressure",
    words: /(?:\bpress|\bpres\b|barom|druck|\bmslp?\b|\bslp\b|\bqnh\b|\bqfe\b|pression|presion|\bpressao)/,
    whole: ["bar", "p", "pres", "alti", "baro", "pmsl", "p2m", "sp"],
    not: /(?:vapou?r|tend|change|dampf|vapeur|steam|ptdy)/,
  },
  {
    role: "longwave",
    words: /(?:long ?wave|\blw\w*|infrared|onda larga|onda longa|thermal radiation|langwell)/,
    whole: ["strd", "str", "rlds", "lwdn", "lwnet"],
  },
  {
    role: "shortwave",
    words:
      /(?:short ?wave|\bsw\w*|solar|radiac|radiat|rayonn|strahlung|irradian|\bghi\b|insolat|pyran|\bslr|\brad\b|onda corta)/,
    whole: ["ssrd", "ssr", "rsds", "srad", "ghi", "sr", "swdn", "swnet", "rg"],
    not: /(?:diffuse|difusa|uv\b|\bpar\b|photosynth|net all)/,
  },
  { role: "sensible", words: /(?:sensib|fuhlbar)/, whole: ["sshf", "hfss", "qh", "shf", "hs"] },
  { role: "latent", words: /\blatent/, whole: ["slhf", "hfls", "qe", "lhf", "hl"] },
  {
    role: "netHeat",
    words:
      /(?:\bnet heat|heat net|net surface heat|total heat|heat flux|calor net|flujo de calor|fluxo de calor|warmestrom)/,
    whole: ["qnet", "hnet", "netheat", "heatnet"],
  },
  { role: "evaporation", words: /(?:evapor|verdunst)/, whole: ["e", "evap", "et0"], not: /transpir/ },
  {
    role: "leftOut",
    words: /(?:\bsnow|\bschnee|\bneige|\bnieve|\bneve\b)/,
    note: "snow is not rain: its water equivalent is another column",
  },
  {
    role: "rain",
    words: /(?:\brain|precip|prcp|\bpcp|lluvia|chuva|pluie|\bregen|niederschlag|pluvio|\bppt\b)/,
    whole: ["rr", "tp", "p01i", "p01m", "rain", "r", "precip", "prec", "rre24", "r1"],
    not: /(?:prob|type|tipo|duration|dauer|flag|code)/,
  },
  {
    role: "airTemperature",
    words: TEMPERATURE,
    whole: ["t", "ta", "tt", "t2m", "atmp", "tmpf", "tmpc", "tas", "tair", "airt", "temp"],
    not: /(?:soil|solo|suelo|boden|panel|logger|batter|intern|wet|humid|virtual|ground|grass|body)/,
  },
];

/** Names of parts of a date or time, squashed and without accents. */
export const STAMP_NAMES = {
  year: ["yy", "yyyy", "year", "yr", "ano", "anio", "annee", "jahr"],
  month: ["mo", "month", "mon", "mes", "mois", "monat"],
  day: ["dd", "dy", "day", "dia", "jour", "tag", "dom"],
  hour: ["hh", "hr", "hour", "hours", "hora", "heure", "stunde"],
  minute: ["mn", "min", "minute", "minutes", "minuto", "mi", "nn"],
  second: ["ss", "sec", "second", "seconds", "segundo", "seconde", "sekunde"],
  dayOfYear: ["doy", "jday", "yday", "dayofyear", "julianday", "diajuliano", "jd"],
} as const;
export type StampPart = keyof typeof STAMP_NAMES;

/** Words that tell of a date, a time or both. */
export const STAMP_WORDS =
  /(?:date|time|stamp|\bdata\b|\bhora|\bhours?\b|fecha|heure|datum|\bzeit|uhrzeit|zeitpunkt|\bvalid\b|\bepoch\b|\bunix\b|\butc\b|\bgmt\b|tiempo|tempo|momento|\bserial\b|\bdt\b|\btm\b|\bhh mm\b|\bhhmm\b)/;
