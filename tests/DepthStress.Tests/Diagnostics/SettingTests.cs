using DepthStress.Core.Diagnostics;
using DepthStress.Core.Model;
using DepthStress.Core.Stress;
using DepthStress.Tests.Model;

namespace DepthStress.Tests.Diagnostics;

public class SettingTests
{
    private static readonly Setting<double> Default = Setting.Default(0.6);

    private static Setting<double> Decided(double value, SettingKind kind = SettingKind.WellFile) => SmallWell.Chosen(value, 5, kind);

    [Fact]
    public void A_decided_value_stands_over_everything_below_it()
    {
        Assert.Equal(1, Decided(1).Over(Decided(2)).Value);
        Assert.Equal(1, Decided(1).Over(Default).Value);
        Assert.Equal(1, Decided(1).Over(default).Value);
    }

    [Theory]
    [InlineData(SettingKind.WellFile)]
    [InlineData(SettingKind.Zone)]
    [InlineData(SettingKind.Lithology)]
    [InlineData(SettingKind.Calibrated)]
    public void A_default_never_overrides_a_decided_value(SettingKind kind)
    {
        var result = Default.Over(Decided(0.8, kind));
        Assert.Equal(0.8, result.Value);
        Assert.Equal(kind, result.Source.Kind);
    }

    [Fact]
    public void Nothing_gives_way_to_a_default_and_a_default_does_not_give_way_to_nothing()
    {
        Assert.Equal(SettingKind.Default, default(Setting<double>).Over(Default).Source.Kind);
        Assert.Equal(SettingKind.Default, Default.Over(default).Source.Kind);
        Assert.False(default(Setting<double>).Over(default).IsSet);
    }

    [Fact]
    public void A_setting_made_from_nothing_is_not_set()
    {
        Assert.False(default(Setting<double>).IsSet);
        Assert.Equal(SettingSource.NotSet, default(Setting<double>).Source);
        Assert.True(Default.IsSet);
    }

    // Every settings record lists its members in Over by hand: a member that is forgotten there would lose overrides.
    [Fact]
    public void Every_member_of_every_settings_record_passes_through_Over()
    {
        foreach (var part in typeof(StageSettings).GetProperties())
        {
            var settings = part.PropertyType;
            foreach (var member in settings.GetProperties().Where(p => p.PropertyType.IsGenericType))
            {
                var marked = Activator.CreateInstance(settings)!;
                var source = new SettingSource(SettingKind.Zone, SourcePosition.None, member.Name);
                var value = member.PropertyType.GetGenericArguments()[0] is { IsValueType: true } t ? Activator.CreateInstance(t) : null;
                member.SetValue(marked, Activator.CreateInstance(member.PropertyType, value, source));
                var (over, under) = (new StageSettings(), new StageSettings());
                part.SetValue(over, marked);
                Assert.Equal(source, SourceOf(part.GetValue(over.Over(new StageSettings()))!, member));
                part.SetValue(under, marked);
                Assert.Equal(source, SourceOf(part.GetValue(new StageSettings().Over(under))!, member));
            }
        }

        static object? SourceOf(object settings, System.Reflection.PropertyInfo member)
        {
            var setting = member.GetValue(settings)!;
            return setting.GetType().GetProperty(nameof(Setting<double>.Source))!.GetValue(setting);
        }
    }

    [Fact]
    public void The_friction_of_faults_defaults_to_the_common_value_and_says_so()
    {
        var friction = new HorizontalStressSettings().FrictionCoefficient;
        Assert.Equal((0.6, SettingKind.Default), (friction.Value, friction.Source.Kind)); // common practice
    }
}
