using System.Reflection;
using HfClinic.Clinical.Calculations;

namespace HfClinic.Clinical.Tests.Calculations;

/// <summary>Profiles of Nohria 2003; the lists of signs are from memory.</summary>
public class BedsideSignsTests
{
    [Fact]
    public void Every_sign_is_in_one_list_and_has_words() => Assert.Equal(
        Enum.GetValues<BedsideSigns>().Except([BedsideSigns.None]).Order(),
        BedsideWords.Wet.Concat(BedsideWords.Cold).Select(entry => entry.Sign).Order());

    [Fact]
    public void Signs_present_are_listed_by_group()
    {
        const BedsideSigns Present = BedsideSigns.Rales | BedsideSigns.Orthopnoea | BedsideSigns.CoolLimbs;

        Assert.Equal("orthopnoea and rales", BedsideWords.List(BedsideWords.Wet, Present));
        Assert.Equal("cool limbs", BedsideWords.List(BedsideWords.Cold, Present));
        Assert.Equal("", BedsideWords.List(BedsideWords.Cold, BedsideSigns.Rales));
    }

    [Theory]
    [InlineData(BedsideProfile.WarmAndDry, "warm and dry (A)")]
    [InlineData(BedsideProfile.WarmAndWet, "warm and wet (B)")]
    [InlineData(BedsideProfile.ColdAndWet, "cold and wet (C)")]
    [InlineData(BedsideProfile.ColdAndDry, "cold and dry (L)")]
    public void Profiles_carry_their_published_letters(BedsideProfile profile, string words) => Assert.Equal(words, BedsideWords.Words(profile));

    /// <summary>Signs were absent in 18 of 43 patients with a wedge pressure of 22 mmHg or more (Stevenson and Perloff 1989).</summary>
    [Fact]
    public void Nothing_in_the_program_sets_the_profile() => Assert.DoesNotContain(
        typeof(BedsideProfile).Assembly.GetTypes().SelectMany(type => type.GetMethods(
            BindingFlags.Static | BindingFlags.Instance | BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.DeclaredOnly)),
        method => method.ReturnType == typeof(BedsideProfile) && method.GetParameters().Any(p => p.ParameterType == typeof(BedsideSigns)));
}
