import { rateCoefficientUnit } from '../../../src/order/unit';

// IUPAC Gold Book, order of reaction (doi:10.1351/goldbook.O04322): (amount concentration)^(1−n) time⁻¹
test.each([
  [0, 'mol/L', 's', 'mol L⁻¹ s⁻¹'],
  [1, 'mol/L', 's', 's⁻¹'],
  [2, 'mol/L', 's', 'L mol⁻¹ s⁻¹'],
  [3, 'mol/L', 's', 'L² mol⁻² s⁻¹'],
  [2, 'mol/dm3', 'min', 'dm³ mol⁻¹ min⁻¹'],
  [2, 'mol dm⁻³', 'min', 'dm³ mol⁻¹ min⁻¹'],
  [2, 'mol·m^-3', 'h', 'm³ mol⁻¹ h⁻¹'],
  [2, 'M', 's', 'M⁻¹ s⁻¹'],
  [1.5, 'mol/L', 's', 'L^0.5 mol^-0.5 s^-1'],
  [2, 'kPa', 's', 'kPa⁻¹ s⁻¹'],
])('order %d in %s and %s: %s', (order, concentration, time, unit) => {
  expect(rateCoefficientUnit(order, concentration, time)).toBe(unit);
});

test('rateCoefficientUnit refuses what is no unit', () => {
  expect(() => rateCoefficientUnit(2, '1/5', 's')).toThrow(
    'concentrationunit must be made of units and powers, such as mol/L: got "1/5"',
  );
  expect(() => rateCoefficientUnit(2, 'mol/L', ' ')).toThrow('timeunit must name a unit: got " "');
});
