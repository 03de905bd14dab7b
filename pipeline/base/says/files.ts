const size = (bytes: number): string => (bytes < 1e6 ? `${Math.ceil(bytes / 1e3)} kB` : `${(bytes / 1e6).toFixed(bytes < 1e7 ? 1 : 0)} MB`);

const remedies: Readonly<Record<string, string>> = {
  missing: 'the folder does not exist',
  'not allowed': 'you have no permission there; choose another folder or change its permissions',
  'read-only': 'the disk is read-only; choose another folder',
  full: 'the disk or your share of it is full; make room or choose another folder',
  'is a folder': 'a folder of that name stands there',
  'a folder of that name is a file': 'a file stands where a folder is needed',
  'too many open files': 'too many files are open on this machine; try with fewer jobs',
  'the name is too long': 'the name is too long for this disk',
  'links in a circle': 'its links lead in a circle',
  unknown: 'the system refused it',
};
const remedy = (cause: string): string => remedies[cause] ?? cause;

/** What is said about files and folders. */
export const says = {
  missing: (name: string): string => `"${name}" does not exist; paths count from the folder of the study file`,
  noFile: (name: string): string => `"${name}" is no plain file`,
  notReadable: (name: string, cause: string): string => `"${name}" cannot be read: ${remedy(cause)}`,
  tooLarge: (name: string, bytes: number, most: number): string => `"${name}" has ${size(bytes)}; at most ${size(most)} are read here`,
  changedWhileRead: (name: string): string => `"${name}" became shorter while it was read; run again when nothing writes to it`,
  outside: (path: string): string => `"${path}" leads out of the study's folder; give a path inside it, such as data/trials.csv`,
  notUtf8: (byte: number): string =>
    `the byte 0x${byte.toString(16).toUpperCase().padStart(2, '0')} is no UTF-8${byte >= 0xa0 ? ` (in Windows-1252 it would be "${String.fromCharCode(byte)}")` : ''}; save the file as UTF-8`,
  utf16WithoutMark: (): string => 'this looks like UTF-16 without a byte-order mark; save the file as UTF-8',
  oddUtf16: (): string => 'this starts as UTF-16 and ends within a character; the file is cut short, save it anew as UTF-8',
  brokenUtf16: (): string => 'this starts as UTF-16 and holds characters that are none; save the file as UTF-8',
  notWritten: (path: string, cause: string): string => `"${path}" cannot be written: ${remedy(cause)}`,
  notRemoved: (path: string, cause: string): string => `"${path}" cannot be removed: ${remedy(cause)}`,
  folderNotMade: (path: string, cause: string): string => `the folder "${path}" cannot be made: ${remedy(cause)}`,
  inUse: (folder: string, pid: number | undefined, lock: string): string =>
    `another run${pid === undefined ? '' : ` (process ${pid})`} is writing into "${folder}"; wait until it has ended, or give this one another folder with --out (if no such process is left, remove "${lock}")`,
  notOurs: (name: string): string =>
    `"${name}" stands where a result goes and is no result of pilotlaw; it is left as it is, and no result is written: move it away, or choose another folder with --out or output.folder`,
  noStudy: (given: string, name: string): string => `no study here: "${given}" is no file and no folder that holds a ${name}`,
  nothingGiven: (name: string): string => `no study given; give study files or folders that hold a ${name}`,
  tooManyFiles: (folder: string, most: number): string => `more than ${most} files lie below "${folder}"; name the folders of the studies`,
  tooManyStudies: (count: number, most: number): string => `${count} studies; at most ${most} are run at once`,
};
