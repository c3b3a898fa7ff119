import {
  Decoder,
  Profile,
  Stream,
  type ActivityMesg,
  type FileIdMesg,
  type RecordMesg,
  type SessionMesg,
} from '@garmin/fitsdk';
import { UnreadableFile } from '../unreadable';

/** A day of riding keeps some 100,000 messages; beyond this the file is no recording. */
const MAX_MESSAGES = 2_000_000;

/** What a ride does not need: heart rates beside the records, and fields derived from others. */
const sparing = { mergeHeartRates: false, expandComponents: false, expandSubFields: false };

/** The few messages of a FIT file that a ride needs. */
export interface FitContents {
  kinds: string[];
  sessions: SessionMesg[];
  activities: ActivityMesg[];
  records: number;
  /** Metres: how far the records' own distance counter went. */
  countedM: number;
  /** False when a checksum does not match or the file breaks off. */
  whole: boolean;
}

/**
 * Decodes a FIT file, chained ones too, keeping only what a ride needs: every other message is emptied as
 * soon as it is decoded, so that a million records cost little memory.
 * @throws UnreadableFile with a plain sentence
 */
export function decodeFit(bytes: Uint8Array): FitContents {
  const contents: FitContents = {
    kinds: [],
    sessions: [],
    activities: [],
    records: 0,
    countedM: 0,
    whole: true,
  };
  if (!Decoder.isFIT(Stream.fromByteArray(bytes))) {
    throw new UnreadableFile('The file is not a whole FIT file: copy it from the device again.');
  }
  let messages = 0;
  const mesgListener = (number: number, message: object) => {
    messages += 1;
    if (messages > MAX_MESSAGES)
      throw new UnreadableFile('The file is too long for one recording: split it on the device.');
    keep(contents, number, message);
  };
  const { errors } = new Decoder(Stream.fromByteArray(bytes)).read({ ...sparing, mesgListener });
  const [error] = errors;
  if (error instanceof UnreadableFile) throw error;
  if (error?.message.includes('compressed timestamp')) {
    throw new UnreadableFile(
      'The device writes an older style of FIT that cannot be read: export the ride as GPX or TCX.',
    );
  }
  contents.whole = error === undefined;
  return contents;
}

function keep(contents: FitContents, number: number, message: object): void {
  if (number === Profile.MesgNum.SESSION) contents.sessions.push({ ...message } as SessionMesg);
  else if (number === Profile.MesgNum.ACTIVITY) contents.activities.push({ ...message } as ActivityMesg);
  else if (number === Profile.MesgNum.FILE_ID) contents.kinds.push(String((message as FileIdMesg).type));
  else if (number === Profile.MesgNum.RECORD) {
    contents.records += 1;
    contents.countedM = Math.max(contents.countedM, (message as RecordMesg).distance ?? 0);
  }
  for (const key of Object.keys(message).reverse()) Reflect.deleteProperty(message, key);
}
