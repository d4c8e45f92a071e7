using RadicalSites.Diagnostics;

namespace RadicalSites.Formats.Smiles;

internal sealed partial class SmilesParse
{
    private bool Fail(ProblemDescriptor problem, int position, params object[] arguments) =>
        Fail(problem, position, -1, arguments);

    private bool Fail(ProblemDescriptor problem, int position, int second, object[] arguments)
    {
        failure = new FormatProblem
        {
            Descriptor = problem,
            Message = problem.Format(arguments),
            Position = position,
            SecondPosition = second,
        };
        return false;
    }

    // A mark that says nothing usable: refused in strict reading, left out and reported in lenient reading.
    private bool Overlook(ProblemDescriptor problem, int position, params object[] arguments)
    {
        if (!lenient)
        {
            return Fail(problem, position, arguments);
        }

        Remark(problem, position, arguments);
        return true;
    }

    private void Remark(ProblemDescriptor problem, int position, params object[] arguments) =>
        remarks?.Add(new FormatProblem { Descriptor = problem, Message = problem.Format(arguments), Position = position });
}
