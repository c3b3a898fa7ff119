import { inspectCsv, readCsv } from './read-csv';

const bytes = (...lines: string[]) => new TextEncoder().encode(lines.join('\n'));

it('shows what it made of a log before anything is saved', () => {
  const shown = inspectCsv(bytes('date,distance_km,indoor', '2025-05-03,12.5,', 'soon,8,1'));
  expect(shown.questions).toEqual([]);
  expect(shown.matching).toMatchObject({
    delimiter: ',',
    decimal: '.',
    dateOrder: 'ymd',
    distanceUnit: 'km',
  });
  expect(shown.matching.columns).toEqual({ date: 0, distance: 1, indoor: 2 });
  expect(shown.columns.map(({ header }) => header)).toEqual(['date', 'distance_km', 'indoor']);
  expect(shown.rides).toMatchObject([{ line: 2, date: '2025-05-03', distanceM: 12_500, indoor: null }]);
  expect(shown.problems).toEqual([
    { line: 3, outcome: 'unreadable', message: '“soon” is not a date that can be read.' },
  ]);
  expect(shown.rows).toBe(2);
});

it.each([
  ['a day above 12 in first place', ['03/05/2025', '31/05/2025'], 'dmy', false],
  ['a day above 12 in second place', ['03/05/2025', '05/31/2025'], 'mdy', false],
  ['no day above 12', ['03/05/2025', '04/05/2025'], 'dmy', true],
] as const)('decides the date order by evidence: %s', (_, dates, order, asked) => {
  const shown = inspectCsv(bytes('date,km', ...dates.map((date) => `${date},10`)));
  expect(shown.matching.dateOrder).toBe(order);
  expect(shown.questions.map(({ about }) => about)).toEqual(asked ? ['dateOrder'] : []);
});

it('asks whether a comma before three digits is a decimal comma', () => {
  expect(inspectCsv(bytes('date;km', '2025-05-03;1,234')).questions.map(({ about }) => about)).toEqual([
    'decimal',
  ]);
  expect(inspectCsv(bytes('date;km', '2025-05-03;1,234', '2025-05-04;8,5')).matching.decimal).toBe(',');
});

it('finds columns without a header', () => {
  const { matching, questions } = inspectCsv(bytes('2025-05-03;12,5 km', '2025-05-04;8,0 km'));
  expect(matching).toMatchObject({
    hasHeader: false,
    delimiter: ';',
    decimal: ',',
    columns: { date: 0, distance: 1 },
  });
  expect(questions).toEqual([]);
});

it('reads again as the rider corrects the matching', () => {
  const file = bytes('when,how far', '03/05/2025,10');
  const { matching, questions } = inspectCsv(file);
  expect(questions.map(({ about }) => about)).toEqual(['distance', 'dateOrder']);
  const corrected = {
    ...matching,
    dateOrder: 'mdy' as const,
    distanceUnit: 'mi' as const,
    columns: { date: 0, distance: 1 },
  };
  expect(inspectCsv(file, corrected).rides).toMatchObject([{ date: '2025-03-05', distanceM: 16_093 }]);
  expect(readCsv(file, corrected).rides).toHaveLength(1);
});

it('takes surface, weather, times and the turbo room from columns of their own', () => {
  const header = 'date,start time,distance (m),moving time,elapsed time,surface,weather,indoor,sport';
  const row = '2025-05-03,2025-05-03T08:10:00+02:00,12500,0:41:05,1h 2m,gravel,rain,no,cycling';
  expect(readCsv(bytes(header, row)).rides).toEqual([
    {
      line: 2,
      date: '2025-05-03',
      startedAt: '2025-05-03T06:10:00.000Z',
      distanceM: 12_500,
      movingS: 2465,
      elapsedS: 3720,
      sport: 'cycling',
      indoor: false,
      surface: 'gravel',
      weather: 'wet',
    },
  ]);
});

it('leaves out other sports, empty rides and impossible distances, each with its line', () => {
  const { rides, problems } = readCsv(
    bytes(
      'date,km,sport',
      '2025-05-03,5,Running',
      '2025-05-04,0,Ride',
      '2025-05-05,12500,Ride',
      '2025-05-06,20,Ride',
    ),
  );
  expect(rides).toHaveLength(1);
  expect(problems.map(({ line, outcome }) => [line, outcome])).toEqual([
    [2, 'other-sport'],
    [3, 'not-a-ride'],
    [4, 'unreadable'],
  ]);
});

it('reads text as spreadsheets write it: UTF-16 and Windows-1252', () => {
  const text = 'date\tkm\tweather\r\n2025-05-03\t7\twet\r\n';
  const wide = new Uint8Array([0xff, 0xfe, ...[...text].flatMap((letter) => [letter.charCodeAt(0), 0])]);
  expect(readCsv(wide).rides).toMatchObject([{ distanceM: 7000, weather: 'wet' }]);
  const latin = new Uint8Array(
    [...text.replace('weather', 'dur\u00e9e').replace('wet', '0:30')].map((letter) => letter.charCodeAt(0)),
  );
  expect(readCsv(latin).rides).toMatchObject([{ movingS: 1800 }]);
});

it.each([
  ['day and named month', 'date,km', '3 May 2025,12', '2025-05-03'],
  ['named month, American', 'date;km', '"May 3, 2025";12', '2025-05-03'],
  ['weekday before it', 'date;km', 'Sat, 03-May-25;12', '2025-05-03'],
  ['time after it', 'date,km', '2025-05-03 18:30,12', '2025-05-03'],
  ['no dashes', 'date,km', '20250503,12', '2025-05-03'],
])('reads a date with %s', (_, header, row, date) => {
  const { rides, questions } = inspectCsv(bytes(header, row));
  expect(questions).toEqual([]);
  expect(rides).toMatchObject([{ date, distanceM: 12_000 }]);
});

it.each([
  ['hours and minutes', ['20,0:58', '45,2:10'], [3480, 7800]],
  ['minutes and seconds', ['0.5,1:30', '3,12:05'], [90, 725]],
  ['minutes and seconds beside hours', ['1,2:30', '45,2:10:00'], [150, 7800]],
  ['the time of day, which is no duration', ['20,08:15', '25,17:45'], [null, null]],
])('reads times with one colon as %s, by the speed that they would give', (_, rows, times) => {
  const { rides } = inspectCsv(bytes('date,km,time', ...rows.map((row) => `2025-05-03,${row}`)));
  expect(rides.map(({ movingS }) => movingS)).toEqual(times);
});

it.each([
  ['a title above the table', ['Rides of the year', '', 'date,km', '2025-05-03,12']],
  ['a line that names the delimiter', ['sep=;', 'date;km', '2025-05-03;12']],
  ['quotes around everything', ['"date","Distance in km"', '"2025-05-03","12"']],
])('reads a table with %s', (_, lines) => {
  const { rides, questions } = inspectCsv(bytes(...lines));
  expect(questions).toEqual([]);
  expect(rides).toMatchObject([{ line: lines.length, date: '2025-05-03', distanceM: 12_000 }]);
});

it('asks for the date when the column of that name holds none', () => {
  const { questions } = inspectCsv(bytes('date,km', 'Saturday,12'));
  expect(questions.map(({ about }) => about)).toEqual(['date']);
});

it('guesses anew what the rider has not said', () => {
  const file = bytes('Tag;weit;Sport', '03.04.2025;12,5;Rad', '05.04.2025;1.000,5;Rad');
  expect(inspectCsv(file).questions.map(({ about }) => about)).toEqual(['distance', 'dateOrder']);
  const told = inspectCsv(file, { columns: { date: 0, distance: 1 } });
  expect(told.matching.decimal).toBe(',');
  expect(told.questions.map(({ about }) => about)).toEqual(['dateOrder', 'distanceUnit']);
  const all = inspectCsv(file, { columns: { date: 0, distance: 1 }, dateOrder: 'dmy', distanceUnit: 'km' });
  expect(all.questions).toEqual([]);
  expect(all.rides.map(({ date, distanceM }) => [date, distanceM])).toEqual([
    ['2025-04-03', 12_500],
    ['2025-04-05', 1_000_500],
  ]);
});
