using System;
using System.Collections.Generic;
using System.Linq;
using System.Reflection;
using System.Reflection.Emit;

namespace RadicalSites.Tests.Architecture;

/// <summary>Types that a type refers to: signatures, fields, attributes' owners and every token in its method bodies.</summary>
internal static class TypeReferences
{
    private const BindingFlags Everything =
        BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.Instance | BindingFlags.Static | BindingFlags.DeclaredOnly;

    private static readonly Dictionary<short, OpCode> OpCodesByValue = typeof(OpCodes)
        .GetFields(BindingFlags.Public | BindingFlags.Static)
        .Select(static field => (OpCode)field.GetValue(null)!)
        .ToDictionary(static code => code.Value);

    public static IEnumerable<Type> Of(Type type)
    {
        var found = new HashSet<Type>();
        Add(found, type.BaseType);
        foreach (Type contract in type.GetInterfaces())
        {
            Add(found, contract);
        }

        foreach (FieldInfo field in type.GetFields(Everything))
        {
            Add(found, field.FieldType);
        }

        IEnumerable<MethodBase> methods = type.GetMethods(Everything).Concat<MethodBase>(type.GetConstructors(Everything));
        foreach (MethodBase method in methods)
        {
            AddSignature(found, method);
            AddBody(found, method);
        }

        return found;
    }

    private static void AddSignature(HashSet<Type> found, MethodBase method)
    {
        foreach (ParameterInfo parameter in method.GetParameters())
        {
            Add(found, parameter.ParameterType);
        }

        if (method is MethodInfo { ReturnType: { } returned })
        {
            Add(found, returned);
        }
    }

    private static void AddBody(HashSet<Type> found, MethodBase method)
    {
        MethodBody? body = method.GetMethodBody();
        byte[]? code = body?.GetILAsByteArray();
        if (code is null)
        {
            return;
        }

        foreach (LocalVariableInfo local in body!.LocalVariables)
        {
            Add(found, local.LocalType);
        }

        Type[]? typeArguments = method.DeclaringType!.IsGenericType ? method.DeclaringType.GetGenericArguments() : null;
        Type[]? methodArguments = method.IsGenericMethod ? method.GetGenericArguments() : null;
        for (int at = 0; at < code.Length;)
        {
            short value = code[at++];
            if (value == 0xFE)
            {
                value = (short)(0xFE00 | code[at++]);
            }

            OpCode operation = OpCodesByValue[value];
            if (operation.OperandType is OperandType.InlineField or OperandType.InlineMethod or OperandType.InlineTok
                or OperandType.InlineType)
            {
                MemberInfo? member = method.Module.ResolveMember(BitConverter.ToInt32(code, at), typeArguments, methodArguments);
                Add(found, member as Type ?? member?.DeclaringType);
                if (member is MethodBase called)
                {
                    AddSignature(found, called);
                }
            }

            at += operation.OperandType switch
            {
                OperandType.InlineNone => 0,
                OperandType.ShortInlineBrTarget or OperandType.ShortInlineI or OperandType.ShortInlineVar => 1,
                OperandType.InlineVar => 2,
                OperandType.InlineI8 or OperandType.InlineR => 8,
                OperandType.InlineSwitch => 4 + (4 * BitConverter.ToInt32(code, at)),
                _ => 4,
            };
        }
    }

    private static void Add(HashSet<Type> found, Type? type)
    {
        while (type is { HasElementType: true })
        {
            type = type.GetElementType();
        }

        if (type is null || type.IsGenericParameter)
        {
            return;
        }

        if (type.IsGenericType)
        {
            foreach (Type argument in type.GetGenericArguments())
            {
                Add(found, argument);
            }

            type = type.GetGenericTypeDefinition();
        }

        found.Add(type);
    }
}
