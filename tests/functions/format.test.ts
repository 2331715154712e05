import { axisNumbers, plainNumber, valueWithUncertainty } from '../../functions/format';

test.each([
  [0.48123, 0.00231, '0.4812 ± 0.0023'],
  [-0.48123, 0.00231, '−0.4812 ± 0.0023'],
  [12.3456, 0.996, '12.3 ± 1.0'],
  [48231, 231, '48230 ± 230'],
  [0.000048123, 0.00000023, '(4.812 ± 0.023) × 10⁻⁵'],
  [1234567, 8900, '(1.2346 ± 0.0089) × 10⁶'],
  [0, 0.0031, '0.0000 ± 0.0031'],
  [2, 15, '2 ± 15'],
])('valueWithUncertainty(%p, %p) is %j', (value, uncertainty, written) => {
  expect(valueWithUncertainty(value, uncertainty)).toBe(written);
});

test('without an uncertainty the value keeps four digits', () => {
  expect(valueWithUncertainty(0.481234, null)).toBe('0.4812');
  expect(valueWithUncertainty(3.21e-5, null)).toBe('3.21 × 10⁻⁵');
});

test.each([
  [180, '180'],
  [0.00012344, '1.234 × 10⁻⁴'],
  [-2.5, '−2.5'],
  [0, '0'],
])('plainNumber(%p) is %j', (value, written) => expect(plainNumber(value)).toBe(written));

test.each([
  [[0, 0.0002, 0.0004], ['0', '2', '4'], '× 10⁻⁴'],
  [[-0.005, 0, 0.005], ['−0.005', '0', '0.005'], ''],
  [[0, 0.0005, 0.001], ['0', '0.0005', '0.001'], ''],
  [[0, 250000], ['0', '2.5'], '× 10⁵'],
  [[0], ['0'], ''],
])('axisNumbers(%j) share one power of ten', (values, numbers, times) => {
  expect(axisNumbers(values)).toEqual({ numbers, times });
});
