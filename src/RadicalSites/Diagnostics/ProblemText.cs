using System;
using System.Globalization;
using System.Text;

namespace RadicalSites.Diagnostics;

/// <summary>Writes a problem for a person: message, the text with a caret, cause, remedy.</summary>
internal static class ProblemText
{
    private const int Window = 72;

    internal static string Render(FormatProblem problem)
    {
        var text = new StringBuilder();
        text.Append(problem.Code).Append(": ").Append(problem.Message);
        if (problem.Line > 0)
        {
            text.Append(CultureInfo.InvariantCulture, $" (line {problem.Line})");
        }

        if (problem.Position >= 0 && problem.Input.Length > 0)
        {
            AppendCaret(text, problem);
        }

        text.Append("\n  cause:  ").Append(problem.Descriptor.Cause);
        text.Append("\n  remedy: ").Append(problem.Descriptor.Remedy);
        return text.ToString();
    }

    private static void AppendCaret(StringBuilder text, FormatProblem problem)
    {
        // A long line is cut to a window around the first place, so a 10 MB line stays readable.
        int start = Math.Max(0, Math.Min(problem.Position - Window / 2, problem.Input.Length - Window));
        int end = Math.Min(problem.Input.Length, start + Window);
        string before = start > 0 ? "..." : "";
        text.Append("\n  ").Append(before);
        for (int i = start; i < end; i++)
        {
            char c = problem.Input[i];
            text.Append(char.IsControl(c) ? ' ' : c);
        }

        if (end < problem.Input.Length)
        {
            text.Append("...");
        }

        Span<char> carets = stackalloc char[Window + 8];
        carets.Fill(' ');
        int last = -1;
        Mark(carets, problem.Position, start, end, before.Length, ref last);
        Mark(carets, problem.SecondPosition, start, end, before.Length, ref last);
        text.Append("\n  ").Append(carets[..(last + 1)]);
    }

    private static void Mark(Span<char> carets, int position, int start, int end, int shift, ref int last)
    {
        if (position < start || position > end)
        {
            return;
        }

        int column = shift + position - start;
        carets[column] = '^';
        last = Math.Max(last, column);
    }
}
