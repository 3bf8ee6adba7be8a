import type { Heading } from '#src/services/import/readHeading.ts';

/** What a column holds, by what its heading says. */
export type ColumnField =
  | 'athlete'
  | 'givenName'
  | 'familyName'
  | 'date'
  | 'birthDate'
  | 'sex'
  | 'plays'
  | 'squad'
  | 'email'
  | 'test'
  | 'side'
  | 'attempt'
  | 'value'
  | 'unit'
  | 'remark'
  | 'stature'
  | 'sittingHeight'
  | 'mass'
  | 'place'
  | 'temperature'
  | 'humidity'
  | 'pressure'
  | 'altitude'
  | 'wind'
  | 'headwind'
  | 'surface'
  | 'ball'
  | 'club'
  | 'clubSpeed'
  | 'ballSpeed'
  | 'launch'
  | 'spin'
  | 'attack'
  | 'dynamicLoft'
  | 'carry'
  | 'offline'
  | 'clubLength'
  | 'clubLoft'
  | 'swing'
  | 'time'
  | 'sampleRate'
  | 'event'
  | 'force';

/** The first that fits wins: the more particular stand before the more general. */
const FIELDS: readonly [ColumnField, RegExp][] = [
  ['birthDate', /birth|^d ?o ?b$|^born/],
  ['givenName', /^(first|given|fore|christian)( ?names?)?$|^forename$/],
  ['familyName', /^(sur|last|family|second) ?names?$|^(last|surname|family)$/],
  ['email', /\be ?mails?\b|^(parents?|guardians?|mother|father|contact)\b/],
  ['athlete', /^(athlete|player|golfer|child|junior|participant|pupil|student|member|who|subject)( ?names?| id)?$/],
  ['athlete', /^(full )?names?$/],
  ['sex', /^(sex|gender|m f|f m|boy girl|girl boy|male female|female male)$/],
  ['plays', /^(plays?|swings?|hits?|hand|handed|handedness|dexterity|rh lh|lh rh|stance|orientation)$/],
  ['plays', /^(golf|playing|swing|dominant|hitting|club) (hand|side|handedness)$|^plays? \w+$/],
  ['squad', /^(squad|group|team|class|cohort|programme|program)( name)?$/],
  [
    'sittingHeight',
    /\b(sitting|seated|sit)\b.*\b(height|ht|stature)\b|\bheight\b.*\b(sitting|seated)\b|^sit ?h(t|eight)?$|^sh$/,
  ],
  ['stature', /^(standing |body |full )?(height|stature|ht)( standing)?$/],
  ['mass', /^(body ?)?(mass|weight|wt)$|^(body|b) ?(mass|weight)$/],
  ['temperature', /\btemp(erature)?\b/],
  ['humidity', /humidity|^rh$/],
  ['pressure', /pressure|barometer|^qnh$/],
  ['altitude', /altitude|elevation/],
  ['headwind', /\bhead ?wind\b/],
  ['wind', /\bwind\b|\btail ?wind\b/],
  ['surface', /^(surface|turf|mat|tee|lie|mat or tee|tee or mat|hitting surface)$/],
  ['clubLength', /\b(club|shaft)\b.*\blength\b/],
  ['clubLoft', /^(club |static )loft$/],
  ['dynamicLoft', /\bdyn(amic)? ?loft\b/],
  ['clubSpeed', /\bclub ?(head)? ?(speed|velocity|spd)\b|^chs$|^swing ?speed$|^head ?speed$|^clubhead$|^cs$/],
  ['ballSpeed', /\bball ?(speed|velocity|spd)\b|^bs$/],
  ['launch', /^(vertical |vert )?launch( ?angle| ang)?( vertical| vert)?$|^vla$|^launch deg$/],
  ['spin', /^(back ?|total )?spin( ?rate| total| speed)?$|^backspin$/],
  ['attack', /\battack\b|^ao ?a$/],
  ['carry', /^carry( ?(distance|dist|length|flat|total))*$|^(ball )?flight distance$|^distance carry$/],
  ['offline', /^(off ?line|lateral|carry side|side carry|deviation|off line distance|side distance|side total)$/],
  ['club', /^club( ?(type|name|used))?$/],
  ['ball', /^(ball( type| used)?|type of ball|balls)$/],
  ['date', /^(date|day|when|on)$|\bdate$|^date\b|^(tested|measured|recorded|session|test|held) (on|day)$/],
  ['place', /^(place|location|venue|where|site|facility|range)$/],
  ['test', /^(test|exercise|assessment|measure|metric|item|test ?name|name of test|movement|task)$/],
  ['side', /^(leg|side|limb|foot|l r|left right|r l|tested (leg|side)|(leg|side|limb) tested|leg side)$/],
  [
    'attempt',
    /^(trial|attempt|rep|repetition|try|effort|shot|ball|stroke)( ?(no|nr|num|number))?$|^(no|nr|num|number|n|id)$/,
  ],
  ['value', /^(results?|values?|reading|measurement|outcome|measured|performance|distance or force)$/],
  ['unit', /^(units?|uom|unit of measure|measured in)$/],
  [
    'remark',
    /^(remarks?|notes?|comments?|observations?|status|valid|void|voided|invalid|foul|flag|reason|counts?|ok|excluded?)$/,
  ],
  ['swing', /^swing( ?(no|nr|number))?$/],
  ['sampleRate', /^(sample|sampling) ?(rate|frequency)$|^(fs|hz|rate|frequency)$/],
  ['event', /^(event|events|marker|phase|position)$/],
  ['time', /^(time|t|elapsed|elapsed time|seconds|sec|s|ms|timestamp|time stamp)$/],
  ['force', /\b(force|fz|f z|vgrf|grf|load|vertical)\b|^f$/],
];

/**
 * The field that a heading names, or null.
 *
 * @example columnField(readHeading('Clubhead speed [km/h]')) // → 'clubSpeed'
 */
export function columnField({ name, unit }: Heading): ColumnField | null {
  if (name === '' && unit?.quantity === 'time') return 'time';
  if (name === '' && unit?.quantity === 'force') return 'force';
  return FIELDS.find(([, pattern]) => pattern.test(name))?.[0] ?? null;
}
