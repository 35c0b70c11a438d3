using System.Globalization;

namespace FloodPanel.Calculation.Tests.Steps;

/// <summary>
/// Reads and works out the formula of a step by recursive descent, in the language that <see cref="CalculationStep"/>
/// allows: symbols, numbers, + − · / ( ) ² ³ ⁴ ^ √, π and min, max, cos, sin, tan, sinh, cosh, tanh, exp, ln. Anything else is refused.
/// </summary>
internal sealed class FormulaReader
{
    private readonly string formula;
    private readonly IReadOnlyDictionary<string, Measured> known;
    private int at;

    private FormulaReader(string formula, IReadOnlyDictionary<string, Measured> known)
    {
        this.formula = formula;
        this.known = known;
    }

    /// <summary>The value of a formula.</summary>
    /// <param name="formula">The formula.</param>
    /// <param name="known">Symbols of earlier steps.</param>
    /// <exception cref="FormatException">The formula is not in the language, uses an unknown symbol or mixes units.</exception>
    public static Measured Read(string formula, IReadOnlyDictionary<string, Measured> known)
    {
        var reader = new FormulaReader(formula, known);
        var value = reader.Sum();
        return reader.at == formula.Length ? value : throw reader.Refusal();
    }

    private Measured Sum()
    {
        var value = Product();
        while (true)
        {
            if (Took('+'))
            {
                value += Product();
            }
            else if (Took('−'))
            {
                value -= Product();
            }
            else
            {
                return value;
            }
        }
    }

    private Measured Product()
    {
        var value = Power();
        while (true)
        {
            if (Took('·'))
            {
                value *= Power();
            }
            else if (Took('/'))
            {
                value /= Power();
            }
            else
            {
                return value;
            }
        }
    }

    private Measured Power()
    {
        var value = Primary();
        if (Took('^'))
        {
            return value.Function(x => Math.Pow(x, Primary().Value));
        }

        var power = Took('²') ? 2 : Took('³') ? 3 : Took('⁴') ? 4 : 1;
        return power == 1 ? value : value.Power(power);
    }

    private Measured Primary()
    {
        if (Took('('))
        {
            return Closed(Sum());
        }

        if (Took('√'))
        {
            return Primary().Root();
        }

        if (at < formula.Length && char.IsAsciiDigit(formula[at]))
        {
            return Measured.Number(double.Parse(While(c => char.IsAsciiDigit(c) || c == '.'), CultureInfo.InvariantCulture));
        }

        var word = While(c => char.IsLetter(c) || char.IsAsciiDigit(c) || c is '_' or '′');
        return word switch
        {
            "" => throw Refusal(),
            "π" => Measured.Number(Math.PI),
            "cos" => Call(1)[0].Function(Math.Cos),
            "sin" => Call(1)[0].Function(Math.Sin),
            "tan" => Call(1)[0].Function(Math.Tan),
            "sinh" => Call(1)[0].Function(Math.Sinh),
            "cosh" => Call(1)[0].Function(Math.Cosh),
            "tanh" => Call(1)[0].Function(Math.Tanh),
            "ln" => Call(1)[0].Function(Math.Log),
            "exp" => Call(1)[0].Function(Math.Exp),
            "min" => Call(2) is var pair ? Measured.Least(pair[0], pair[1]) : default,
            "max" => Call(2) is var pair ? Measured.Greatest(pair[0], pair[1]) : default,
            _ => known.TryGetValue(word, out var value) ? value : throw new FormatException($"'{word}' is not known in '{formula}'"),
        };
    }

    private Measured[] Call(int count)
    {
        var arguments = new Measured[count];
        for (var i = 0; i < count; i++)
        {
            if (!Took(i == 0 ? '(' : ','))
            {
                throw Refusal();
            }

            arguments[i] = Sum();
        }

        Closed(default);
        return arguments;
    }

    private Measured Closed(Measured value) => Took(')') ? value : throw Refusal();

    private bool Took(char wanted)
    {
        var next = at;
        while (next < formula.Length && formula[next] == ' ')
        {
            next++;
        }

        if (next == formula.Length || formula[next] != wanted)
        {
            return false;
        }

        at = next + 1;
        while (at < formula.Length && formula[at] == ' ')
        {
            at++;
        }

        return true;
    }

    private string While(Func<char, bool> belongs)
    {
        var start = at;
        while (at < formula.Length && belongs(formula[at]))
        {
            at++;
        }

        return formula[start..at];
    }

    private FormatException Refusal() => new($"'{formula}' cannot be read from position {at}");
}
