using System.CommandLine;
using System.Globalization;

namespace HemoRheo.App;

/// <content>Commands about checks of instruments.</content>
internal sealed partial class CommandLine
{
    private const string MomentForm = "yyyy-MM-dd'T'HH:mmzzz";

    private Command Check() => new(PlainHelp.Check) { Record(), Status(), Export(), Verify() };

    private Command Record()
    {
        var by = new Option<string>("--by") { Required = true };
        return OnInstrument("record", [by], (request, parsed) => new CheckRecording(output, clock).Of(request, parsed.GetValue(by)!));
    }

    private Command Status()
    {
        var page = new Option<string?>("--page");
        var at = new Option<string?>("--at");
        var strict = new Option<bool>("--strict");
        return OnInstrument("status", [page, at, strict], (request, parsed) =>
            new CheckStatus(output, clock).Of(request, Moment(parsed.GetValue(at)), FileOf(parsed.GetValue(page), ".html"), parsed.GetValue(strict)));
    }

    private Command Export()
    {
        var to = new Option<string>("--to") { Required = true };
        return OnInstrument("export", [to], (request, parsed) => new LogExport(output).Write(request, FileOf(parsed.GetValue(to), ".csv")!));
    }

    private Command Verify()
    {
        var noted = new Option<string?>("--noted");
        var strict = new Option<bool>("--strict");
        return OnInstrument("verify", [noted, strict], (request, parsed) => new LogExport(output).Verify(request, parsed.GetValue(noted), parsed.GetValue(strict)));
    }

    private Command OnInstrument(string name, Option[] own, Func<CheckRequest, ParseResult, int> action)
    {
        var folder = new Argument<string>("folder");
        folder.Validators.Add(RefuseUnknownOption);
        var log = new Option<string?>("--log");
        var instrument = new Option<string?>("--instrument");
        var command = new Command(name) { folder, log, instrument };
        foreach (var option in own) command.Options.Add(option);
        command.SetAction((parsed, cancel) => Task.Run(
            () =>
            {
                var place = parsed.GetValue(log) is { } named ? Full(named) : null;
                return action(new(StudyLocation.Of(Full(parsed.GetValue(folder)!)), parsed.GetValue(instrument), place), parsed);
            },
            cancel));
        return command;
    }

    // The ending keeps a slip of the hand from replacing a log, a study file or an export.
    private string? FileOf(string? path, string ending) => path is null || path.EndsWith(ending, StringComparison.OrdinalIgnoreCase)
        ? path is null ? null : Full(path)
        : throw new CouldNotRunException($"\"{path}\" does not end with {ending}. Name a file that does.");

    private static DateTimeOffset? Moment(string? text)
    {
        if (text is null) return null;
        return DateTimeOffset.TryParseExact(text, MomentForm, CultureInfo.InvariantCulture, DateTimeStyles.None, out var moment)
            ? moment
            : throw new CouldNotRunException($"\"{text}\" is no moment with its offset from universal time. Write it like 2025-04-02T12:00+02:00");
    }
}
