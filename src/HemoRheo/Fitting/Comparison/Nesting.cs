namespace HemoRheo;

/// <summary>A law that is a special case of another one.</summary>
/// <param name="Simple">The special case.</param>
/// <param name="General">The general law.</param>
/// <param name="Kind">Where it lies in it.</param>
/// <param name="Where">At which numbers.</param>
internal sealed record Nesting(FlowLaw Simple, FlowLaw General, NestingKind Kind, string Where)
{
    /// <summary>All nestings among the built-in laws.</summary>
    public static Items<Nesting> All { get; } =
    [
        new(FlowLaw.Newtonian, FlowLaw.PowerLaw, NestingKind.Inside, "flow index 1"),
        new(FlowLaw.Newtonian, FlowLaw.Bingham, NestingKind.AtBound, "yield stress 0"),
        new(FlowLaw.Newtonian, FlowLaw.Casson, NestingKind.AtBound, "yield stress 0"),
        new(FlowLaw.Newtonian, FlowLaw.HerschelBulkley, NestingKind.AtBound, "yield stress 0 and flow index 1"),
        new(FlowLaw.PowerLaw, FlowLaw.HerschelBulkley, NestingKind.AtBound, "yield stress 0"),
        new(FlowLaw.Bingham, FlowLaw.HerschelBulkley, NestingKind.Inside, "flow index 1"),
        new(FlowLaw.Casson, FlowLaw.Quemada, NestingKind.AtBound, "ratio 0"),
        new(FlowLaw.Newtonian, FlowLaw.Quemada, NestingKind.OthersMeaningless, "ratio 1, where the critical rate means nothing"),
        new(FlowLaw.Newtonian, FlowLaw.Carreau, NestingKind.OthersMeaningless, "equal viscosities, where time constant and flow index mean nothing"),
        new(FlowLaw.Newtonian, FlowLaw.Cross, NestingKind.OthersMeaningless, "equal viscosities, where time constant and exponent mean nothing"),
        new(FlowLaw.Newtonian, FlowLaw.CarreauYasuda, NestingKind.OthersMeaningless, "equal viscosities, where the other parameters mean nothing"),
        new(FlowLaw.Carreau, FlowLaw.CarreauYasuda, NestingKind.Inside, "sharpness 2"),
    ];
}
