import { defineTemplate } from '../shared/template/define';
import { STEPPED_SHAFT_EXAMPLES } from './stepped-shaft-examples';
import { STEPPED_SHAFT_PARAMETERS } from './stepped-shaft-parameters';

/** Cylinders in order from the left, plain or threaded, with a chamfer at each end. */
export const steppedShaft = defineTemplate({
  id: 'stepped-shaft',
  name: 'Stepped shaft',
  summary: 'Cylinders in order from the left, each plain, fitted or threaded, with a chamfer at either end.',
  parameters: STEPPED_SHAFT_PARAMETERS,
  derived: [
    { id: 'last', value: 'count("steps") - 1' },
    { id: 'size', each: 'steps', value: 'given(row.thread) ? majorOf(row.thread) : row.diameter' },
    { id: 'start', each: 'steps', value: 'sumBefore("steps", "length", index)' },
    { id: 'end', each: 'steps', value: 'row.start + row.length' },
    { id: 'threadName', each: 'steps', value: 'given(row.thread) ? row.thread : ""' },
    {
      id: 'fitName',
      each: 'steps',
      value: 'given(row.fit) ? row.fit : toleranceAt("steps", "diameter", index)',
    },
    // Neighbours of one diameter with nothing between them are one face, sized once.
    {
      id: 'continues',
      each: 'steps',
      value:
        'index > 0 ? (abs(row.size - valueAt("steps", "size", index - 1)) < 1e-6 and row.threadName == valueAt("steps", "threadName", index - 1) and row.fitName == valueAt("steps", "fitName", index - 1)) : false',
    },
    { id: 'runLast', each: 'steps', value: 'runEnd("steps", "continues", index)' },
    {
      id: 'runFirst',
      each: 'steps',
      value: 'row.continues ? valueAt("steps", "runFirst", index - 1) : index',
    },
    { id: 'runEnd', each: 'steps', value: 'valueAt("steps", "end", row.runLast)' },
    { id: 'runLength', each: 'steps', value: 'row.runEnd - valueAt("steps", "start", row.runFirst)' },
    { id: 'lastFace', value: 'valueAt("steps", "runFirst", last)' },
    { id: 'overall', value: 'sumOf("steps", "length")' },
    { id: 'leftSize', value: 'valueAt("steps", "size", 0)' },
    { id: 'rightSize', value: 'valueAt("steps", "size", last)' },
    {
      id: 'leftLeg',
      value:
        'given(leftChamfer) ? leftChamfer : (given(valueAt("steps", "thread", 0)) ? pitchOf(valueAt("steps", "thread", 0)) : 0)',
    },
    {
      id: 'rightLeg',
      value:
        'given(rightChamfer) ? rightChamfer : (given(valueAt("steps", "thread", last)) ? pitchOf(valueAt("steps", "thread", last)) : 0)',
    },
    // The longest leg that leaves a tenth of a millimetre of its step to measure.
    {
      id: 'leftMost',
      value: 'min(valueAt("steps", "runLength", 0) - (lastFace == 0 ? rightLeg : 0), leftSize / 2) - 0.1',
    },
    {
      id: 'rightMost',
      value: 'min(valueAt("steps", "runLength", last) - (lastFace == 0 ? leftLeg : 0), rightSize / 2) - 0.1',
    },
  ],
  constraints: [
    {
      each: 'steps',
      parameter: 'diameter',
      holds: 'given(row.thread) or (given(row.diameter) and row.diameter > 0)',
      message: 'This step has neither a diameter nor a thread. Give one of them, such as 25 or M16.',
    },
    {
      each: 'steps',
      parameter: 'diameter',
      when: 'given(row.thread) and given(row.diameter) and row.diameter > 0',
      holds: 'abs(row.diameter - majorOf(row.thread)) < 0.005',
      message:
        '{row.diameter} is not the diameter of {#row.thread}, which is {=majorOf(row.thread)}. Leave the diameter empty, or give one that agrees.',
    },
    {
      each: 'steps',
      parameter: 'thread',
      when: 'given(row.thread)',
      holds: 'row.size >= 1 and row.size <= 500',
      message: '{#row.thread} has a diameter of {row.size}. Give a thread of {range:1|500}.',
    },
    {
      each: 'steps',
      parameter: 'fit',
      when: 'given(row.thread)',
      holds: 'not given(row.fit)',
      message:
        'A threaded step takes its limits from the class of its thread, such as M16-6g. Leave the fit empty.',
    },
    {
      each: 'steps',
      parameter: 'diameter',
      when: 'given(row.thread)',
      holds: 'toleranceAt("steps", "diameter", index) == ""',
      message:
        'A threaded step takes its limits from the class of its thread, such as M16-6g. Leave the tolerance out.',
    },
    {
      each: 'steps',
      parameter: 'length',
      when: 'row.continues or valueAt("steps", "continues", index + 1)',
      holds: 'toleranceAt("steps", "length", index) == ""',
      message:
        'This step and its neighbour are both {row.size} across, so nothing shows where one ends. Make them one step to give its length a tolerance.',
    },
    {
      parameter: 'steps',
      holds: 'overall <= 3000',
      message: 'The steps come to {overall}. Keep the whole length to {=3000} or less.',
    },
    {
      parameter: 'leftChamfer',
      when: 'leftLeg > 0 and leftMost < 0.1',
      holds: 'false',
      message:
        'The first step leaves no room for a chamfer of {leftLeg} beside what else is cut on it. Give 0 for none.',
    },
    {
      parameter: 'leftChamfer',
      when: 'leftLeg > 0',
      holds: 'leftLeg <= leftMost + 1e-9',
      message:
        'A chamfer of {leftLeg} leaves nothing of the first step, {leftSize} across and {=valueAt("steps", "runLength", 0)} long. Give {<=leftMost} or less, or 0 for none.',
    },
    {
      parameter: 'rightChamfer',
      when: 'rightLeg > 0 and rightMost < 0.1',
      holds: 'false',
      message:
        'The last step leaves no room for a chamfer of {rightLeg} beside what else is cut on it. Give 0 for none.',
    },
    {
      parameter: 'rightChamfer',
      when: 'rightLeg > 0',
      holds: 'rightLeg <= rightMost + 1e-9',
      message:
        'A chamfer of {rightLeg} leaves nothing of the last step, {rightSize} across and {=valueAt("steps", "runLength", last)} long. Give {<=rightMost} or less, or 0 for none.',
    },
  ],
  features: [
    {
      kind: 'cylinder',
      id: 'steps.{key}',
      each: 'steps',
      parameter: 'diameter',
      when: 'not row.continues',
      figures: { length: 'row.runLength', diameter: 'row.size' },
    },
    {
      kind: 'thread',
      id: 'steps.{key}.thread',
      each: 'steps',
      parameter: 'thread',
      when: 'given(row.thread) and not row.continues',
      figures: { on: 'join("steps.", keyAt("steps", index))', thread: 'row.thread' },
    },
    {
      kind: 'chamfer',
      id: 'leftChamfer',
      parameter: 'leftChamfer',
      when: 'leftLeg > 0',
      figures: { on: 'join("steps.", keyAt("steps", 0))', end: '"left"', leg: 'leftLeg' },
    },
    {
      kind: 'chamfer',
      id: 'rightChamfer',
      parameter: 'rightChamfer',
      when: 'rightLeg > 0',
      figures: { on: 'join("steps.", keyAt("steps", lastFace))', end: '"right"', leg: 'rightLeg' },
    },
  ],
  sizes: [
    {
      id: 'steps.{key}.thread',
      kind: 'thread',
      parameter: 'thread',
      each: 'steps',
      when: 'given(row.thread) and not row.continues',
      features: ['steps.{key}.thread', 'steps.{key}'],
      figures: {
        nominal: 'row.size',
        from: 'row.start',
        to: 'row.runEnd',
        diameter: 'row.size',
        lastRow: 'row.runLast',
      },
    },
    {
      id: 'steps.{key}.diameter',
      kind: 'diameter',
      parameter: 'diameter',
      fit: 'fit',
      each: 'steps',
      when: 'not given(row.thread) and not row.continues',
      features: ['steps.{key}'],
      figures: {
        nominal: 'row.size',
        from: 'row.start',
        to: 'row.runEnd',
        diameter: 'row.size',
        lastRow: 'row.runLast',
      },
    },
    {
      id: 'steps.{key}.length',
      kind: 'length',
      parameter: 'length',
      each: 'steps',
      when: 'not row.continues',
      features: ['steps.{key}'],
      figures: { nominal: 'row.runLength', from: 'row.start', to: 'row.runEnd', lastRow: 'row.runLast' },
    },
    {
      id: 'leftChamfer',
      kind: 'chamfer',
      parameter: 'leftChamfer',
      when: 'leftLeg > 0',
      features: ['leftChamfer'],
      figures: { nominal: 'leftLeg' },
    },
    {
      id: 'rightChamfer',
      kind: 'chamfer',
      parameter: 'rightChamfer',
      when: 'rightLeg > 0',
      features: ['rightChamfer'],
      figures: { nominal: 'rightLeg' },
    },
    {
      id: 'overall',
      kind: 'length',
      when: 'lastFace > 0',
      features: ['left-face', 'right-face'],
      figures: { nominal: 'overall', from: '0', to: 'overall' },
      reference: true,
    },
  ],
  datum: '0',
  example: STEPPED_SHAFT_EXAMPLES[0].values,
  examples: STEPPED_SHAFT_EXAMPLES,
});
