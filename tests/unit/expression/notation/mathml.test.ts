import { describe, expect, test } from 'vitest';
import { escapeXml, mathElement, nameToMathML, toMathML } from '../../../../src/expression/index.ts';

describe('MathML', () => {
  test.each([
    ['1/J', '<mrow><mfrac><mrow><mn>1</mn></mrow><mrow><mi>J</mi></mrow></mfrac></mrow>'],
    ['K_p', '<mrow><msub><mi>K</mi><mrow><mi mathvariant="normal">p</mi></mrow></msub></mrow>'],
    ['omega2', '<mrow><msub><mi>ω</mi><mrow><mn>2</mn></mrow></msub></mrow>'],
    ['wn', '<mrow><mi mathvariant="normal">wn</mi></mrow>'],
    ['2*k', '<mrow><mn>2</mn><mo>\u2062</mo><mi>k</mi></mrow>'],
    ['k*2', '<mrow><mi>k</mi><mo>\u22c5</mo><mn>2</mn></mrow>'],
    ['-a', '<mrow><mo form="prefix">\u2212</mo><mi>a</mi></mrow>'],
    ['a^2', '<mrow><msup><mrow><mi>a</mi></mrow><mrow><mn>2</mn></mrow></msup></mrow>'],
    ['1e-3', '<mrow><msup><mn>10</mn><mrow><mo>\u2212</mo><mn>3</mn></mrow></msup></mrow>'],
    ['sqrt(2)', '<mrow><msqrt><mn>2</mn></msqrt></mrow>'],
    ['sin(x)', '<mrow><mi>sin</mi><mo>\u2061</mo><mrow><mo>(</mo><mi>x</mi><mo>)</mo></mrow></mrow>'],
    ['2 <b>k</b>', '<mtext>2 &lt;b&gt;k&lt;/b&gt;</mtext>'],
  ])('%s', (text, expected) => {
    expect(toMathML(text)).toBe(expected);
  });

  test('parentheses stand where a fraction or power needs them and nowhere else', () => {
    expect(toMathML('(a + b)/c')).not.toContain('(');
    expect(toMathML('(a + b)^2')).toContain('<mo>(</mo>');
    expect(toMathML('(a/b)^2')).toContain('<mo>(</mo>');
    expect(toMathML('2^(a + b)')).not.toContain('(');
  });

  test('nothing gets through unescaped', () => {
    expect(nameToMathML('<script>"&\'')).toBe('<mi mathvariant="normal">&lt;script&gt;&quot;&amp;&#39;</mi>');
    expect(nameToMathML('a.b')).toBe('<mrow><mi>a</mi><mo>.</mo><mi>b</mi></mrow>');
    expect(escapeXml('a\u0000<')).toBe('a &lt;');
  });

  test('pieces are put into one element of the MathML namespace', () => {
    expect(mathElement(toMathML('k'))).toBe(
      '<math xmlns="http://www.w3.org/1998/Math/MathML" display="inline"><mrow><mi>k</mi></mrow></math>',
    );
  });
});
