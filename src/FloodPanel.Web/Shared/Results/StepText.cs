using System.Text;
using FloodPanel.Calculation;

namespace FloodPanel.Web.Shared.Results;

/// <summary>One piece of a formula: a symbol with its subscript, or what stands between symbols.</summary>
public readonly record struct FormulaPiece(string Text, string Subscript, bool IsSymbol);

/// <summary>Writes a line of a calculation: its formula in symbols, and with the numbers put in.</summary>
public static class StepText
{
    /// <summary>The formula with the symbols of earlier steps replaced by their values and units.</summary>
    /// <param name="formula">The formula in symbols.</param>
    /// <param name="earlier">The steps that the formula may use.</param>
    /// <param name="system">The reader's units.</param>
    public static string Substitute(string formula, IReadOnlyList<CalculationStep> earlier, UnitSystem system)
    {
        var written = new StringBuilder();
        for (var at = 0; at < formula.Length;)
        {
            var (length, step) = SymbolAt(formula, at, earlier);
            if (step is { } known)
            {
                written.Append(Value(known, formula, at, at + length, system));
            }
            else
            {
                written.Append(formula, at, length);
            }

            at += length;
        }

        return written.ToString();
    }

    /// <summary>A formula in pieces, so that symbols can be set in italics with their subscripts lowered.</summary>
    /// <param name="formula">A formula or a single symbol.</param>
    public static IReadOnlyList<FormulaPiece> Pieces(string formula)
    {
        var pieces = new List<FormulaPiece>();
        var between = new StringBuilder();
        for (var at = 0; at < formula.Length;)
        {
            var length = TokenLength(formula, at);
            var token = formula.Substring(at, length);
            if (IsStart(token[0]) && !IsFunction(token))
            {
                Flush();
                var bar = token.IndexOf('_');
                pieces.Add(bar < 0 ? new(token, "", true) : new(token[..bar], token[(bar + 1)..], true));
            }
            else
            {
                between.Append(token);
            }

            at += length;
        }

        Flush();
        return pieces;

        void Flush()
        {
            if (between.Length > 0)
            {
                pieces.Add(new(between.ToString(), "", false));
                between.Clear();
            }
        }
    }

    // The longest known symbol that starts here and does not end inside another identifier; else the token as it stands.
    private static (int Length, CalculationStep? Step) SymbolAt(
        string formula, int at, IReadOnlyList<CalculationStep> earlier)
    {
        CalculationStep? best = null;
        if (IsStart(formula[at]))
        {
            foreach (var step in earlier)
            {
                var end = at + step.Symbol.Length;
                if (step.Symbol.Length > (best?.Symbol.Length ?? 0)
                    && string.CompareOrdinal(formula, at, step.Symbol, 0, step.Symbol.Length) == 0
                    && (end >= formula.Length || !IsPart(formula[end])))
                {
                    best = step;
                }
            }
        }

        return best is { } found ? (found.Symbol.Length, found) : (TokenLength(formula, at), null);
    }

    private static int TokenLength(string formula, int at)
    {
        if (!IsStart(formula[at]) && !char.IsAsciiDigit(formula[at]))
        {
            return 1;
        }

        var end = at + 1;
        while (end < formula.Length && IsPart(formula[end]))
        {
            end++;
        }

        return end - at;
    }

    // Brackets where a bare "0.950 m" would be read wrongly: under a power or a root, behind a division, negative.
    private static string Value(in CalculationStep step, string formula, int start, int end, UnitSystem system)
    {
        var text = Units.Format(step.Value, step.Dimension, system);
        var hasUnit = Units.Of(step.Dimension, system).Symbol.Length > 0;
        var before = Beside(formula, start - 1, -1);
        var after = Beside(formula, end, 1);
        var powered = after is '²' or '³' or '⁴' && (hasUnit || step.Value < 0);
        var divides = hasUnit && (before is '/' or '√' || (after == '/' && text.Contains('/')));
        var negative = step.Value < 0 && before is not ('\0' or '(' or ',');
        return powered || divides || negative ? $"({text})" : text;
    }

    private static char Beside(string formula, int at, int direction)
    {
        while (at >= 0 && at < formula.Length && formula[at] == ' ')
        {
            at += direction;
        }

        return at >= 0 && at < formula.Length ? formula[at] : '\0';
    }

    private static bool IsStart(char c) => char.IsLetter(c);

    private static bool IsPart(char c) =>
        char.IsLetterOrDigit(c) || c is '_' or '\'' or '′' or '″' or (>= '₀' and <= '₎');

    private static bool IsFunction(string token) => token is "min" or "max" or "cos" or "sin" or "tan" or "sinh" or "cosh" or "tanh" or "exp" or "ln";
}
