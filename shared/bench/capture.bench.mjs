// How long a capture takes from bytes to measures, against merely reading the same numbers with a fast CSV parser, and
// whether what it holds stays flat at ten million samples.
import { setFlagsFromString } from 'node:v8';
import { runInNewContext } from 'node:vm';
import { inferSchema, initParser } from 'udsv';
import { WaveformCapture } from '@emberlot/shared/capture/waveform-capture';
import { median, random, timed } from './bench-tools.mjs';

const samplesPerSecond = 2e7;
const periodSamples = 400;
const piece = 65_536;

/** One gate drive with edges of eight samples and three percent of noise, in volts as an instrument prints them. */
function gate(sample, shift, noise) {
  const phase = (sample + shift) % periodSamples;
  const edge = 8;
  const top = 150;
  const share =
    phase < edge ? phase / edge : phase < edge + top ? 1 : phase < 2 * edge + top ? (2 * edge + top - phase) / edge : 0;
  return (10 * share + 0.3 * (noise() - 0.5)).toFixed(3);
}

function captureFile(samples) {
  const noise = random(1);
  const parts = ['Time (s),CH1 (V),CH2 (V)\n'];
  for (let sample = 0; sample < samples; sample += 1) {
    const seconds = (sample / samplesPerSecond).toExponential(8);
    parts.push(`${seconds},${gate(sample, 0, noise)},${gate(sample, periodSamples / 2, noise)}\n`);
  }
  return Buffer.from(parts.join(''));
}

function analyse(bytes) {
  const capture = new WaveformCapture();
  for (let from = 0; from < bytes.length; from += piece) capture.push(bytes.subarray(from, from + piece));
  return capture.finish();
}

/** Reads the same file, piece by piece, into numbers and keeps none of them. */
function merelyRead(bytes) {
  let parser;
  let rows = 0;
  for (let from = 0; from < bytes.length; from += piece) {
    const text = bytes.toString('latin1', from, Math.min(bytes.length, from + piece));
    parser ??= initParser(inferSchema(text));
    parser.chunk(text, parser.typedArrs, () => {
      rows += 1;
    });
  }
  parser.end();
  return rows;
}

function speed() {
  const samples = 1_000_000;
  const bytes = captureFile(samples);
  const ours = [];
  const theirs = [];
  for (let run = 0; run < 6; run += 1) {
    const read = timed(() => merelyRead(bytes));
    const measured = timed(() => analyse(bytes));
    if (read.result !== samples || measured.result.counts.rows !== samples) throw new Error('a reader lost rows');
    if (measured.result.measures.deadTimes.overlap !== false) throw new Error('the capture was not measured');
    // The first run warms both up.
    if (run > 0) ours.push(measured.ms);
    if (run > 0) theirs.push(read.ms);
  }
  const what = '1,000,000 samples of two channels with their times';
  return [
    { subject: 'capture', what: `${what}: read and measured, median of 5`, value: median(ours), unit: 'ms' },
    { subject: 'capture', what: `${what}: merely read by uDSV, median of 5`, value: median(theirs), unit: 'ms' },
    {
      subject: 'capture',
      what: 'measuring against merely reading',
      value: median(ours) / median(theirs),
      unit: '×',
      goal: 1.5,
    },
  ];
}

function memory() {
  setFlagsFromString('--expose-gc');
  const collect = runInNewContext('gc');
  const noise = random(2);
  const rows = Array.from(
    { length: periodSamples * 50 },
    (_, sample) => `${gate(sample, 0, noise)},${gate(sample, periodSamples / 2, noise)}\n`,
  );
  const block = Buffer.from(rows.join(''));
  const capture = new WaveformCapture();
  capture.push('Sample Interval,5e-8,s\nCH1 (V),CH2 (V)\n');
  const held = [];
  const total = 10_000_000;
  const { ms } = timed(() => {
    for (let samples = rows.length; samples <= total; samples += rows.length) {
      capture.push(block);
      if (samples % 1_000_000 !== 0) continue;
      collect();
      const { heapUsed, arrayBuffers } = process.memoryUsage();
      held.push((heapUsed + arrayBuffers) / 1e6);
    }
  });
  const report = capture.finish();
  if (report.counts.rows !== total) throw new Error('rows were lost');
  return [
    { subject: 'capture', what: '10,000,000 samples of two channels: time', value: ms, unit: 'ms' },
    { subject: 'capture', what: 'held after 1,000,000 samples', value: held[0], unit: 'MB' },
    { subject: 'capture', what: 'more held after 10,000,000', value: held.at(-1) - held[0], unit: 'MB', goal: 1 },
  ];
}

export function rows() {
  return [...speed(), ...memory()];
}
